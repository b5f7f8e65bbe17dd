const SEA_LEVEL_KPA = 101.325;
const LAPSE = 2.25577e-5;
const EXPONENT = 5.2559;

/** What the standard atmosphere is offered for, geopotential metres. */
export const ELEVATION_RANGE = { min: -500, max: 11_000 } as const;

/**
 * Barometric pressure in kPa at an elevation in m, −500..11 000: US Standard Atmosphere 1976, in the form of
 * ASHRAE Handbook—Fundamentals, ch. 1, eq. 3. NaN outside the range.
 */
export function pressureAtElevation(elevationM: number): number {
	if (!(elevationM >= ELEVATION_RANGE.min && elevationM <= ELEVATION_RANGE.max)) return NaN;
	return SEA_LEVEL_KPA * (1 - LAPSE * elevationM) ** EXPONENT;
}

/** Elevation in m at which the standard atmosphere has a pressure in kPa: the inverse of {@link pressureAtElevation}. */
export function elevationAtPressure(pressureKPa: number): number {
	return (1 - (pressureKPa / SEA_LEVEL_KPA) ** (1 / EXPONENT)) / LAPSE;
}
