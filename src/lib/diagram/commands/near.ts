import type { ChartPoint } from '$lib/physics/types';

// Half of the last decimal people read: 0.1 K and, below 10 g/kg, what 0.1 % of relative humidity is worth.
const DRY_BULB = 0.05;
const HUMIDITY_RATIO = 5e-5;
const ROUNDING = 1e-9;

/** Whether two states are the same place for a person who drags: within 0.05 K and 0.05 g/kg. */
export function isNear(a: ChartPoint, b: ChartPoint): boolean {
	return (
		Math.abs(a.dryBulb - b.dryBulb) <= DRY_BULB + ROUNDING &&
		Math.abs(a.humidityRatio - b.humidityRatio) <= HUMIDITY_RATIO + ROUNDING
	);
}
