import { DRY_AIR_SPECIFIC_HEAT, VAPOUR_SPECIFIC_HEAT } from '../constants';
import { bracketedRoot } from '../solve';
import { saturationHumidityRatio } from './moistAir';

export type Phase = 'water' | 'ice';

/** Coefficients of the psychrometric equation over each phase: latent heat at 0 °C, its slope, the phase's heat. */
const OVER = {
	water: { latent: 2501, slope: -2.326, heat: 4.186 },
	ice: { latent: 2830, slope: -0.24, heat: 2.1 }
} as const;

/** The phase a wet bulb is taken over: ice below 0 °C. */
export function phaseOfWetBulb(wetBulb: number): Phase {
	return wetBulb >= 0 ? 'water' : 'ice';
}

/**
 * Humidity ratio of air at `dryBulb` whose thermodynamic wet bulb is `wetBulb`, over the phase named.
 * Below 0 for a wet bulb that no air of that dry bulb can have. ASHRAE Handbook—Fundamentals, ch. 1, eq. 33 and 35.
 */
export function humidityRatioAtWetBulb(
	dryBulb: number,
	wetBulb: number,
	pressureKPa: number,
	phase: Phase = phaseOfWetBulb(wetBulb)
): number {
	const { latent, slope, heat } = OVER[phase];
	const saturated = saturationHumidityRatio(wetBulb, pressureKPa);
	return (
		((latent + slope * wetBulb) * saturated - DRY_AIR_SPECIFIC_HEAT * (dryBulb - wetBulb)) /
		(latent + VAPOUR_SPECIFIC_HEAT * dryBulb - heat * wetBulb)
	);
}

/** Dry bulb of air with that wet bulb and humidity ratio: the same equation, which is linear in dry bulb. */
export function dryBulbAtWetBulb(humidityRatio: number, wetBulb: number, pressureKPa: number): number {
	const { latent, slope, heat } = OVER[phaseOfWetBulb(wetBulb)];
	const saturated = saturationHumidityRatio(wetBulb, pressureKPa);
	return (
		((latent + slope * wetBulb) * saturated +
			DRY_AIR_SPECIFIC_HEAT * wetBulb -
			humidityRatio * (latent - heat * wetBulb)) /
		(DRY_AIR_SPECIFIC_HEAT + VAPOUR_SPECIFIC_HEAT * humidityRatio)
	);
}

export interface WetBulbRoots {
	readonly water: number | null;
	readonly ice: number | null;
}

const LOWEST = -100;

/**
 * Both roots of the wet-bulb equation in °C, where they exist. Near 0 °C a state can have one over water and one
 * over ice, up to 0.7 K apart: the freezing gap. Precision 1e-12 K.
 */
export function wetBulbRoots(dryBulb: number, humidityRatio: number, pressureKPa: number): WetBulbRoots {
	const missing = (phase: Phase) => (wetBulb: number) =>
		humidityRatioAtWetBulb(dryBulb, wetBulb, pressureKPa, phase) - humidityRatio;
	const water = dryBulb >= 0 ? bracketedRoot(missing('water'), 0, dryBulb) : null;
	const ice = bracketedRoot(missing('ice'), LOWEST, Math.min(0, dryBulb));
	return { water, ice };
}
