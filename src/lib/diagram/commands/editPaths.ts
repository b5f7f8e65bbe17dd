import { MAX_PATHS } from '../schema';
import type { Airflow, Diagram } from '../schema';
import { remove } from './deleteItem';
import { MAX_NAME, tooLong } from './renameItem';
import { noSuchPath, refuse, type CommandResult, type Situation } from './types';

export function addPath(
	diagram: Diagram,
	path: { readonly pathId: string; readonly name: string; readonly airflow: Airflow }
): CommandResult {
	if (diagram.paths.length >= MAX_PATHS)
		return refuse('tooManyPaths', `A diagram has at most ${MAX_PATHS} paths. Delete one first.`);
	if (path.name.length > MAX_NAME) return tooLong('The name', path.name, MAX_NAME);
	const added = { id: path.pathId, name: path.name.trim(), airflow: path.airflow };
	return { ok: true, diagram: { ...diagram, paths: [...diagram.paths, added] }, label: 'add path' };
}

/** Deletes a path with its stations and processes. The last path stays: a diagram has one at least. */
export function deletePath(
	diagram: Diagram,
	{ pathId }: { readonly pathId: string },
	situation: Situation
): CommandResult {
	if (!diagram.paths.some(({ id }) => id === pathId)) return noSuchPath;
	if (diagram.paths.length === 1)
		return refuse('lastPath', 'A diagram has one path at least. Delete its stations instead.');
	const on = (items: readonly { id: string; pathId: string }[]) =>
		new Set(items.filter((item) => item.pathId === pathId).map(({ id }) => id));
	const { next, note } = remove(diagram, on(diagram.stations), on(diagram.processes), situation);
	const without = { ...next, paths: next.paths.filter(({ id }) => id !== pathId) };
	return { ok: true, diagram: without, label: 'delete path', ...(note && { note }) };
}
