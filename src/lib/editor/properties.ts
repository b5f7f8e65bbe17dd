import type { PropertyName } from '$lib/physics/types';
import type { Quantity } from '$lib/units/quantities';

/** The eight properties of which two fix a state, in the order people read them. */
export const PROPERTIES: readonly { name: PropertyName; label: string; quantity: Quantity }[] = [
	{ name: 'dryBulb', label: 'Dry bulb', quantity: 'temperature' },
	{ name: 'humidityRatio', label: 'Humidity ratio', quantity: 'humidityRatio' },
	{ name: 'relativeHumidity', label: 'Relative humidity', quantity: 'fraction' },
	{ name: 'wetBulb', label: 'Wet bulb', quantity: 'temperature' },
	{ name: 'dewPoint', label: 'Dew point', quantity: 'temperature' },
	{ name: 'enthalpy', label: 'Enthalpy', quantity: 'enthalpy' },
	{ name: 'specificVolume', label: 'Specific volume', quantity: 'specificVolume' },
	{ name: 'degreeOfSaturation', label: 'Degree of saturation', quantity: 'fraction' }
];

/** Label and quantity of a property. */
export function propertyOf(name: PropertyName): (typeof PROPERTIES)[number] {
	const found = PROPERTIES.find((p) => p.name === name);
	if (!found) throw new Error(`Unknown property ${name}`);
	return found;
}
