import { processOf } from '$lib/physics/processes/registry';
import type { ProcessDefinition, ProcessInput, ProcessKind } from '$lib/physics/processes/types';
import type { ChartPoint } from '$lib/physics/types';
import { fromSI, displayUnit } from '$lib/units/convert';
import type { Given, UnitSystem } from '$lib/units/quantities';
import type { Diagram, DiagramProcess } from '../schema';
import { MAX_STATIONS } from './addStation';
import { inputOf, roundedSettings, settingsInSI, type GivenSettings } from './processInput';
import { refuse, refuseAs, type CommandResult, type Refused, type Situation } from './types';

export interface NewProcess {
	readonly processId: string;
	readonly outletId: string;
	readonly kind: ProcessKind;
	/** In the order of the process's inlets. */
	readonly inletIds: readonly string[];
	readonly outletName?: string;
	/** Settings as typed; */
	readonly given?: GivenSettings;
	/** or where its outlet is dropped; with neither, a modest start along its locus. */
	readonly to?: ChartPoint;
}

// A new process that nobody dragged shows itself: 10 K or 5 g/kg, and no more than half of what is possible.
const START = { dryBulb: 10, humidityRatio: 0.005, share: 0.5 };

/** Adds a process and the station it produces, on the path of its first inlet. */
export function addProcess(diagram: Diagram, added: NewProcess, { evaluated, system }: Situation): CommandResult {
	const { kind, inletIds, processId, outletId } = added;
	const checked = checkInlets(diagram, kind, inletIds);
	if (!checked.ok) return checked;
	const { definition, pathId } = checked;
	if (diagram.stations.length >= MAX_STATIONS)
		return refuse('tooManyStations', `A diagram has at most ${MAX_STATIONS} stations. Delete one first.`);
	const process: DiagramProcess = { id: processId, pathId, kind, inletIds: [...inletIds], outletId, given: {} };
	const input = inputOf(diagram, process, evaluated.site);
	if (!input)
		return refuse(
			'noInlet',
			'The air that enters has no state or no airflow. Correct the stations and the path first.'
		);

	const given = added.given ?? settingsFor(definition, input, added.to, system);
	if ('ok' in given) return given as Refused;
	const solved = definition.solve({ ...input, given: settingsInSI(given) });
	if (!solved.ok) return refuseAs(solved.refusal, system);
	const outlet = { id: outletId, pathId, name: added.outletName ?? '', source: { kind: 'process' as const } };
	return {
		ok: true,
		diagram: {
			...diagram,
			stations: [...diagram.stations, outlet],
			processes: [...diagram.processes, { ...process, given: { ...given } }]
		},
		label: `add ${definition.label.toLowerCase()}`,
		itemId: outletId
	};
}

type Checked = { readonly ok: true; readonly definition: ProcessDefinition; readonly pathId: string };

/** Whether a process of a kind can start at these stations. */
export function checkInlets(diagram: Diagram, kind: ProcessKind, inletIds: readonly string[]): Checked | Refused {
	const definition = processOf(kind);
	if (!definition) return refuse('processUnknown', 'This version does not draw this process.');
	const inlets = inletIds.map((id) => diagram.stations.find((station) => station.id === id));
	const first = inlets[0];
	if (!first || inlets.includes(undefined)) return refuse('inletMissing', 'A process starts at a station. Choose one.');
	if (inletIds.length !== definition.inletCount || new Set(inletIds).size !== inletIds.length)
		return refuse(
			'inletCount',
			definition.inletCount === 2
				? `${definition.label} joins two streams. Choose two stations.`
				: `${definition.label} has one inlet. Choose one station.`
		);
	return { ok: true, definition, pathId: first.pathId };
}

function settingsFor(
	definition: ProcessDefinition,
	input: ProcessInput,
	to: ChartPoint | undefined,
	system: UnitSystem
): GivenSettings | Refused {
	const mode = definition.modes[0] ?? [];
	const presets = to ? null : presetsOf(definition, mode, system);
	if (presets && definition.solve({ ...input, given: settingsInSI(presets) }).ok) return presets;
	const inferred = definition.dragTo(
		{ ...input, given: settingsInSI(presets ?? {}) },
		mode,
		to ?? startOf(definition, input)
	);
	if (!inferred.ok) return refuseAs(inferred.refusal, system);
	return (
		roundedSettings(definition.kind, input, { exact: inferred.given, before: {} }, system) ??
		refuse('outOfReach', `${definition.label} does not reach this point. Drop it nearer to its line.`)
	);
}

/** Presets of a mode in the display's units; null when one has none. */
function presetsOf(definition: ProcessDefinition, mode: readonly string[], system: UnitSystem): GivenSettings | null {
	const given: Record<string, Given> = {};
	for (const name of mode) {
		const setting = definition.settings.find((s) => s.name === name);
		if (setting?.preset === undefined) return null;
		const unit = displayUnit(setting.quantity, system);
		given[name] = { value: Number(fromSI(setting.preset, unit).toPrecision(6)), unit };
	}
	return given;
}

/** A point some way along the locus, towards its farther end. */
function startOf(definition: ProcessDefinition, input: ProcessInput): ChartPoint {
	const inlet = input.inlets[0]?.state ?? { dryBulb: NaN, humidityRatio: NaN };
	const along = (p: ChartPoint) => ({
		dryBulb: p.dryBulb - inlet.dryBulb,
		humidityRatio: p.humidityRatio - inlet.humidityRatio
	});
	const length = (p: ChartPoint) =>
		Math.hypot(along(p).dryBulb / START.dryBulb, along(p).humidityRatio / START.humidityRatio);
	const ends = definition.locus(input).filter((_, i, all) => i === 0 || i === all.length - 1);
	const far = ends.reduce<ChartPoint>((best, end) => (length(end) > length(best) ? end : best), inlet);
	const share = Math.min(START.share, 1 / Math.max(length(far), 1e-9));
	return {
		dryBulb: inlet.dryBulb + share * along(far).dryBulb,
		humidityRatio: inlet.humidityRatio + share * along(far).humidityRatio
	};
}
