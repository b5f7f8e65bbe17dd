import type { PropertyName } from '$lib/physics/types';
import { stateOfPair } from '../evaluate';
import type { Diagram, Pair } from '../schema';
import { pairAt } from './pairAt';
import {
	noSuchStation,
	refuse,
	refuseAs,
	stationWords,
	withStation,
	type CommandResult,
	type Situation
} from './types';

/** Sentence for a third value. */
export const TWO_VALUES = 'Two values fix a state. Open one first.';

const produced = refuse('stationProduced', 'A process produces this station. Change the process, or delete it first.');

/** Gives a station by two values as typed. Values that fix no state are refused; the station stays as it was. */
export function setStationPair(
	diagram: Diagram,
	{ stationId, pair }: { readonly stationId: string; readonly pair: Pair },
	{ evaluated, system }: Situation
): CommandResult {
	const station = diagram.stations.find(({ id }) => id === stationId);
	if (!station) return noSuchStation;
	if (station.source.kind === 'process') return produced;
	if (pair.length > 2) return refuse('thirdValue', TWO_VALUES, pair[2]?.property ?? null);
	const { refusal } = stateOfPair(pair, evaluated.site);
	if (refusal) return refuseAs(refusal, system);
	return {
		ok: true,
		diagram: withStation(diagram, stationId, { source: { kind: 'given', pair } }),
		label: `change ${stationWords(diagram, stationId)}`,
		itemId: stationId
	};
}

/**
 * Gives another property in place of one that was given: its value is that of the present state in round figures, so
 * the station stays where it is.
 */
export function exchangeGivenProperty(
	diagram: Diagram,
	change: { readonly stationId: string; readonly open: PropertyName; readonly give: PropertyName },
	{ evaluated, system }: Situation
): CommandResult {
	const station = diagram.stations.find(({ id }) => id === change.stationId);
	if (!station) return noSuchStation;
	if (station.source.kind === 'process') return produced;
	const { pair } = station.source;
	if (pair.some(({ property }) => property === change.give))
		return refuse('given', 'This value is given already.', change.give);
	if (!pair.some(({ property }) => property === change.open)) return refuse('thirdValue', TWO_VALUES, change.give);
	const state = evaluated.station(station.id)?.state;
	if (!state) return refuse('noState', 'The station has no state to take the value from. Correct its values first.');
	const wanted = pair.map((item) => (item.property === change.open ? { property: change.give } : item));
	const placed = pairAt(state, wanted, evaluated.site, system);
	if (!placed.ok) return refuseAs(placed.refusal, system);
	return {
		ok: true,
		diagram: withStation(diagram, station.id, { source: { kind: 'given', pair: placed.pair } }),
		label: `change what is given at ${stationWords(diagram, station.id)}`,
		itemId: station.id
	};
}
