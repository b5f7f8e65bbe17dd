import { processOf } from '$lib/physics/processes/registry';
import type { ProcessDefinition } from '$lib/physics/processes/types';
import { UNITS } from '$lib/units/quantities';
import type { Diagram } from '../schema';
import { inputOf, optionalOf, roundedSettings, settingsInSI, type GivenSettings } from './processInput';
import { noSuchProcess, refuse, refuseAs, type CommandResult, type Refused, type Situation } from './types';

const COUNT = ['No value', 'One value', 'Two values', 'Three values', 'Four values'];

/**
 * Gives a process its settings as typed: exactly those of one mode, and any optional ones. Refused with the reason
 * when they lead nowhere; a process whose inlet has no state takes what it gets, for it cannot be tried.
 */
export function setProcessGiven(
	diagram: Diagram,
	{ processId, given }: { readonly processId: string; readonly given: GivenSettings },
	{ evaluated, system }: Situation
): CommandResult {
	const process = diagram.processes.find(({ id }) => id === processId);
	const definition = process && processOf(process.kind);
	if (!process || !definition) return noSuchProcess;
	const wrong = checkNames(definition, given);
	if (wrong) return wrong;
	const input = inputOf(diagram, { ...process, given }, evaluated.site);
	const solved = input && definition.solve({ ...input, given: settingsInSI(given) });
	if (solved && !solved.ok) return refuseAs(solved.refusal, system);
	return { ...withGiven(diagram, processId, given), label: `change ${definition.label.toLowerCase()}` };
}

/** Gives a process by another mode; the new values are those it has now, in round figures, so nothing moves. */
export function changeProcessMode(
	diagram: Diagram,
	{ processId, mode }: { readonly processId: string; readonly mode: readonly string[] },
	{ evaluated, system }: Situation
): CommandResult {
	const process = diagram.processes.find(({ id }) => id === processId);
	const definition = process && processOf(process.kind);
	if (!process || !definition) return noSuchProcess;
	const solution = evaluated.process(processId);
	if (!solution?.input || !solution.result?.ok)
		return refuse('noState', 'The process has no outlet to take the values from. Correct its settings first.');
	const { settings } = solution.result;
	const exact = Object.fromEntries(mode.map((name) => [name, settings[name] ?? NaN]));
	const wrong = checkNames(definition, { ...optionalOf(definition, process.given), ...asNumbers(exact) });
	if (wrong) return wrong;
	const given = roundedSettings(process.kind, solution.input, { exact, before: process.given }, system);
	if (!given) return refuse('modeUnfit', 'The process cannot be given by these values.');
	return {
		...withGiven(diagram, processId, given),
		label: `change what is given for ${definition.label.toLowerCase()}`
	};
}

const asNumbers = (settings: Readonly<Record<string, number>>): GivenSettings =>
	Object.fromEntries(Object.entries(settings).map(([name, value]) => [name, { value, unit: 'one' as const }]));

function checkNames(definition: ProcessDefinition, given: GivenSettings): Refused | null {
	const unknown = Object.keys(given).find((name) => !definition.settings.some((s) => s.name === name));
	if (unknown) return refuse('settingUnknown', `${definition.label} has no value "${unknown}".`, unknown);
	const optional = Object.keys(optionalOf(definition, given));
	const names = Object.keys(given).filter((name) => !optional.includes(name));
	const fits = definition.modes.some((mode) => mode.length === names.length && mode.every((n) => names.includes(n)));
	const bad = Object.entries(given).find(([, value]) => !Number.isFinite(value.value) || !UNITS[value.unit]);
	if (bad) return refuse('notANumber', `${bad[0]} needs a number.`, bad[0]);
	if (fits) return null;
	const most = Math.max(...definition.modes.map((mode) => mode.length));
	const count = COUNT[most] ?? `${most} values`;
	return names.length > most
		? refuse('thirdValue', `${count} ${most === 1 ? 'fixes' : 'fix'} this process. Open one first.`, names.at(-1))
		: refuse('modeIncomplete', `${definition.label} cannot be given by these values. Give another one.`, names.at(-1));
}

function withGiven(diagram: Diagram, processId: string, given: GivenSettings) {
	const processes = diagram.processes.map((p) => (p.id === processId ? { ...p, given: { ...given } } : p));
	return { ok: true as const, diagram: { ...diagram, processes }, itemId: processId };
}
