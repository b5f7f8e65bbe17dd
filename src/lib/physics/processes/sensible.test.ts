import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import reference from '../../../../tests/reference/public.json';
import { formatValue } from '$lib/units/format';
import { airState } from '../air/airState';
import type { KnownPair, Stream } from '../types';
import { sensibleCooling } from './sensibleCooling';
import { sensibleHeating } from './sensibleHeating';

function stream(known: KnownPair, pressureKPa: number, flow: { volume: number } | { mass: number }): Stream {
	const result = airState(known, pressureKPa);
	if (!result.ok) throw new Error(JSON.stringify(result.refusal));
	const dryAirKgPerS = 'mass' in flow ? flow.mass : flow.volume / result.state.specificVolume;
	return { state: result.state, dryAirKgPerS };
}

interface Case {
	id: string;
	type: string;
	p: number;
	inputs: { inlet: { t: number; rh?: number; dp?: number; wb?: number; V: number }; t2?: number; Q_kW?: number };
	ideal: { ma: number; s2: { t: number; W: number; rh: number; wb: number; h: number; v: number }; Q_kW: number };
}
const cases = (reference.processes as unknown as Case[]).filter(({ type }) => type === 'sensible');

describe('sensible processes against the reference cases (ideal-gas relations, solved to 1e-12)', () => {
	it.each(cases.map((c) => [c.id, c] as const))('%s', (_, { p, inputs, ideal }) => {
		const { inlet } = inputs;
		const air = stream(
			{ dryBulb: inlet.t, relativeHumidity: inlet.rh, dewPoint: inlet.dp, wetBulb: inlet.wb },
			p / 1000,
			{
				volume: inlet.V
			}
		);
		const process = ideal.Q_kW > 0 ? sensibleHeating : sensibleCooling;
		const given: Record<string, number> =
			inputs.t2 !== undefined ? { leavingDryBulb: inputs.t2 } : { duty: Math.abs(inputs.Q_kW ?? NaN) };
		const solved = process.solve({ inlets: [air], given });
		expect(air.dryAirKgPerS).toBeCloseTo(ideal.ma, 9);
		expect(solved.ok && solved.duties.total).toBeCloseTo(ideal.Q_kW, 6);
		expect(solved.ok && solved.outlet.state.dryBulb).toBeCloseTo(ideal.s2.t, 8);
		expect(solved.ok && solved.outlet.state.wetBulb).toBeCloseTo(ideal.s2.wb, 8);
		expect(solved.ok && solved.outlet.state.relativeHumidity).toBeCloseTo(ideal.s2.rh, 9);
	});
	it('has cases to compare with', () => expect(cases.length).toBeGreaterThan(1));
});

describe('sensible processes', () => {
	const inlet = fc
		.record({
			t: fc.double({ min: -30, max: 45, noNaN: true }),
			rh: fc.double({ min: 0.05, max: 1, noNaN: true }),
			p: fc.double({ min: 54, max: 104, noNaN: true }),
			mass: fc.double({ min: 0.1, max: 50, noNaN: true })
		})
		.map(({ t, rh, p, mass }) => stream({ dryBulb: t, relativeHumidity: rh }, p, { mass }));
	const share = fc.double({ min: 0, max: 1, noNaN: true });

	it('heat saturated 2 °C air, 10 m³/s at 101.325 kPa, to 40 °C with 490.9 kW (inputs recalled from memory, result recomputed)', () => {
		const air = stream({ dryBulb: 2, relativeHumidity: 1 }, 101.325, { volume: 10 });
		const solved = sensibleHeating.solve({ inlets: [air], given: { leavingDryBulb: 40 } });
		expect(air.dryAirKgPerS).toBeCloseTo(12.74, 2);
		expect(solved.ok && solved.duties.total).toBeCloseTo(490.9, 1);
	});

	it('close the balances of dry air, water and energy, and every mode gives the others back', () => {
		fc.assert(
			fc.property(inlet, share, fc.boolean(), (air, part, heats) => {
				const process = heats ? sensibleHeating : sensibleCooling;
				const end = heats ? 60 : Math.max(air.state.dewPoint, -60);
				const leavingDryBulb = air.state.dryBulb + part * (end - air.state.dryBulb);
				const solved = process.solve({ inlets: [air], given: { leavingDryBulb } });
				expect(solved.ok).toBe(true);
				if (!solved.ok) return;
				for (const balance of Object.values(solved.balances)) expect(Math.abs(balance.residual)).toBeLessThan(1e-9);
				expect(solved.duties.latent).toBeCloseTo(0, 9);
				for (const mode of process.modes) {
					const inferred = process.infer([air], solved.outlet, mode);
					expect(inferred.ok).toBe(true);
					const again = inferred.ok ? process.solve({ inlets: [air], given: inferred.given }) : inferred;
					expect(again.ok && again.outlet.state.dryBulb).toBeCloseTo(solved.outlet.state.dryBulb, 8);
				}
			})
		);
	});

	it('scale their duty with the flow and leave the state alone', () => {
		fc.assert(
			fc.property(inlet, share, (air, part) => {
				const given = { temperatureRise: 40 * part };
				const one = sensibleHeating.solve({ inlets: [air], given });
				const two = sensibleHeating.solve({ inlets: [{ ...air, dryAirKgPerS: 2 * air.dryAirKgPerS }], given });
				expect(one.ok && two.ok && two.duties.total).toBeCloseTo(one.ok ? 2 * one.duties.total : NaN, 9);
				expect(one.ok && two.ok && two.outlet.state).toEqual(one.ok && one.outlet.state);
			})
		);
	});

	it('drag along their locus and nowhere else', () => {
		fc.assert(
			fc.property(inlet, fc.double({ min: -60, max: 100, noNaN: true }), (air, dryBulb) => {
				const dragged = sensibleCooling.dragTo({ inlets: [air], given: {} }, ['temperatureDrop'], {
					dryBulb,
					humidityRatio: 0.02
				});
				const solved = dragged.ok ? sensibleCooling.solve({ inlets: [air], given: dragged.given }) : dragged;
				expect(solved.ok && solved.outlet.state.humidityRatio).toBeCloseTo(air.state.humidityRatio, 12);
			})
		);
	});

	const air = stream({ dryBulb: 20, relativeHumidity: 0.5 }, 84, { mass: 2 });

	it('stop cooling at the dew point and name it', () => {
		const refused = sensibleCooling.solve({ inlets: [air], given: { leavingDryBulb: 5 } });
		expect(refused).toMatchObject({
			ok: false,
			refusal: { code: 'waterAppears', field: 'leavingDryBulb', min: air.state.dewPoint }
		});
	});

	it('refuse to infer a heater between stations of different humidity', () => {
		const wetter = stream({ dryBulb: 30, relativeHumidity: 0.5 }, 84, { mass: 2 });
		expect(sensibleHeating.infer([air], wetter, ['duty'])).toMatchObject({ ok: false, refusal: { code: 'addsWater' } });
	});

	it.each(['SI', 'IP'] as const)('show in the last step of the working the duty of the screen, %s', (system) => {
		const input = { inlets: [air], given: { leavingDryBulb: 35 } };
		const solved = sensibleHeating.solve(input);
		expect(solved.ok).toBe(true);
		if (!solved.ok) return;
		const steps = sensibleHeating.working(input, solved, system);
		expect(steps.map((s) => s.symbol)).toEqual(['ṁ₂', 'W₂', 'Q']);
		expect(steps.at(-1)?.result).toBe(formatValue(solved.duties.total, 'power', system, { signed: true }));
	});
});
