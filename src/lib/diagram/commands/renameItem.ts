import type { Diagram } from '../schema';
import { noSuchProcess, noSuchStation, refuse, stationWords, withStation, type CommandResult } from './types';

export const MAX_NAME = 80;
export const MAX_NOTES = 4000;

export const tooLong = (what: string, text: string, most: number) =>
	refuse('tooLong', `${what} has ${text.length} characters; at most ${most} are kept. Shorten it.`);

export function renameStation(
	diagram: Diagram,
	{ stationId, name }: { readonly stationId: string; readonly name: string }
): CommandResult {
	if (!diagram.stations.some(({ id }) => id === stationId)) return noSuchStation;
	if (name.length > MAX_NAME) return tooLong('The name', name, MAX_NAME);
	const next = withStation(diagram, stationId, { name: name.trim() });
	return { ok: true, diagram: next, label: `rename ${stationWords(diagram, stationId)}`, itemId: stationId };
}

/** An empty name gives the process the name of its kind again. */
export function renameProcess(
	diagram: Diagram,
	{ processId, name }: { readonly processId: string; readonly name: string }
): CommandResult {
	if (!diagram.processes.some(({ id }) => id === processId)) return noSuchProcess;
	if (name.length > MAX_NAME) return tooLong('The name', name, MAX_NAME);
	const processes = diagram.processes.map(({ name: _before, ...process }) =>
		process.id !== processId
			? { ...process, ...(_before !== undefined && { name: _before }) }
			: { ...process, ...(name.trim() && { name: name.trim() }) }
	);
	return { ok: true, diagram: { ...diagram, processes }, label: 'rename process', itemId: processId };
}
