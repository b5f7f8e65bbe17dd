import { airState } from '../air/airState';
import { dryBulbByEnthalpy } from '../air/moistAir';
import { balanceOf, dutiesBetween } from '../balance';
import { DRY_BULB_RANGE } from '../constants';
import type { ChartPoint, Measured, Refusal, Stream } from '../types';
import type { Inference, ProcessDefinition, ProcessInput, ProcessResult, SettingDefinition } from './types';
import { sensibleWorking } from './sensibleWorking';

/** What tells heating from cooling: the sign of the change and the words. */
export interface SensibleKind {
	readonly kind: 'sensibleHeating' | 'sensibleCooling';
	readonly label: string;
	readonly sign: 1 | -1;
	/** Name and label of the setting that is the temperature change, counted positive in the process's own word. */
	readonly change: { readonly name: string; readonly label: string };
	readonly dutyLabel: string;
}

/** Relative difference of humidity ratio that still counts as none: rounding of typed values. */
const SAME_HUMIDITY = 1e-6;
const LARGEST_DUTY_KW = 1e6;

const temperature = (value: number): Measured => ({ quantity: 'temperature', value });
const refuse = (refusal: Refusal) => ({ ok: false as const, refusal });

/**
 * Sensible heating or cooling: dry air and water pass unchanged, so the humidity ratio stays the same, and the first
 * law per kg of dry air gives Q = ṁ (h₂ − h₁). Common practice; the state relations are those of the inlet.
 */
export function sensibleProcess(of: SensibleKind): ProcessDefinition {
	const settings: SettingDefinition[] = [
		{ name: 'leavingDryBulb', label: 'Leaving dry bulb', quantity: 'temperature', ...DRY_BULB_RANGE },
		{ name: 'duty', label: of.dutyLabel, quantity: 'power', min: 0, max: LARGEST_DUTY_KW },
		{ name: of.change.name, label: of.change.label, quantity: 'temperatureDifference', min: 0, max: 160 }
	];

	const leavingDryBulb = (inlet: Stream, given: Readonly<Record<string, number>>): number | Refusal => {
		if (given.leavingDryBulb !== undefined) return given.leavingDryBulb;
		const change = given[of.change.name];
		if (change !== undefined) return inlet.state.dryBulb + of.sign * change;
		if (given.duty === undefined)
			return { code: 'settingMissing', field: 'leavingDryBulb', value: NaN, quantity: 'temperature' };
		if (!(inlet.dryAirKgPerS > 0))
			return { code: 'dutyNeedsFlow', field: 'duty', value: given.duty, quantity: 'power' };
		const enthalpy = inlet.state.enthalpy + (of.sign * given.duty) / inlet.dryAirKgPerS;
		return dryBulbByEnthalpy(enthalpy, inlet.state.humidityRatio);
	};

	function solve({ inlets, given }: ProcessInput): ProcessResult {
		const inlet = inlets[0];
		if (!inlet) return refuse({ code: 'inletMissing', field: 'inlet', value: NaN, quantity: 'number' });
		for (const { name, quantity, min, max } of settings) {
			const value = given[name];
			if (value !== undefined && !(value >= min && value <= max))
				return refuse({ code: 'settingRange', field: name, value, quantity, min, max });
		}
		const dryBulb = leavingDryBulb(inlet, given);
		if (typeof dryBulb !== 'number') return refuse(dryBulb);
		const { state, dryAirKgPerS } = inlet;
		const field = settings.find(({ name }) => given[name] !== undefined)?.name ?? 'leavingDryBulb';
		if (of.sign * (dryBulb - state.dryBulb) < -1e-9)
			return refuse({
				code: of.sign > 0 ? 'heaterCools' : 'coolerHeats',
				field,
				value: dryBulb,
				quantity: 'temperature',
				[of.sign > 0 ? 'min' : 'max']: state.dryBulb
			});
		if (of.sign < 0 && dryBulb < state.dewPoint - 1e-9)
			return refuse({
				code: 'waterAppears',
				field,
				value: dryBulb,
				quantity: 'temperature',
				min: state.dewPoint,
				values: { dewPoint: temperature(state.dewPoint) }
			});
		const leaving = airState(
			{ dryBulb: of.sign < 0 ? Math.max(dryBulb, state.dewPoint) : dryBulb, humidityRatio: state.humidityRatio },
			state.pressure,
			state.relations
		);
		if (!leaving.ok) return refuse({ ...leaving.refusal, field });
		const outlet: Stream = { state: leaving.state, dryAirKgPerS };
		const duties = dutiesBetween(inlet, leaving.state);
		return {
			ok: true,
			outlet,
			settings: {
				leavingDryBulb: leaving.state.dryBulb,
				duty: Math.abs(duties.total),
				[of.change.name]: Math.abs(leaving.state.dryBulb - state.dryBulb)
			},
			duties,
			balances: {
				dryAir: balanceOf(dryAirKgPerS, outlet.dryAirKgPerS),
				water: balanceOf(dryAirKgPerS * state.humidityRatio, outlet.dryAirKgPerS * leaving.state.humidityRatio),
				energy: balanceOf(dryAirKgPerS * state.enthalpy + duties.total, outlet.dryAirKgPerS * leaving.state.enthalpy)
			},
			figures: [],
			issues: [],
			line: [pointOf(inlet), pointOf(outlet)],
			marks: []
		};
	}

	function infer(inlets: readonly Stream[], outlet: Stream, mode: readonly string[]): Inference {
		const inlet = inlets[0];
		if (!inlet) return refuse({ code: 'inletMissing', field: 'inlet', value: NaN, quantity: 'number' });
		const [before, after] = [inlet.state.humidityRatio, outlet.state.humidityRatio];
		if (Math.abs(after - before) > SAME_HUMIDITY * Math.max(before, after))
			return refuse({
				code: after > before ? 'addsWater' : 'removesWater',
				field: 'humidityRatio',
				value: after,
				quantity: 'humidityRatio',
				min: before,
				max: before
			});
		const solved = solve({ inlets, given: { leavingDryBulb: outlet.state.dryBulb } });
		return solved.ok ? { ok: true, given: pick(solved.settings, mode) } : solved;
	}

	/** Dry bulbs the outlet may have: up from the inlet, or down to its dew point. */
	const limits = (inlet: Stream) =>
		of.sign > 0
			? { min: inlet.state.dryBulb, max: DRY_BULB_RANGE.max }
			: { min: Math.max(inlet.state.dewPoint, DRY_BULB_RANGE.min), max: inlet.state.dryBulb };

	return {
		kind: of.kind,
		label: of.label,
		inletCount: 1,
		settings,
		modes: settings.map(({ name }) => [name]),
		solve,
		infer,
		locus({ inlets }) {
			const inlet = inlets[0];
			if (!inlet) return [];
			const { min, max } = limits(inlet);
			return [min, max].map((dryBulb) => ({ dryBulb, humidityRatio: inlet.state.humidityRatio }));
		},
		dragTo({ inlets }, mode, to) {
			const inlet = inlets[0];
			if (!inlet) return refuse({ code: 'inletMissing', field: 'inlet', value: NaN, quantity: 'number' });
			const { min, max } = limits(inlet);
			const solved = solve({ inlets, given: { leavingDryBulb: Math.min(Math.max(to.dryBulb, min), max) } });
			return solved.ok ? { ok: true, given: pick(solved.settings, mode) } : solved;
		},
		working: (input, solution, system) => sensibleWorking(input, solution, system)
	};
}

const pick = (settings: Readonly<Record<string, number>>, mode: readonly string[]) =>
	Object.fromEntries(mode.map((name) => [name, settings[name] ?? NaN]));

const pointOf = ({ state }: Stream): ChartPoint => ({ dryBulb: state.dryBulb, humidityRatio: state.humidityRatio });
