import { ICE_LIMIT, KELVIN } from '../constants';
import { bracketedRoot } from '../solve';

const overIce = (T: number) =>
	Math.exp(
		-5.6745359e3 / T +
			6.3925247 +
			T * (-9.677843e-3 + T * (6.2215701e-7 + T * (2.0747825e-9 + T * -9.484024e-13))) +
			4.1635019 * Math.log(T)
	) / 1000;

const overWater = (T: number) =>
	Math.exp(
		-5.8002206e3 / T +
			1.3914993 +
			T * (-4.8640239e-2 + T * (4.1764768e-5 + T * -1.4452093e-8)) +
			6.5459673 * Math.log(T)
	) / 1000;

/**
 * Saturation pressure of water in kPa at `t` °C: over ice at and below 0.01 °C, over liquid above.
 * Valid −100..200 °C. Hyland and Wexler (1983) as in ASHRAE Handbook—Fundamentals, ch. 1, eq. 5 and 6.
 */
export function saturationPressureKPa(t: number): number {
	return t <= ICE_LIMIT ? overIce(t + KELVIN) : overWater(t + KELVIN);
}

/** As {@link saturationPressureKPa}, over supercooled water below 0.01 °C: what humidity sensors refer to. */
export function saturationPressureOverWaterKPa(t: number): number {
	return overWater(t + KELVIN);
}

const LOWEST = -100;
const HIGHEST = 200;

/**
 * Temperature in °C at which water saturates at `pKPa`: the inverse of {@link saturationPressureKPa}, to 1e-12 K.
 * −Infinity below the pressure at −100 °C (dry air), null above that at 200 °C or when not a number.
 */
export function saturationTemperature(pKPa: number): number | null {
	if (!(pKPa <= saturationPressureKPa(HIGHEST))) return null;
	if (pKPa < saturationPressureKPa(LOWEST)) return -Infinity;
	// The curves differ by 97 ppm at 0 °C but meet at 0.01 °C, so the joined curve rises everywhere.
	const target = Math.log(pKPa);
	return bracketedRoot((t) => Math.log(saturationPressureKPa(t)) - target, LOWEST, HIGHEST);
}
