import { sensibleProcess } from './sensible';

/** Heating at constant humidity ratio: a heating coil, an electric heater. Refuses to cool. */
export const sensibleHeating = sensibleProcess({
	kind: 'sensibleHeating',
	label: 'Sensible heating',
	sign: 1,
	change: { name: 'temperatureRise', label: 'Temperature rise' },
	dutyLabel: 'Heating duty'
});
