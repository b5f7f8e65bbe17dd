import type { Diagram } from '../schema';
import { noSuchStation, refuse, stationWords, withStation, type CommandResult } from './types';

/** Puts a station's tag by hand, as an offset from the station in scene units; null lets it find its place again. */
export function moveTag(
	diagram: Diagram,
	{
		stationId,
		offset
	}: { readonly stationId: string; readonly offset: { readonly dx: number; readonly dy: number } | null }
): CommandResult {
	if (!diagram.stations.some(({ id }) => id === stationId)) return noSuchStation;
	if (offset && !(Number.isFinite(offset.dx) && Number.isFinite(offset.dy)))
		return refuse('notANumber', 'The place of the tag is no number.');
	const next = withStation(diagram, stationId, { tag: offset ? { dx: offset.dx, dy: offset.dy } : undefined });
	const label = `${offset ? 'move' : 'release'} the tag of ${stationWords(diagram, stationId)}`;
	return { ok: true, diagram: next, label, itemId: stationId };
}
