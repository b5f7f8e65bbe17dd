import { fromSI, unitSymbol } from './convert';
import { DISPLAY, UNITS, type Quantity, type UnitId, type UnitSystem } from './quantities';

const MINUS = '\u2212';
const THIN = '\u2009';

/** A number as text: fixed decimals, true minus, thin space in thousands from 1 000 on; never "−0.0". */
export function formatNumber(value: number, decimals: number, signed = false): string {
	const fixed = Math.abs(value).toFixed(decimals);
	const [whole = '0', fraction] = fixed.split('.');
	const grouped = whole.replace(/\B(?=(\d{3})+(?!\d))/g, THIN);
	const text = fraction === undefined ? grouped : `${grouped}.${fraction}`;
	if (Number(fixed) === 0) return signed ? '0' : text;
	if (value < 0) return MINUS + text;
	return signed ? `+${text}` : text;
}

/**
 * Text of an internal SI number in the display unit of a system, without its unit.
 * `signed` puts a sign on every value but 0, as loads are shown. `decimals` departs from the table's.
 */
export function formatValue(
	si: number,
	quantity: Quantity,
	system: UnitSystem,
	options: { signed?: boolean; decimals?: number } = {}
): string {
	const { unit, decimals } = DISPLAY[system][quantity];
	return formatNumber(fromSI(si, unit), options.decimals ?? decimals, options.signed);
}

/** As {@link formatValue}, followed by a thin space and the unit's symbol. */
export function formatQuantity(
	si: number,
	quantity: Quantity,
	system: UnitSystem,
	options: { signed?: boolean; decimals?: number } = {}
): string {
	const symbol = unitSymbol(quantity, system);
	const value = formatValue(si, quantity, system, options);
	return symbol ? `${value}${THIN}${symbol}` : value;
}

/** Text of a typed value in its own unit, with as many decimals as it needs (at most 6). */
export function formatGiven(given: { value: number; unit: UnitId }, withUnit = false): string {
	const text = String(Number(given.value.toFixed(6))).replace('-', MINUS);
	const { symbol } = UNITS[given.unit];
	return withUnit && symbol ? `${text}${THIN}${symbol}` : text;
}

/**
 * A typed number, or null when the text is none. Accepts a true minus, a decimal comma where it cannot be a
 * thousands mark, thin and ordinary spaces between digits, and surrounding spaces. Rejects NaN and infinities.
 */
export function parseNumber(text: string): number | null {
	let plain = text
		.trim()
		.replace(/\u2212/g, '-')
		.replace(/(?<=\d)[\s\u2009\u00a0\u202f](?=\d)/g, '');
	if (/^[-+]?\d*,\d+$/.test(plain) && !plain.includes('.')) plain = plain.replace(',', '.');
	if (!/^[-+]?(\d+\.?\d*|\.\d+)(e[-+]?\d+)?$/i.test(plain)) return null;
	const value = Number(plain);
	return Number.isFinite(value) ? value : null;
}
