import { formatQuantity } from '$lib/units/format';
import { producers } from '../path';
import type { Diagram, DiagramStation, Pair } from '../schema';
import { pairAt } from './pairAt';
import { noSuchStation, stationWords, type CommandResult, type Situation } from './types';

/**
 * Deletes a station or a process. What a deleted process produced stays on the chart as a given station at its last
 * state, so that the rest of the path does not move; a station that had no state goes along. A deleted station takes
 * the processes that touch it.
 */
export function deleteItem(
	diagram: Diagram,
	{ itemId }: { readonly itemId: string },
	situation: Situation
): CommandResult {
	const process = diagram.processes.find(({ id }) => id === itemId);
	if (process) {
		const { next, note } = remove(diagram, new Set(), new Set([itemId]), situation);
		return { ok: true, diagram: next, label: 'delete process', ...(note && { note }) };
	}
	if (!diagram.stations.some(({ id }) => id === itemId)) return noSuchStation;
	const label = `delete ${stationWords(diagram, itemId)}`;
	const { next, note } = remove(diagram, new Set([itemId]), new Set(), situation);
	return { ok: true, diagram: next, label, ...(note && { note }) };
}

/** Takes stations and processes out of a diagram, with all that hangs on them and cannot stay. */
export function remove(
	diagram: Diagram,
	stations: ReadonlySet<string>,
	processes: ReadonlySet<string>,
	situation: Situation
): { readonly next: Diagram; readonly note: string | null } {
	const goneStations = new Set(stations);
	const goneProcesses = new Set(processes);
	const released = new Map<string, Pair>();
	const made = producers(diagram);
	// A released station without a state goes too, and what it fed is released in turn: until nothing changes.
	for (let before = -1; before !== goneStations.size + goneProcesses.size + released.size;) {
		before = goneStations.size + goneProcesses.size + released.size;
		for (const { id, inletIds, outletId } of diagram.processes)
			if ([...inletIds, outletId].some((station) => goneStations.has(station))) goneProcesses.add(id);
		for (const station of diagram.stations) {
			const producer = made.get(station.id);
			if (goneStations.has(station.id) || !producer || !goneProcesses.has(producer.id)) continue;
			const pair = lastPair(station, situation);
			if (pair) released.set(station.id, pair);
			else goneStations.add(station.id);
		}
	}
	const next: Diagram = {
		...diagram,
		paths: diagram.paths.map((path) =>
			path.airflow.kind === 'volume' && goneStations.has(path.airflow.stationId ?? '')
				? { ...path, airflow: { ...path.airflow, stationId: null } }
				: path
		),
		stations: diagram.stations
			.filter(({ id }) => !goneStations.has(id))
			.map((station) => {
				const pair = released.get(station.id);
				return pair ? { ...station, source: { kind: 'given' as const, pair } } : station;
			}),
		processes: diagram.processes.filter(({ id }) => !goneProcesses.has(id))
	};
	return { next, note: noteOf(next, released, goneStations.size - stations.size, situation) };
}

/** The station's last state as two values; null when it has none. */
function lastPair({ id }: DiagramStation, { evaluated, system }: Situation): Pair | null {
	const state = evaluated.station(id)?.state;
	if (!state) return null;
	const placed = pairAt(state, [{ property: 'dryBulb' }, { property: 'humidityRatio' }], evaluated.site, system);
	return placed.ok ? placed.pair : null;
}

function noteOf(next: Diagram, released: ReadonlyMap<string, Pair>, lost: number, situation: Situation): string | null {
	const { evaluated, system } = situation;
	const kept = next.stations.flatMap(({ id }, index) => {
		const state = released.has(id) ? evaluated.station(id)?.state : null;
		if (!state) return [];
		const [t, W] = [
			formatQuantity(state.dryBulb, 'temperature', system),
			formatQuantity(state.humidityRatio, 'humidityRatio', system)
		];
		return [`Station ${index + 1} is now given: ${t}, ${W}.`];
	});
	if (lost > 0)
		kept.push(lost === 1 ? 'A station without a state went along.' : `${lost} stations without a state went along.`);
	return kept.join(' ') || null;
}
