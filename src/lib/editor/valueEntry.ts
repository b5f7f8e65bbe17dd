import { displayUnit, toSI } from '$lib/units/convert';
import { formatQuantity, formatValue, parseNumber } from '$lib/units/format';
import type { Given, Quantity, UnitSystem } from '$lib/units/quantities';

/** What a field needs to read a typed number: its words, its unit and, where known, its hard bounds (SI). */
export interface EntryRule {
	readonly label: string;
	readonly quantity: Quantity;
	readonly system: UnitSystem;
	readonly min?: number;
	readonly max?: number;
}

export type Entry = { readonly ok: true; readonly given: Given } | { readonly ok: false; readonly message: string };

// A bound such as 0.1 is not exact in another unit: what is shown as the bound must be accepted as typed.
const ROUNDING = 1e-9;

/** A typed number in the display unit, or the sentence that names field, value and bound. */
export function readEntry(text: string, rule: EntryRule): Entry {
	const { label, quantity, system, min = -Infinity, max = Infinity } = rule;
	const value = parseNumber(text);
	if (value === null) {
		const shown = text.trim() === '' ? 'nothing' : `“${text.trim()}”`;
		return { ok: false, message: `${label} needs a number, not ${shown}.` };
	}
	const given: Given = { value, unit: displayUnit(quantity, system) };
	const si = toSI(given);
	const slack = ROUNDING * Math.max(1, Math.abs(si));
	if (si >= min - slack && si <= max + slack) return { ok: true, given };
	const show = (bound: number): string => formatQuantity(bound, quantity, system);
	const range =
		Number.isFinite(min) && Number.isFinite(max)
			? `lies between ${formatValue(min, quantity, system)} and ${show(max)}`
			: si < min
				? `is at least ${show(min)}`
				: `is at most ${show(max)}`;
	return { ok: false, message: `${label} ${range}.` };
}

/** The number a reader sees, as a given value: closing a lock keeps what is on the screen. */
export function givenAsShown(si: number, quantity: Quantity, system: UnitSystem): Given {
	const value = parseNumber(formatValue(si, quantity, system));
	if (value === null) throw new RangeError(`No number to keep: ${si}`);
	return { value, unit: displayUnit(quantity, system) };
}
