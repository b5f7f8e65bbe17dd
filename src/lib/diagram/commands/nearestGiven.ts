import { displayUnit, fromSI } from '$lib/units/convert';
import { DISPLAY, UNITS, type Given, type Quantity, type UnitSystem } from '$lib/units/quantities';

export interface Wanted {
	readonly name: string;
	readonly quantity: Quantity;
	/** SI. */
	readonly value: number;
	/** As it was typed before: its unit is kept. */
	readonly before?: Given;
}

const FINEST = 8;

/**
 * Values as a person would type them that stand for the wanted ones. Rounded to the decimals of the display, up or
 * down where the nearest is not accepted (a heater's outlet must not fall below its inlet), finer where no coarse
 * value is. `accept` says whether a set will do; null when none does.
 */
export function nearestGiven(
	wanted: readonly Wanted[],
	system: UnitSystem,
	accept: (given: Readonly<Record<string, Given>>) => boolean
): Record<string, Given> | null {
	for (let finer = 0; finer <= FINEST; finer++) {
		const choices = wanted.map((value) => roundings(value, system, finer));
		for (const given of combinations(wanted, choices)) if (accept(given)) return given;
	}
	return null;
}

/** Nearest, next and previous round number in the unit it was typed in, else the display's. */
function roundings({ quantity, value, before }: Wanted, system: UnitSystem, finer: number): Given[] {
	const shown = displayUnit(quantity, system);
	const unit = before && UNITS[before.unit].quantity === quantity ? before.unit : shown;
	const coarser = Math.round(Math.log10(UNITS[unit].factor / UNITS[shown].factor));
	const decimals = Math.max(0, DISPLAY[system][quantity].decimals + coarser) + finer;
	const exact = fromSI(value, unit);
	const step = 10 ** -decimals;
	return [0, step, -step].map((off) => ({ value: Number((exact + off).toFixed(decimals)) + 0, unit }));
}

function combinations(wanted: readonly Wanted[], choices: readonly Given[][]): Record<string, Given>[] {
	return wanted.reduce<Record<string, Given>[]>(
		(sets, { name }, i) => (choices[i] ?? []).flatMap((given) => sets.map((set) => ({ ...set, [name]: given }))),
		[{}]
	);
}
