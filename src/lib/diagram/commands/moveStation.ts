import type { ChartPoint } from '$lib/physics/types';
import { producers } from '../path';
import type { Diagram } from '../schema';
import { dragProcessOutlet } from './dragProcessOutlet';
import { pairAt } from './pairAt';
import {
	noSuchProcess,
	noSuchStation,
	refuseAs,
	stationWords,
	withStation,
	type CommandResult,
	type Situation
} from './types';

export interface StationMove {
	readonly stationId: string;
	readonly to: ChartPoint;
	/** Off the locus of the process that produces it; see {@link dragProcessOutlet}. */
	readonly free?: boolean;
}

/**
 * Moves a station on the chart. A given one keeps which two properties are given and takes their values from the
 * point; a produced one moves along the locus of its process.
 */
export function moveStation(
	diagram: Diagram,
	{ stationId, to, free }: StationMove,
	situation: Situation
): CommandResult {
	const station = diagram.stations.find(({ id }) => id === stationId);
	if (!station) return noSuchStation;
	if (station.source.kind === 'process') {
		const process = producers(diagram).get(stationId);
		return process ? dragProcessOutlet(diagram, { processId: process.id, to, free }, situation) : noSuchProcess;
	}
	const placed = pairAt(to, station.source.pair, situation.evaluated.site, situation.system);
	if (!placed.ok) return refuseAs(placed.refusal, situation.system);
	return {
		ok: true,
		diagram: withStation(diagram, stationId, { source: { kind: 'given', pair: placed.pair } }),
		label: `move ${stationWords(diagram, stationId)}`,
		itemId: stationId,
		...(placed.note && { note: placed.note })
	};
}
