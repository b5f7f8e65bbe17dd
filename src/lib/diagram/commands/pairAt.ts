import { airState } from '$lib/physics/air/airState';
import { propertyQuantity } from '$lib/physics/air/properties';
import { DRY_BULB_RANGE } from '$lib/physics/constants';
import type { AirState, ChartPoint, PropertyName, Refusal } from '$lib/physics/types';
import type { Given, UnitSystem } from '$lib/units/quantities';
import { stateOfPair } from '../evaluate';
import type { Site } from '../evaluated';
import type { Pair } from '../schema';
import { isNear } from './near';
import { nearestGiven } from './nearestGiven';

export interface Placed {
	readonly ok: true;
	readonly pair: Pair;
	/** Sentence when the point was beyond what air can be. */
	readonly note?: string;
}
export type Placing = Placed | { readonly ok: false; readonly refusal: Refusal };

// Air without water has no dew point and no wet-bulb line through it to read: the least the chart can tell from none.
const LEAST_HUMIDITY = 1e-6;

/**
 * The two given values that put a station at a point, nearest to it in round figures. A point beyond saturation is
 * taken onto saturation at its dry bulb, one outside the range of the relations to its edge; the note says so.
 */
export function pairAt(
	point: ChartPoint,
	properties: readonly { readonly property: PropertyName; readonly given?: Given }[],
	site: Site,
	system: UnitSystem
): Placing {
	const held = stateNear(point, site);
	if (!held.ok) return held;
	const { state, note } = held;
	const wanted = properties.map(({ property, given }) => ({
		name: property,
		quantity: propertyQuantity(property),
		value: state[property],
		before: given
	}));
	const pairOf = (given: Readonly<Record<string, Given>>): Pair =>
		properties.flatMap(({ property }) => {
			const value = given[property];
			return value ? [{ property, given: value }] : [];
		});
	const found = nearestGiven(wanted, system, (given) => {
		const solved = stateOfPair(pairOf(given), site).state;
		return solved !== null && solved.humidityRatio > 0 && isNear(solved, state);
	});
	if (found) return { ok: true, pair: pairOf(found), ...(note && { note }) };
	const field = properties[1]?.property ?? 'dryBulb';
	return {
		ok: false,
		refusal: { code: 'pairFixesNoState', field, value: state[field], quantity: propertyQuantity(field) }
	};
}

/** The state at a point, or the nearest there is at its dry bulb. */
function stateNear(
	point: ChartPoint,
	site: Site
): { ok: true; state: AirState; note?: string } | { ok: false; refusal: Refusal } {
	const dryBulb = Math.min(Math.max(point.dryBulb, DRY_BULB_RANGE.min), DRY_BULB_RANGE.max);
	const outside =
		dryBulb !== point.dryBulb
			? 'The point is outside the range of the relations. The station is at its edge.'
			: undefined;
	const state = (known: Parameters<typeof airState>[0]) =>
		airState({ dryBulb, ...known }, site.pressureKPa, site.relations);
	const here = state({ humidityRatio: Math.max(point.humidityRatio, LEAST_HUMIDITY) });
	if (here.ok) return { ok: true, state: here.state, ...(outside && { note: outside }) };
	const saturated = state({ relativeHumidity: 1 });
	if (!saturated.ok) return here;
	return { ok: true, state: saturated.state, note: 'The point is beyond saturation. The station is on it.' };
}
