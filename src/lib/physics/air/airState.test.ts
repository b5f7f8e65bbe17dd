import fc from 'fast-check';
import psychrolib from 'psychrolib';
import { describe, expect, it } from 'vitest';
import ideal200 from '../../../../tests/reference/ideal200.json';
import reference from '../../../../tests/reference/public.json';
import type { AirState, KnownPair, PropertyName } from '../types';
import { airState } from './airState';

type Row = Record<string, number | boolean | string>;
const NAME: Record<string, PropertyName> = {
	t: 'dryBulb',
	wb: 'wetBulb',
	dp: 'dewPoint',
	rh: 'relativeHumidity',
	W: 'humidityRatio',
	h: 'enthalpy',
	v: 'specificVolume',
	mu: 'degreeOfSaturation'
};
const stateOf = (known: KnownPair, pressureKPa: number): AirState => {
	const result = airState(known, pressureKPa);
	if (!result.ok) throw new Error(`${JSON.stringify(known)} at ${pressureKPa}: ${JSON.stringify(result.refusal)}`);
	return result.state;
};
const states = [...reference.states, ...ideal200.states] as unknown as {
	id: string;
	p: number;
	inputs: Row;
	ideal: Row;
}[];

describe('airState against the reference tables (ideal-gas relations of the handbook, solved to 1e-12)', () => {
	it.each(states.map((s) => [s.id, s] as const))('%s', (_, row) => {
		const known = Object.fromEntries(Object.entries(row.inputs).map(([k, v]) => [NAME[k], v])) as KnownPair;
		const state = stateOf(known, row.p / 1000);
		for (const [key, name] of Object.entries(NAME)) {
			const expected = Number(row.ideal[key]);
			const temperature = key === 't' || key === 'wb' || key === 'dp';
			// The tables carry 12 significant digits: 1e-9 relative, 1e-9 K and what the last printed digit leaves open.
			const tolerance = temperature ? 2e-9 : 1e-9 * Math.max(Math.abs(expected), 1e-4);
			expect(Math.abs(state[name] - expected), `${key}: ${state[name]} for ${expected}`).toBeLessThanOrEqual(tolerance);
		}
	});
});

describe('airState', () => {
	const dryBulb = fc.double({ min: -40, max: 60, noNaN: true });
	const relativeHumidity = fc.double({ min: 0.01, max: 1, noNaN: true });
	const pressure = fc.double({ min: 54, max: 104, noNaN: true });

	it('agrees with the function library psychrolib', () => {
		psychrolib.SetUnitSystem(psychrolib.SI);
		fc.assert(
			fc.property(dryBulb, relativeHumidity, pressure, (t, rh, p) => {
				const state = stateOf({ dryBulb: t, relativeHumidity: rh }, p);
				const W = psychrolib.GetHumRatioFromRelHum(t, rh, p * 1000);
				// psychrolib floors the humidity ratio at 1e-7.
				fc.pre(W > 1e-6);
				expect(state.humidityRatio / W).toBeCloseTo(1, 9);
				expect(state.enthalpy).toBeCloseTo(psychrolib.GetMoistAirEnthalpy(t, W) / 1000, 7);
				expect(state.specificVolume / psychrolib.GetMoistAirVolume(t, W, p * 1000)).toBeCloseTo(1, 9);
			})
		);
	});

	it('returns to the same state from every pair', () => {
		const pairs: [PropertyName, PropertyName][] = [
			['dryBulb', 'wetBulb'],
			['dryBulb', 'dewPoint'],
			['dryBulb', 'humidityRatio'],
			['dryBulb', 'enthalpy'],
			['dryBulb', 'specificVolume'],
			['relativeHumidity', 'humidityRatio'],
			['relativeHumidity', 'enthalpy'],
			['humidityRatio', 'enthalpy'],
			['dewPoint', 'enthalpy'],
			['humidityRatio', 'specificVolume'],
			['enthalpy', 'specificVolume']
		];
		fc.assert(
			fc.property(dryBulb, relativeHumidity, pressure, fc.constantFrom(...pairs), (t, rh, p, [a, b]) => {
				const first = stateOf({ dryBulb: t, relativeHumidity: rh }, p);
				const again = stateOf({ [a]: first[a], [b]: first[b] }, p);
				expect(Math.abs(again.dryBulb - t)).toBeLessThan(1e-6);
				expect(Math.abs(again.humidityRatio - first.humidityRatio)).toBeLessThan(1e-9);
			}),
			{ numRuns: 500 }
		);
	});

	it('orders dew point, wet bulb and dry bulb', () => {
		fc.assert(
			fc.property(fc.double({ min: 2, max: 60, noNaN: true }), relativeHumidity, pressure, (t, rh, p) => {
				const state = stateOf({ dryBulb: t, relativeHumidity: rh }, p);
				fc.pre(state.diagnostics.otherWetBulb === null && state.dewPoint > 0.01);
				expect(state.dewPoint).toBeLessThanOrEqual(state.wetBulb + 1e-9);
				expect(state.wetBulb).toBeLessThanOrEqual(t + 1e-9);
			})
		);
	});

	it('never throws and never returns a number that is none, whatever it is given', () => {
		const name = fc.constantFrom(...(Object.values(NAME) as PropertyName[]));
		const value = fc.oneof(
			fc.double(),
			fc.constantFrom(NaN, Infinity, -Infinity, -0, 1e308),
			fc.double({ min: -60, max: 100 })
		);
		fc.assert(
			fc.property(name, name, value, value, fc.oneof(fc.double(), pressure), (a, b, x, y, p) => {
				const result = airState({ [a]: x, [b]: y }, p);
				const numbers = result.ok ? Object.values(result.state).filter((v) => typeof v === 'number') : [];
				expect(numbers.some(Number.isNaN)).toBe(false);
			}),
			{ numRuns: 2000 }
		);
	});

	it('refuses with the field, the value and the bound', () => {
		const code = (known: KnownPair, p = 101.325) => {
			const result = airState(known, p);
			return result.ok ? 'state' : `${result.refusal.code} ${result.refusal.field}`;
		};
		expect(code({ dryBulb: 40, wetBulb: 5 })).toBe('belowDryAir wetBulb');
		expect(code({ dryBulb: 20, humidityRatio: 0.02 })).toBe('supersaturated humidityRatio');
		expect(code({ dryBulb: 20, relativeHumidity: 1.1 })).toBe('outOfRange relativeHumidity');
		expect(code({ dewPoint: 10, humidityRatio: 0.008 })).toBe('pairFixesNoState dewPoint');
		expect(code({ enthalpy: 50, wetBulb: 18 })).toBe('pairFixesNoState wetBulb');
		expect(code({ dryBulb: 20, relativeHumidity: 0.5 }, 1013.25)).toBe('pressureLooksLikeHPa pressure');
		expect(code({ dryBulb: 20, relativeHumidity: 0.5 }, 14.696)).toBe('pressureLooksLikePsi pressure');
		expect(code({ dryBulb: 20, relativeHumidity: 1 + 1e-10 })).toBe('state');
		expect(code({ dryBulb: 20, humidityRatio: 0 })).toBe('state');
	});

	it('names the lowest possible wet bulb of an impossible one', () => {
		const result = airState({ dryBulb: 40, wetBulb: 5 }, 101.325);
		expect(result.ok).toBe(false);
		if (!result.ok)
			expect(result.refusal.min).toBeCloseTo(stateOf({ dryBulb: 40, humidityRatio: 0 }, 101.325).wetBulb, 9);
	});

	it('gives the worked case 40 °C dry, 20 °C wet (inputs recalled from memory, results recomputed)', () => {
		const state = stateOf({ dryBulb: 40, wetBulb: 20 }, 101.325);
		expect(state.humidityRatio).toBeCloseTo(0.0064, 5);
		expect(state.enthalpy).toBeCloseTo(56.72, 2);
		expect(state.dewPoint).toBeCloseTo(7.43, 2);
		expect(state.relativeHumidity).toBeCloseTo(0.1398, 4);
		expect(state.specificVolume).toBeCloseTo(0.8963, 3);
	});
});
