import { processOf } from '$lib/physics/processes/registry';
import type { ProcessDefinition, ProcessInput, ProcessSolution } from '$lib/physics/processes/types';
import { toSI } from '$lib/units/convert';
import type { Given, UnitSystem } from '$lib/units/quantities';
import { evaluate } from '../evaluate';
import type { Site } from '../evaluated';
import type { Diagram, DiagramProcess } from '../schema';
import { isNear } from './near';
import { nearestGiven } from './nearestGiven';

export type GivenSettings = Readonly<Record<string, Given>>;

/** Inlet streams a process has, or would have, in a diagram; null while an inlet has no state or no air flows. */
export function inputOf(diagram: Diagram, process: DiagramProcess, site: Site): ProcessInput | null {
	const withIt = diagram.processes.some(({ id }) => id === process.id)
		? diagram
		: {
				...diagram,
				stations: diagram.stations.some(({ id }) => id === process.outletId)
					? diagram.stations.map((s) =>
							s.id === process.outletId ? { ...s, source: { kind: 'process' as const } } : s
						)
					: [
							...diagram.stations,
							{ id: process.outletId, pathId: process.pathId, name: '', source: { kind: 'process' as const } }
						],
				processes: [...diagram.processes, process]
			};
	return evaluate(withIt, site).process(process.id)?.input ?? null;
}

export function settingsInSI(given: GivenSettings): Record<string, number> {
	return Object.fromEntries(Object.entries(given).map(([name, value]) => [name, toSI(value)]));
}

/** Names of the mode the given settings are, optional ones left out; the first mode where they are none. */
export function modeOf(definition: ProcessDefinition, given: GivenSettings): readonly string[] {
	const names = Object.keys(given);
	const has = (mode: readonly string[]) => mode.every((name) => names.includes(name));
	return definition.modes.find(has) ?? definition.modes[0] ?? [];
}

/** Settings that may be given beside any mode. */
export function optionalOf(definition: ProcessDefinition, given: GivenSettings): GivenSettings {
	const optional = definition.settings.filter((setting) => setting.optional).map(({ name }) => name);
	return Object.fromEntries(Object.entries(given).filter(([name]) => optional.includes(name)));
}

/**
 * Exact settings of a mode in round figures that still put the outlet where the exact ones do. `before` are the
 * settings so far, whose units and optional values are kept. Null when the exact settings themselves give no outlet.
 */
export function roundedSettings(
	kind: DiagramProcess['kind'],
	input: ProcessInput,
	wanted: { readonly exact: Readonly<Record<string, number>>; readonly before: GivenSettings },
	system: UnitSystem
): GivenSettings | null {
	const definition = processOf(kind);
	if (!definition) return null;
	const optional = optionalOf(definition, wanted.before);
	const solve = (given: Readonly<Record<string, number>>): ProcessSolution | null => {
		const solved = definition.solve({ ...input, given: { ...settingsInSI(optional), ...given } });
		return solved.ok ? solved : null;
	};
	const target = solve(wanted.exact)?.outlet.state;
	if (!target) return null;
	const values = Object.entries(wanted.exact).map(([name, value]) => ({
		name,
		value,
		quantity: definition.settings.find((s) => s.name === name)?.quantity ?? ('number' as const),
		before: wanted.before[name]
	}));
	const found = nearestGiven(values, system, (given) => {
		const state = solve(settingsInSI(given))?.outlet.state;
		return state !== undefined && isNear(state, target);
	});
	return found && { ...optional, ...found };
}
