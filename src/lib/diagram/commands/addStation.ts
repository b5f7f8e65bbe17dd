import type { ChartPoint } from '$lib/physics/types';
import { stateOfPair } from '../evaluate';
import type { Diagram, DiagramStation, Pair } from '../schema';
import { pairAt } from './pairAt';
import { noSuchPath, refuse, refuseAs, stationWords, type CommandResult, type Situation } from './types';

export const MAX_STATIONS = 200;

/** A named design condition of the site, as the project keeps it. */
export interface NamedCondition {
	readonly id: string;
	readonly name: string;
	readonly pair: Pair;
}

export interface NewStation {
	readonly stationId: string;
	readonly pathId: string;
	readonly name?: string;
	/** Where it is dropped, or the two values it is typed with. */
	readonly at: ChartPoint | Pair;
}

/** Adds a given station. One dropped on the chart is given by dry bulb and relative humidity. */
export function addStation(diagram: Diagram, station: NewStation, situation: Situation): CommandResult {
	const { site } = situation.evaluated;
	if ('dryBulb' in station.at) {
		const placed = pairAt(
			station.at,
			[{ property: 'dryBulb' }, { property: 'relativeHumidity' }],
			site,
			situation.system
		);
		if (!placed.ok) return refuseAs(placed.refusal, situation.system);
		return append(diagram, station, { kind: 'given', pair: placed.pair }, placed.note);
	}
	const { refusal } = stateOfPair(station.at, site);
	if (refusal) return refuseAs(refusal, situation.system);
	return append(diagram, station, { kind: 'given', pair: station.at });
}

/** Adds a station at a design condition of the site. It keeps the condition's values, and remembers which it was. */
export function addStationFromCondition(
	diagram: Diagram,
	station: { readonly stationId: string; readonly pathId: string; readonly condition: NamedCondition },
	situation: Situation
): CommandResult {
	const { id, name, pair } = station.condition;
	const { refusal } = stateOfPair(pair, situation.evaluated.site);
	if (refusal) return refuseAs(refusal, situation.system);
	return append(diagram, { ...station, name, at: pair }, { kind: 'given', pair, conditionId: id });
}

function append(diagram: Diagram, station: NewStation, source: DiagramStation['source'], note?: string): CommandResult {
	const { stationId: id, pathId, name = '' } = station;
	if (!diagram.paths.some((path) => path.id === pathId)) return noSuchPath;
	if (diagram.stations.length >= MAX_STATIONS)
		return refuse('tooManyStations', `A diagram has at most ${MAX_STATIONS} stations. Delete one first.`);
	const next: Diagram = { ...diagram, stations: [...diagram.stations, { id, pathId, name, source }] };
	return { ok: true, diagram: next, label: `add ${stationWords(next, id)}`, itemId: id, ...(note && { note }) };
}
