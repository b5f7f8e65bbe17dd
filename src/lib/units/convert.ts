import { DISPLAY, UNITS, type Given, type Quantity, type UnitId, type UnitSystem } from './quantities';

/** Internal SI value of a number in the named unit. Linear and exact; any finite input. */
export function toSI(given: Given): number {
	const unit = UNITS[given.unit];
	return given.value * unit.factor + unit.offset;
}

/** Value in the named unit of an internal SI number: the inverse of {@link toSI}. */
export function fromSI(si: number, unit: UnitId): number {
	const { factor, offset } = UNITS[unit];
	return (si - offset) / factor;
}

/** The unit a system shows a quantity in. */
export function displayUnit(quantity: Quantity, system: UnitSystem): UnitId {
	return DISPLAY[system][quantity].unit;
}

/** Symbol of that unit, such as "g/kg"; empty for plain numbers. */
export function unitSymbol(quantity: Quantity, system: UnitSystem): string {
	return UNITS[DISPLAY[system][quantity].unit].symbol;
}
