import { DRY_BULB_RANGE } from '../constants';
import { bracketedRoot } from '../solve';
import type { KnownPair, PropertyName, Refusal } from '../types';
import {
	dryBulbByEnthalpy,
	dryBulbBySpecificVolume,
	enthalpyOf,
	humidityRatioAtRelativeHumidity,
	humidityRatioAtVapourPressure,
	saturationHumidityRatio,
	specificVolumeOf,
	vapourPressureAt
} from './moistAir';
import { propertyQuantity } from './properties';
import { saturationTemperature } from './saturationPressure';
import { dryBulbAtWetBulb, humidityRatioAtWetBulb } from './wetBulb';

export type PairResult =
	| { readonly ok: true; readonly dryBulb: number; readonly humidityRatio: number }
	| { readonly ok: false; readonly refusal: Refusal };

/** Bounds a property must keep whatever its partner is. */
const BOUNDS: Partial<Record<PropertyName, { readonly min: number; readonly max: number }>> = {
	dryBulb: DRY_BULB_RANGE,
	wetBulb: DRY_BULB_RANGE,
	dewPoint: { min: -100, max: DRY_BULB_RANGE.max },
	relativeHumidity: { min: 0, max: 1 },
	humidityRatio: { min: 0, max: 1e3 },
	degreeOfSaturation: { min: 0, max: 1 }
};
const ROUNDING = 1e-9;

/**
 * Dry bulb and humidity ratio of two finite properties. Whether the state they give is one of unsaturated air in
 * range is checked by the caller; here only what has no solution at all is refused.
 */
export function dryBulbAndHumidityRatio(known: KnownPair, p: number): PairResult {
	for (const [name, bound] of Object.entries(BOUNDS) as [PropertyName, { min: number; max: number }][]) {
		const value = known[name];
		if (value !== undefined && !(value >= bound.min && value <= bound.max + ROUNDING))
			return {
				ok: false,
				refusal: { code: 'outOfRange', field: name, value, quantity: propertyQuantity(name), ...bound }
			};
	}
	const { dryBulb: t } = known;
	if (t !== undefined && known.wetBulb !== undefined && known.wetBulb > t + ROUNDING)
		return {
			ok: false,
			refusal: { code: 'supersaturated', field: 'wetBulb', value: known.wetBulb, quantity: 'temperature', max: t }
		};
	if (t !== undefined) return found(t, humidityRatioAt(t, known, p), known);
	const W =
		known.humidityRatio ?? (known.dewPoint === undefined ? undefined : saturationHumidityRatio(known.dewPoint, p));
	if (W !== undefined && known.humidityRatio !== undefined && known.dewPoint !== undefined)
		return sameThing('dewPoint', known);
	if (W !== undefined) return found(dryBulbAt(W, known, p), W, known);
	if (known.enthalpy !== undefined && known.wetBulb !== undefined) return sameThing('wetBulb', known);
	return withoutDryBulbOrMoisture(known, p);
}

/** Humidity ratio of a dry bulb and the other property of the pair. */
function humidityRatioAt(t: number, known: KnownPair, p: number): number {
	if (known.humidityRatio !== undefined) return known.humidityRatio;
	if (known.relativeHumidity !== undefined)
		return humidityRatioAtRelativeHumidity(t, Math.min(known.relativeHumidity, 1), p);
	if (known.degreeOfSaturation !== undefined) return known.degreeOfSaturation * saturationHumidityRatio(t, p);
	if (known.dewPoint !== undefined) return saturationHumidityRatio(known.dewPoint, p);
	if (known.wetBulb !== undefined) return humidityRatioAtWetBulb(t, known.wetBulb, p);
	if (known.enthalpy !== undefined) return (known.enthalpy - enthalpyOf(t, 0)) / (enthalpyOf(t, 1) - enthalpyOf(t, 0));
	if (known.specificVolume !== undefined)
		return (
			(known.specificVolume / specificVolumeOf(t, 0, p) - 1) /
			(specificVolumeOf(t, 1, p) / specificVolumeOf(t, 0, p) - 1)
		);
	return NaN;
}

/** Dry bulb of a humidity ratio and the other property of the pair. */
function dryBulbAt(W: number, known: KnownPair, p: number): number {
	if (known.relativeHumidity !== undefined)
		return saturationTemperature(vapourPressureAt(W, p) / known.relativeHumidity) ?? NaN;
	if (known.degreeOfSaturation !== undefined)
		return saturationTemperature(vapourPressureAt(W / known.degreeOfSaturation, p)) ?? NaN;
	if (known.wetBulb !== undefined) return dryBulbAtWetBulb(W, known.wetBulb, p);
	if (known.enthalpy !== undefined) return dryBulbByEnthalpy(known.enthalpy, W);
	if (known.specificVolume !== undefined) return dryBulbBySpecificVolume(known.specificVolume, W, p);
	return NaN;
}

/** Pairs solved by a search over dry bulb along the line of one property until the other fits. */
function withoutDryBulbOrMoisture(known: KnownPair, p: number): PairResult {
	const { relativeHumidity: rh, degreeOfSaturation: mu, wetBulb, enthalpy, specificVolume } = known;
	if (rh !== undefined && mu !== undefined) {
		if (!(rh * (1 - mu) > 0)) return sameThing('degreeOfSaturation', known);
		const saturation = (p * (rh - mu)) / (rh * (1 - mu));
		const t = saturationTemperature(saturation) ?? NaN;
		return found(t, humidityRatioAtVapourPressure(rh * saturation, p), known);
	}
	const line =
		wetBulb !== undefined
			? { wetBulb }
			: rh !== undefined
				? { relativeHumidity: rh }
				: mu !== undefined
					? { degreeOfSaturation: mu }
					: { specificVolume };
	const along = (t: number): number => humidityRatioAt(t, line, p);
	const off = (t: number): number => {
		if (wetBulb !== undefined && rh !== undefined) return along(t) - humidityRatioAtRelativeHumidity(t, rh, p);
		if (wetBulb !== undefined && mu !== undefined) return along(t) - mu * saturationHumidityRatio(t, p);
		if (enthalpy !== undefined) return enthalpyOf(t, along(t)) - enthalpy;
		return specificVolumeOf(t, along(t), p) - (specificVolume ?? NaN);
	};
	// Along a saturation-bound line the humidity ratio grows without end where water boils at the pressure.
	const boiling = saturationTemperature(p) ?? DRY_BULB_RANGE.max;
	const lowest = wetBulb ?? DRY_BULB_RANGE.min;
	const highest = Math.min(DRY_BULB_RANGE.max, boiling - 1e-6);
	const t = bracketedRoot(off, lowest, highest);
	return t === null ? noState(known) : found(t, along(t), known);
}

const found = (dryBulb: number, humidityRatio: number, known: KnownPair): PairResult =>
	Number.isNaN(dryBulb) || !Number.isFinite(humidityRatio) ? noState(known) : { ok: true, dryBulb, humidityRatio };

function noState(known: KnownPair): PairResult {
	const field =
		(Object.keys(known) as PropertyName[]).find((n) => n !== 'dryBulb' && known[n] !== undefined) ?? 'dryBulb';
	return {
		ok: false,
		refusal: { code: 'noSuchState', field, value: known[field] ?? NaN, quantity: propertyQuantity(field) }
	};
}

/** Two properties that say the same thing fix no state: dew point and humidity ratio, wet bulb and (nearly) enthalpy. */
function sameThing(field: PropertyName, known: KnownPair): PairResult {
	return {
		ok: false,
		refusal: { code: 'pairFixesNoState', field, value: known[field] ?? NaN, quantity: propertyQuantity(field) }
	};
}
