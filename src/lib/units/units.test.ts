import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fromSI, toSI } from './convert';
import { formatGiven, formatNumber, formatQuantity, parseNumber } from './format';
import { UNITS, type UnitId } from './quantities';

describe('toSI and fromSI', () => {
	it('undo each other for every unit', () => {
		fc.assert(
			fc.property(
				fc.constantFrom(...(Object.keys(UNITS) as UnitId[])),
				fc.double({ min: -1e5, max: 1e5, noNaN: true }),
				(unit, value) => {
					expect(Math.abs(fromSI(toSI({ value, unit }), unit) - value)).toBeLessThan(1e-6);
				}
			)
		);
	});
	it.each([
		// Exact by definition of the international pound, foot and table Btu; 7.686 Btu/lb is the handbook's datum shift.
		[{ value: 32, unit: 'degF' }, 0, 12],
		[{ value: 7000, unit: 'gr/lb' }, 1, 12],
		[{ value: 1, unit: 'kBtu/h' }, 0.29307107, 8],
		[{ value: 1, unit: 'cfm' }, 4.719474432e-4, 12],
		[{ value: 1, unit: 'psi' }, 6.894757, 6],
		[{ value: 1, unit: 'ft3/lb' }, 0.062428, 6]
	] as const)('%j is %d', (given, si, digits) => {
		expect(toSI(given)).toBeCloseTo(si, digits);
	});
	it('puts 7.689 Btu/lb at dry air of 0 °C with the exact conversion', () => {
		expect(fromSI(0, 'Btu/lb')).toBeCloseTo(7.689, 3);
	});
});

describe('formatNumber', () => {
	it('has a true minus, thin spaces from 1 000 on, and no minus zero', () => {
		expect(formatNumber(-1234.56, 1)).toBe('\u22121\u2009234.6');
		expect(formatNumber(-0.04, 1)).toBe('0.0');
		expect(formatNumber(31.64, 1, true)).toBe('+31.6');
		expect(formatNumber(0.01, 1, true)).toBe('0');
	});
	it('shows a quantity in either system', () => {
		expect(formatQuantity(0.0105, 'humidityRatio', 'SI')).toBe('10.50\u2009g/kg');
		expect(formatQuantity(0, 'temperature', 'IP')).toBe('32.0\u2009°F');
	});
});

describe('parseNumber', () => {
	it.each([
		['12.5', 12.5],
		['\u22123', -3],
		['12,5', 12.5],
		['1\u2009550', 1550],
		[' 7 ', 7],
		['', null],
		['abc', null],
		['1e999', null],
		['1.2.3', null]
	])('reads %j as %j', (text, value) => {
		expect(parseNumber(text)).toBe(value);
	});
	it('reads back what formatGiven wrote', () => {
		fc.assert(
			fc.property(fc.integer({ min: -1e6, max: 1e6 }), (n) => {
				expect(parseNumber(formatGiven({ value: n / 100, unit: 'degC' }))).toBe(n / 100);
			})
		);
	});
});
