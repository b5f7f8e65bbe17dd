import { sensibleProcess } from './sensible';

/** Cooling at constant humidity ratio: a dry coil. Refuses to go below the inlet's dew point, where water appears. */
export const sensibleCooling = sensibleProcess({
	kind: 'sensibleCooling',
	label: 'Sensible cooling',
	sign: -1,
	change: { name: 'temperatureDrop', label: 'Temperature drop' },
	dutyLabel: 'Cooling duty'
});
