import {
	DRY_AIR_GAS_CONSTANT,
	DRY_AIR_SPECIFIC_HEAT,
	INVERSE_MOLAR_MASS_RATIO,
	KELVIN,
	LIQUID_SPECIFIC_HEAT,
	MOLAR_MASS_RATIO,
	VAPOUR_ENTHALPY_0C,
	VAPOUR_SPECIFIC_HEAT
} from '../constants';
import { saturationPressureKPa } from './saturationPressure';

// Ideal-gas relations, ASHRAE Handbook—Fundamentals, ch. 1. Arguments °C, kg/kg dry air, kPa; none checks its
// range: airState does, at the border.

/** Humidity ratio from the partial pressure of water vapour (eq. 20). */
export function humidityRatioAtVapourPressure(vapourKPa: number, pressureKPa: number): number {
	return (MOLAR_MASS_RATIO * vapourKPa) / (pressureKPa - vapourKPa);
}

/** Partial pressure of water vapour in kPa: the inverse of {@link humidityRatioAtVapourPressure}. */
export function vapourPressureAt(humidityRatio: number, pressureKPa: number): number {
	return (pressureKPa * humidityRatio) / (MOLAR_MASS_RATIO + humidityRatio);
}

/** Humidity ratio of saturated air (eq. 21). Infinite where water boils at the pressure. */
export function saturationHumidityRatio(t: number, pressureKPa: number): number {
	const saturation = saturationPressureKPa(t);
	return saturation < pressureKPa ? humidityRatioAtVapourPressure(saturation, pressureKPa) : Infinity;
}

/** Humidity ratio at a relative humidity 0..1 (eq. 22 and 20). */
export function humidityRatioAtRelativeHumidity(t: number, relativeHumidity: number, pressureKPa: number): number {
	const vapour = relativeHumidity * saturationPressureKPa(t);
	return vapour < pressureKPa ? humidityRatioAtVapourPressure(vapour, pressureKPa) : Infinity;
}

/** Enthalpy in kJ per kg of dry air; 0 for dry air at 0 °C (eq. 30). */
export function enthalpyOf(t: number, humidityRatio: number): number {
	return DRY_AIR_SPECIFIC_HEAT * t + humidityRatio * (VAPOUR_ENTHALPY_0C + VAPOUR_SPECIFIC_HEAT * t);
}

/** Dry bulb in °C of an enthalpy and a humidity ratio: eq. 30 solved for t. */
export function dryBulbByEnthalpy(enthalpy: number, humidityRatio: number): number {
	return (
		(enthalpy - VAPOUR_ENTHALPY_0C * humidityRatio) / (DRY_AIR_SPECIFIC_HEAT + VAPOUR_SPECIFIC_HEAT * humidityRatio)
	);
}

/** Specific volume in m³ per kg of dry air (eq. 26). */
export function specificVolumeOf(t: number, humidityRatio: number, pressureKPa: number): number {
	return (DRY_AIR_GAS_CONSTANT * (t + KELVIN) * (1 + INVERSE_MOLAR_MASS_RATIO * humidityRatio)) / pressureKPa;
}

/** Dry bulb in °C of a specific volume and a humidity ratio: eq. 26 solved for t. */
export function dryBulbBySpecificVolume(specificVolume: number, humidityRatio: number, pressureKPa: number): number {
	return (
		(specificVolume * pressureKPa) / (DRY_AIR_GAS_CONSTANT * (1 + INVERSE_MOLAR_MASS_RATIO * humidityRatio)) - KELVIN
	);
}

/** Enthalpy of liquid water in kJ/kg, 0..100 °C (eq. 33). */
export function liquidWaterEnthalpy(t: number): number {
	return LIQUID_SPECIFIC_HEAT * t;
}
