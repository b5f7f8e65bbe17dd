import type { Quantity } from '$lib/units/quantities';
import type { PropertyName } from '../types';

const QUANTITY: Record<PropertyName, Quantity> = {
	dryBulb: 'temperature',
	wetBulb: 'temperature',
	dewPoint: 'temperature',
	relativeHumidity: 'fraction',
	humidityRatio: 'humidityRatio',
	enthalpy: 'enthalpy',
	specificVolume: 'specificVolume',
	degreeOfSaturation: 'fraction'
};

/** The quantity a property is measured in. */
export function propertyQuantity(name: PropertyName): Quantity {
	return QUANTITY[name];
}
