import { airState } from '$lib/physics/air/airState';
import { processOf } from '$lib/physics/processes/registry';
import type { ProcessInput, ProcessResult } from '$lib/physics/processes/types';
import type { AirState, Issue, KnownPair, Refusal, Stream } from '$lib/physics/types';
import { toSI } from '$lib/units/convert';
import type { EvaluatedDiagram, EvaluatedPath, EvaluatedProcess, EvaluatedStation, Site } from './evaluated';
import { orderOfPath, producers } from './path';
import type { Diagram, DiagramPath, DiagramProcess, Pair } from './schema';

/** Standard air, kg of dry air per m³: common practice for rated airflows. */
const STANDARD_AIR = 1.2;
/** A flow given by volume at a produced station depends on itself; so many rounds settle every sound path. */
const FLOW_ROUNDS = 60;

type Outcome =
	{ readonly state: AirState; readonly refusal: null } | { readonly state: null; readonly refusal: Refusal };

/**
 * Works out every state, duty and balance of a diagram at its site. Never throws on what a user can enter: a station
 * or process that fails carries its refusal, so does what hangs on it, and the rest is computed.
 */
export function evaluate(document: Diagram, site: Site): EvaluatedDiagram {
	const flows = new Map<string, number | Refusal>();
	for (const path of document.paths) flows.set(path.id, flowOf(path, document, site));
	const { outcomes, results } = solveAll(document, site, flows);

	const flowAt = (pathId: string) => {
		const flow = flows.get(pathId);
		return typeof flow === 'number' ? flow : null;
	};
	const stations = document.stations.map((station, index): EvaluatedStation => {
		const outcome = outcomes.get(station.id) ?? missing('stationMissing');
		const dryAirKgPerS = outcome.state && flowAt(station.pathId);
		return {
			id: station.id,
			number: index + 1,
			name: station.name,
			pathId: station.pathId,
			origin: station.source.kind,
			given: station.source.kind === 'given' ? station.source.pair.map(({ property }) => property) : [],
			...outcome,
			dryAirKgPerS,
			volumeM3PerS: outcome.state && dryAirKgPerS !== null ? dryAirKgPerS * outcome.state.specificVolume : null
		};
	});
	const processes = document.processes.map((process): EvaluatedProcess => {
		const solved = results.get(process.id);
		return {
			id: process.id,
			kind: process.kind,
			label: process.name || (processOf(process.kind)?.label ?? process.kind),
			pathId: process.pathId,
			inletIds: process.inletIds,
			outletId: process.outletId,
			given: Object.keys(process.given),
			input: solved?.input ?? null,
			result: solved?.result ?? null
		};
	});
	const stationById = new Map(stations.map((s) => [s.id, s]));
	const processById = new Map(processes.map((p) => [p.id, p]));
	return {
		site,
		stations,
		processes,
		paths: document.paths.map((path) => pathTotals(path, document, processes, flows.get(path.id))),
		issues: processes.flatMap(({ id, result }): Issue[] =>
			result?.ok ? result.issues.map((issue) => ({ ...issue, itemId: id })) : []
		),
		station: (id) => stationById.get(id),
		process: (id) => processById.get(id)
	};
}

const missing = (code: string, field = code): Outcome => ({
	state: null,
	refusal: { code, field, value: NaN, quantity: 'number' }
});

interface Solved {
	readonly input: ProcessInput | null;
	readonly result: ProcessResult;
}

/** States of all stations and results of all processes, each once, inlets before outlets. */
function solveAll(document: Diagram, site: Site, flows: ReadonlyMap<string, number | Refusal>) {
	const made = producers(document);
	const stations = new Map(document.stations.map((s) => [s.id, s]));
	const outcomes = new Map<string, Outcome>();
	const results = new Map<string, Solved>();
	const open: string[] = [];

	const numberOf = (id: string) => document.stations.findIndex((s) => s.id === id) + 1;
	const visit = (id: string): Outcome => {
		const done = outcomes.get(id);
		if (done) return done;
		const station = stations.get(id);
		if (!station) return missing('stationMissing');
		if (open.includes(id)) return missing('loop', [...open.slice(open.indexOf(id)), id].map(numberOf).join(' → '));
		open.push(id);
		const producer = made.get(id);
		const outcome =
			station.source.kind === 'given'
				? stateOfPair(station.source.pair, site)
				: producer
					? outletOf(producer)
					: missing('nothingFeedsStation');
		open.pop();
		outcomes.set(id, outcome);
		return outcome;
	};
	const outletOf = (process: DiagramProcess): Outcome => {
		const solved = solve(process, process.inletIds.map(visit), flows.get(process.pathId));
		results.set(process.id, solved);
		return solved.result.ok
			? { state: solved.result.outlet.state, refusal: null }
			: { state: null, refusal: solved.result.refusal };
	};
	document.stations.forEach(({ id }) => visit(id));
	return { outcomes, results };
}

function solve(process: DiagramProcess, inlets: Outcome[], flow: number | Refusal | undefined): Solved {
	const failed = (refusal: Refusal): Solved => ({ input: null, result: { ok: false, refusal } });
	const bad = inlets.find((inlet) => inlet.state === null);
	if (bad?.refusal) return failed(bad.refusal);
	if (typeof flow !== 'number')
		return failed(flow ?? { code: 'flowMissing', field: 'airflow', value: NaN, quantity: 'massFlow' });
	const definition = processOf(process.kind);
	if (!definition) return failed({ code: 'processUnknown', field: process.kind, value: NaN, quantity: 'number' });
	const input: ProcessInput = {
		inlets: inlets.flatMap(({ state }): Stream[] => (state ? [{ state, dryAirKgPerS: flow }] : [])),
		given: Object.fromEntries(Object.entries(process.given).map(([name, given]) => [name, toSI(given)]))
	};
	return { input, result: definition.solve(input) };
}

/** State of two properties as typed, at a site. */
export function stateOfPair(pair: Pair, site: Site): Outcome {
	const known = Object.fromEntries(pair.map(({ property, given }) => [property, toSI(given)])) as KnownPair;
	const result = airState(known, site.pressureKPa, site.relations);
	return result.ok ? { state: result.state, refusal: null } : { state: null, refusal: result.refusal };
}

/** Dry-air flow of a path in kg/s, or why it cannot be told. */
function flowOf(path: DiagramPath, document: Diagram, site: Site): number | Refusal {
	const { airflow } = path;
	const typed = toSI(airflow.given);
	const quantity = airflow.kind === 'mass' ? 'massFlow' : 'volumeFlow';
	if (!(typed >= 0 && typed <= 1e5))
		return { code: 'airflowRange', field: 'airflow', value: typed, quantity, min: 0, max: 1e5 };
	if (airflow.kind === 'mass') return typed;
	if (airflow.kind === 'standard') return typed * STANDARD_AIR;
	const own = document.stations.filter((s) => s.pathId === path.id);
	const at = own.find((s) => s.id === airflow.stationId) ?? own.find((s) => s.source.kind === 'given');
	if (!at) return { code: 'airflowNeedsStation', field: 'airflow', value: typed, quantity };
	let flow = typed * STANDARD_AIR;
	for (let round = 0; round < FLOW_ROUNDS; round++) {
		const flows = new Map(document.paths.map((p) => [p.id, flow]));
		const outcome = solveAll(document, site, flows).outcomes.get(at.id);
		if (!outcome?.state)
			return outcome?.refusal ?? { code: 'airflowNeedsStation', field: 'airflow', value: typed, quantity };
		const next = typed / outcome.state.specificVolume;
		if (Math.abs(next - flow) <= 1e-13 * next) return next;
		flow = next;
	}
	return { code: 'airflowDoesNotSettle', field: 'airflow', value: typed, quantity };
}

function pathTotals(
	path: DiagramPath,
	document: Diagram,
	processes: readonly EvaluatedProcess[],
	flow: number | Refusal | undefined
): EvaluatedPath {
	const duties = processes
		.filter((p) => p.pathId === path.id)
		.flatMap(({ result }) => (result?.ok ? [result.duties] : []));
	const sum = (pick: (d: (typeof duties)[number]) => number) => duties.reduce((total, d) => total + pick(d), 0);
	return {
		id: path.id,
		name: path.name,
		dryAirKgPerS: typeof flow === 'number' ? flow : null,
		refusal: typeof flow === 'object' ? flow : null,
		order: orderOfPath(document, path.id),
		totalKW: sum((d) => d.total),
		sensibleKW: sum((d) => d.sensible),
		latentKW: sum((d) => d.latent),
		moistureKgPerS: sum((d) => d.moistureKgPerS)
	};
}
