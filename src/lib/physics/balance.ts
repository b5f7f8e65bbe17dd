import type { AirState, Balance, Duties, Stream } from './types';
import { enthalpyOf } from './air/moistAir';

/** A balance of what goes in and out, with its residual relative to the larger term; 0 where both are 0. */
export function balanceOf(goesIn: number, comesOut: number): Balance {
	const larger = Math.max(Math.abs(goesIn), Math.abs(comesOut));
	return { in: goesIn, out: comesOut, residual: larger === 0 ? 0 : (goesIn - comesOut) / larger };
}

/**
 * Air-side duties in kW between two states, positive into the air. Sensible and latent are split at the corner state
 * (inlet's dry bulb, outlet's humidity ratio) by convention, so that they add up to ṁ·Δh. `water` is the enthalpy
 * flow, kW, of liquid or steam that leaves (positive) or comes (negative) with its own enthalpy.
 */
export function dutiesBetween(inlet: Stream, outlet: AirState, water = 0): Duties {
	const { state, dryAirKgPerS } = inlet;
	const corner = enthalpyOf(state.dryBulb, outlet.humidityRatio);
	const sensible = dryAirKgPerS * (outlet.enthalpy - corner);
	const latent = dryAirKgPerS * (corner - state.enthalpy);
	const sum = sensible + latent;
	return {
		total: sum + water,
		sensible,
		latent,
		moistureKgPerS: dryAirKgPerS * (outlet.humidityRatio - state.humidityRatio),
		sensibleHeatRatio: sum === 0 ? null : sensible / sum
	};
}
