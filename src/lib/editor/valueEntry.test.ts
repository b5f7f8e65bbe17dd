import { describe, expect, it } from 'vitest';
import { givenAsShown, readEntry } from './valueEntry';

const bypass = { label: 'Bypass factor', quantity: 'number', system: 'SI', min: 0, max: 1 } as const;

describe('readEntry', () => {
	it('keeps the number as typed in the display unit', () => {
		expect(readEntry('12,5', { label: 'Dry bulb', quantity: 'temperature', system: 'IP' })).toEqual({
			ok: true,
			given: { value: 12.5, unit: 'degF' }
		});
	});
	it('names the field, what was typed and that a number is needed', () => {
		expect(readEntry('warm', bypass)).toEqual({ ok: false, message: 'Bypass factor needs a number, not “warm”.' });
		expect(readEntry('  ', bypass)).toEqual({ ok: false, message: 'Bypass factor needs a number, not nothing.' });
	});
	it('names both bounds in the display unit', () => {
		expect(readEntry('1.4', bypass)).toEqual({ ok: false, message: 'Bypass factor lies between 0.00 and 1.00.' });
	});
	it('accepts a bound as it is shown, in units where it is not exact', () => {
		const rule = { label: 'Temperature', quantity: 'temperature', system: 'IP', min: 0, max: 50 } as const;
		expect(readEntry('122', rule).ok).toBe(true);
		expect(readEntry('122.1', rule).ok).toBe(false);
	});
});

describe('givenAsShown', () => {
	it('keeps what the screen shows', () => {
		expect(givenAsShown(-1234.56, 'power', 'SI')).toEqual({ value: -1234.6, unit: 'kW' });
		expect(givenAsShown(0.00957, 'humidityRatio', 'SI')).toEqual({ value: 9.57, unit: 'g/kg' });
	});
});
