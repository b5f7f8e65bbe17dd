import { DRY_BULB_RANGE, ICE_LIMIT, PRESSURE_RANGE } from '../constants';
import type { AirResult, AirState, KnownPair, PropertyName, Refusal, Relations } from '../types';
import { enthalpyOf, saturationHumidityRatio, specificVolumeOf, vapourPressureAt } from './moistAir';
import { dryBulbAndHumidityRatio } from './pairs';
import { propertyQuantity } from './properties';
import { saturationPressureKPa, saturationTemperature } from './saturationPressure';
import { wetBulbRoots } from './wetBulb';

/** Rounding may put a state this far beyond saturation, relative; it is taken as saturated. */
const ROUNDING = 1e-9;

const refuse = (refusal: Refusal): AirResult => ({ ok: false, refusal });

/**
 * The state of moist air that two properties fix at a pressure in kPa (30..120), or the typed reason why they do not.
 * Never throws. Dry bulb −60..100 °C. Only the ideal-gas relations are offered; others are refused.
 *
 * In the freezing gap the wet bulb over water is taken where there is one, unless the input gave the one over ice;
 * `diagnostics` holds the other.
 */
export function airState(known: KnownPair, pressureKPa: number, relations: Relations = 'ideal'): AirResult {
	if (relations !== 'ideal')
		return refuse({ code: 'relationsNotAvailable', field: 'relations', value: NaN, quantity: 'number' });
	if (!(pressureKPa >= PRESSURE_RANGE.min && pressureKPa <= PRESSURE_RANGE.max))
		return refuse({
			code: pressureCode(pressureKPa),
			field: 'pressure',
			value: pressureKPa,
			quantity: 'pressure',
			...PRESSURE_RANGE
		});
	const names = (Object.keys(known) as PropertyName[]).filter((name) => known[name] !== undefined);
	if (names.length !== 2)
		return refuse({ code: 'twoProperties', field: names[0] ?? 'dryBulb', value: names.length, quantity: 'number' });
	for (const name of names)
		if (!Number.isFinite(known[name]))
			return refuse({ code: 'notANumber', field: name, value: Number(known[name]), quantity: propertyQuantity(name) });

	const found = dryBulbAndHumidityRatio(known, pressureKPa);
	if (!found.ok) return found;
	const { dryBulb } = found;
	const odd = names.find((name) => name !== 'dryBulb') ?? 'dryBulb';
	const at = names.includes('dryBulb') ? 'dryBulb' : odd;
	if (!(dryBulb >= DRY_BULB_RANGE.min && dryBulb <= DRY_BULB_RANGE.max))
		return refuse({
			code: at === 'dryBulb' ? 'dryBulbRange' : 'resultRange',
			field: at,
			value: dryBulb,
			quantity: 'temperature',
			...DRY_BULB_RANGE
		});
	const saturation = saturationHumidityRatio(dryBulb, pressureKPa);
	let humidityRatio = found.humidityRatio;
	if (!(humidityRatio >= -ROUNDING * saturation))
		return refuse({
			code: 'belowDryAir',
			field: odd,
			value: known[odd] ?? NaN,
			quantity: propertyQuantity(odd),
			min: propertyAt(odd, dryBulb, 0, pressureKPa)
		});
	if (!(humidityRatio <= saturation * (1 + ROUNDING)))
		return refuse({
			code: 'supersaturated',
			field: odd,
			value: known[odd] ?? NaN,
			quantity: propertyQuantity(odd),
			max: propertyAt(odd, dryBulb, saturation, pressureKPa)
		});
	humidityRatio = Math.min(Math.max(humidityRatio, 0), saturation);
	return { ok: true, state: stateAt(dryBulb, humidityRatio, pressureKPa, known.wetBulb) };
}

/** State of a dry bulb and humidity ratio already known to be in range. */
function stateAt(dryBulb: number, humidityRatio: number, pressure: number, givenWetBulb?: number): AirState {
	const saturationRatio = saturationHumidityRatio(dryBulb, pressure);
	const vapourPressure = vapourPressureAt(humidityRatio, pressure);
	const roots = wetBulbRoots(dryBulb, humidityRatio, pressure);
	const over =
		givenWetBulb !== undefined ? (givenWetBulb < 0 ? 'ice' : 'water') : roots.water !== null ? 'water' : 'ice';
	const specificVolume = specificVolumeOf(dryBulb, humidityRatio, pressure);
	return {
		relations: 'ideal',
		pressure,
		dryBulb,
		wetBulb: givenWetBulb ?? roots[over] ?? dryBulb,
		// −Infinity for air without water, which has no dew point.
		dewPoint: Math.min(saturationTemperature(vapourPressure) ?? dryBulb, dryBulb),
		relativeHumidity: vapourPressure / saturationPressureKPa(dryBulb),
		humidityRatio,
		enthalpy: enthalpyOf(dryBulb, humidityRatio),
		specificVolume,
		degreeOfSaturation: humidityRatio / saturationRatio,
		density: (1 + humidityRatio) / specificVolume,
		vapourPressure,
		saturationHumidityRatio: saturationRatio,
		diagnostics: {
			wetBulbOver: over,
			otherWetBulb: roots.water !== null && roots.ice !== null ? roots[over === 'water' ? 'ice' : 'water'] : null,
			saturationOver: dryBulb <= ICE_LIMIT ? 'ice' : 'water'
		}
	};
}

/** Names the unit a pressure was most likely typed in: 1013 is hPa, 14.7 psi, 101 325 Pa, 29.9 inHg. */
function pressureCode(value: number): string {
	if (value >= 300 && value <= 1200) return 'pressureLooksLikeHPa';
	if (value >= 30_000 && value <= 120_000) return 'pressureLooksLikePa';
	if (value >= 4.3 && value <= 17.5) return 'pressureLooksLikePsi';
	if (value > 17.5 && value < 30) return 'pressureLooksLikeInHg';
	return 'pressureRange';
}

/** A property's bound at a dry bulb: its value for dry or for saturated air; undefined where there is none. */
function propertyAt(name: PropertyName, dryBulb: number, humidityRatio: number, pressure: number): number | undefined {
	return Number.isFinite(humidityRatio) ? stateAt(dryBulb, humidityRatio, pressure)[name] : undefined;
}
