import type { ProcessKind } from '$lib/physics/processes/types';
import { producers } from '../path';
import type { Diagram, DiagramProcess } from '../schema';
import { checkInlets } from './addProcess';
import { inputOf, roundedSettings } from './processInput';
import {
	noSuchStation,
	refuse,
	refuseAs,
	stationWords,
	withStation,
	type CommandResult,
	type Situation
} from './types';

export interface Join {
	readonly processId: string;
	readonly kind: ProcessKind;
	readonly inletIds: readonly string[];
	readonly outletId: string;
}

/**
 * Joins stations that are there: the settings of the process follow from the given station that becomes its outlet,
 * or the reason is returned why no process of the kind leads there.
 */
export function joinStations(diagram: Diagram, join: Join, { evaluated, system }: Situation): CommandResult {
	const { kind, inletIds, outletId, processId } = join;
	const checked = checkInlets(diagram, kind, inletIds);
	if (!checked.ok) return checked;
	const outlet = diagram.stations.find(({ id }) => id === outletId);
	if (!outlet) return noSuchStation;
	const words = stationWords(diagram, outletId);
	if (inletIds.some((id) => isFedBy(diagram, id, outletId)))
		return refuse('loop', `The air of ${words} comes to this process already. Choose another outlet.`);
	if (outlet.source.kind === 'process')
		return refuse('stationProduced', `Another process produces ${words}. Delete that process first.`);

	const { definition, pathId } = checked;
	const process: DiagramProcess = { id: processId, pathId, kind, inletIds: [...inletIds], outletId, given: {} };
	const input = inputOf(diagram, process, evaluated.site);
	const state = evaluated.station(outletId)?.state;
	if (!input || !state) return refuse('noState', 'A station has no state, or no air flows. Correct it first.');
	const mode = definition.modes[0] ?? [];
	const dryAirKgPerS = input.inlets[0]?.dryAirKgPerS ?? 0;
	const inferred = definition.infer(input.inlets, { state, dryAirKgPerS }, mode);
	if (!inferred.ok) return refuseAs(inferred.refusal, system);
	const given = roundedSettings(kind, input, { exact: inferred.given, before: {} }, system);
	if (!given) return refuse('outOfReach', `${definition.label} does not reach ${words}.`);
	const joined = withStation(diagram, outletId, { pathId, source: { kind: 'process' } });
	return {
		ok: true,
		diagram: { ...joined, processes: [...joined.processes, { ...process, given: { ...given } }] },
		label: `join ${words} by ${definition.label.toLowerCase()}`,
		itemId: processId
	};
}

/** Whether the air of a station comes, directly or not, from another. A station is fed by itself. */
function isFedBy(diagram: Diagram, stationId: string, byId: string): boolean {
	const made = producers(diagram);
	const seen = new Set<string>();
	const visit = (id: string): boolean => {
		if (id === byId) return true;
		if (seen.has(id)) return false;
		seen.add(id);
		return made.get(id)?.inletIds.some(visit) ?? false;
	};
	return visit(stationId);
}
