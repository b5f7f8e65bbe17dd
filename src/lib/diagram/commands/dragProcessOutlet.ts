import { processOf } from '$lib/physics/processes/registry';
import type { Inference, ProcessDefinition, ProcessInput } from '$lib/physics/processes/types';
import { airState } from '$lib/physics/air/airState';
import type { ChartPoint } from '$lib/physics/types';
import type { Site } from '../evaluated';
import type { Diagram, DiagramProcess } from '../schema';
import { inputOf, modeOf, roundedSettings, settingsInSI } from './processInput';
import { noSuchProcess, refuse, refuseAs, stationWords, type CommandResult, type Situation } from './types';

export interface OutletDrag {
	readonly processId: string;
	readonly to: ChartPoint;
	/** Leaves the locus: other settings are given where the present ones do not reach the point. */
	readonly free?: boolean;
}

// A flow given by volume at the outlet changes with it, and a duty with the flow: so often the settings are sought.
const FLOW_ROUNDS = 4;
const SAME_FLOW = 1e-9;

/**
 * Moves what a process produces to the place of its locus nearest to a point: the settings that are given stay the
 * given ones and take new values in round figures.
 */
export function dragProcessOutlet(diagram: Diagram, drag: OutletDrag, { evaluated, system }: Situation): CommandResult {
	const process = diagram.processes.find(({ id }) => id === drag.processId);
	const definition = process && processOf(process.kind);
	if (!process || !definition) return noSuchProcess;
	let input = evaluated.process(process.id)?.input ?? inputOf(diagram, process, evaluated.site);
	let result: CommandResult | null = null;
	for (let round = 0; input && round < FLOW_ROUNDS; round++) {
		result = dragOnce(diagram, process, definition, { ...drag, input, situation: { evaluated, system } });
		if (!result.ok || flowIsFixed(diagram, process)) return result;
		const next: ProcessInput | null = inputOf(result.diagram, process, evaluated.site);
		if (!next || flowsAgree(input, next)) return result;
		input = next;
	}
	return result ?? refuse('noInlet', 'The air that enters this process has no state. Correct the stations before it.');
}

interface Step extends OutletDrag {
	readonly input: ProcessInput;
	readonly situation: Situation;
}

function dragOnce(diagram: Diagram, process: DiagramProcess, definition: ProcessDefinition, step: Step): CommandResult {
	const { input, situation, to } = step;
	const mode = modeOf(definition, process.given);
	const now = { ...input, given: settingsInSI(process.given) };
	const inferred = step.free
		? inferFreely(definition, now, to, situation.evaluated.site)
		: definition.dragTo(now, mode, to);
	if (!inferred.ok) return refuseAs(inferred.refusal, situation.system);
	const before = process.given;
	const given = roundedSettings(process.kind, input, { exact: inferred.given, before }, situation.system);
	if (!given) return refuse('outOfReach', 'The process does not reach this point. Move it nearer to its line.');
	const opened = mode.filter((name) => !(name in given)).map((name) => labelOf(definition, name).toLowerCase());
	const note = opened.length > 0 ? `Opened ${opened.join(' and ')}.` : undefined;
	return {
		ok: true,
		diagram: {
			...diagram,
			processes: diagram.processes.map((p) => (p.id === process.id ? { ...p, given: { ...given } } : p))
		},
		label: `move ${stationWords(diagram, process.outletId)}`,
		itemId: process.outletId,
		...(note && { note })
	};
}

/** The first mode, the present one before all, whose settings put the outlet exactly at the point. */
function inferFreely(definition: ProcessDefinition, now: ProcessInput, to: ChartPoint, site: Site): Inference {
	const inlet = now.inlets[0];
	const held = airState({ dryBulb: to.dryBulb, humidityRatio: to.humidityRatio }, site.pressureKPa, site.relations);
	if (!held.ok || !inlet)
		return held.ok ? definition.dragTo(now, definition.modes[0] ?? [], to) : { ok: false, refusal: held.refusal };
	const outlet = { state: held.state, dryAirKgPerS: now.inlets.reduce((sum, s) => sum + s.dryAirKgPerS, 0) };
	const names = Object.keys(now.given);
	const present = (mode: readonly string[]) => Number(mode.every((name) => names.includes(name)));
	const tries = [...definition.modes]
		.sort((a, b) => present(b) - present(a))
		.map((mode) => definition.infer(now.inlets, outlet, mode));
	return tries.find(({ ok }) => ok) ?? tries[0] ?? definition.dragTo(now, [], to);
}

const labelOf = (definition: ProcessDefinition, name: string): string =>
	definition.settings.find((setting) => setting.name === name)?.label ?? name;

const flowIsFixed = (diagram: Diagram, { pathId }: DiagramProcess): boolean =>
	diagram.paths.find(({ id }) => id === pathId)?.airflow.kind !== 'volume';

const flowsAgree = (a: ProcessInput, b: ProcessInput): boolean =>
	a.inlets.every(({ dryAirKgPerS }, i) => {
		const other = b.inlets[i]?.dryAirKgPerS ?? NaN;
		return Math.abs(other - dryAirKgPerS) <= SAME_FLOW * dryAirKgPerS;
	});
