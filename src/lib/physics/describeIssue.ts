import { formatQuantity } from '$lib/units/format';
import type { Quantity, UnitSystem } from '$lib/units/quantities';
import type { Issue, Refusal } from './types';

/** A message in the words of the product: what is the case, and what to do. */
export interface Description {
	readonly title: string;
	readonly fact: string;
	readonly action: string;
	/** Where the rule comes from, where it has a source. */
	readonly basis?: string;
}

/** How a field is called on screen. */
const FIELD: Record<string, string> = {
	pressure: 'Pressure',
	dryBulb: 'Dry bulb',
	wetBulb: 'Wet bulb',
	dewPoint: 'Dew point',
	relativeHumidity: 'Relative humidity',
	humidityRatio: 'Humidity ratio',
	enthalpy: 'Enthalpy',
	specificVolume: 'Specific volume',
	degreeOfSaturation: 'Degree of saturation',
	leavingDryBulb: 'Leaving dry bulb',
	duty: 'Duty',
	temperatureRise: 'Temperature rise',
	temperatureDrop: 'Temperature drop',
	airflow: 'Airflow',
	relations: 'Air relations'
};

interface Words {
	readonly field: string;
	readonly value: string;
	readonly min: string;
	readonly max: string;
}

const looksLike = (unit: string) => ({
	title: `Pressure looks like ${unit}`,
	fact: ({ value }: Words) => `The pressure reads ${value}; air is computed from 30 to 120 kPa absolute.`,
	action: `Choose ${unit} as its unit, or correct the value.`
});

/** Title, fact and action by code. A code that is missing here falls back to its bounds. */
const REFUSALS: Record<
	string,
	{ readonly title: string; readonly fact: (words: Words) => string; readonly action: string }
> = {
	pressureLooksLikeHPa: looksLike('hPa'),
	pressureLooksLikePa: looksLike('Pa'),
	pressureLooksLikePsi: looksLike('psi'),
	pressureLooksLikeInHg: looksLike('inHg'),
	relationsNotAvailable: {
		title: 'Relations not available',
		fact: () => 'Only the ideal-gas relations are computed.',
		action: 'Choose the ideal-gas relations.'
	},
	twoProperties: {
		title: 'Two values fix a state',
		fact: () => 'A state needs exactly two properties.',
		action: 'Give two properties.'
	},
	pairFixesNoState: {
		title: 'The two values fix no state',
		fact: ({ field }) => `${field} and its partner say nearly the same of the air.`,
		action: 'Give another property in place of one of them.'
	},
	noSuchState: {
		title: 'No such state',
		fact: ({ field, value }) => `No moist air has ${field.toLowerCase()} ${value} together with the other value.`,
		action: 'Change one of the two values.'
	},
	supersaturated: {
		title: 'State lies above saturation',
		fact: ({ field, value, max }) => `${field} ${value} lies above saturation at ${max}.`,
		action: 'Lower it, or raise the dry bulb.'
	},
	belowDryAir: {
		title: 'Less than dry air',
		fact: ({ field, value, min }) => `${field} ${value} would need less than no water; the lowest possible is ${min}.`,
		action: 'Raise it, or change the dry bulb.'
	},
	heaterCools: {
		title: 'A heater cannot cool',
		fact: ({ value, min }) => `The leaving air would be ${value}, below the entering air at ${min}.`,
		action: 'Give a higher temperature, or use sensible cooling.'
	},
	coolerHeats: {
		title: 'A cooler cannot heat',
		fact: ({ value, max }) => `The leaving air would be ${value}, above the entering air at ${max}.`,
		action: 'Give a lower temperature, or use sensible heating.'
	},
	waterAppears: {
		title: 'Water appears on the coil',
		fact: ({ value, min }) =>
			`The leaving air would be ${value}; below the dew point at ${min} cooling is no longer sensible.`,
		action: 'Keep the leaving air at or above the dew point. A wet coil needs a process with condensate.'
	},
	addsWater: {
		title: 'Humidity ratio rises',
		fact: ({ value, min }) => `The outlet has ${value}, the inlet ${min}: sensible heating or cooling adds no water.`,
		action: 'Join stations of the same humidity ratio.'
	},
	removesWater: {
		title: 'Humidity ratio falls',
		fact: ({ value, min }) =>
			`The outlet has ${value}, the inlet ${min}: sensible heating or cooling removes no water.`,
		action: 'Join stations of the same humidity ratio.'
	},
	dutyNeedsFlow: {
		title: 'Duty needs an airflow',
		fact: () => 'A duty changes nothing where no air flows.',
		action: 'Give the path an airflow.'
	},
	loop: {
		title: 'Stations feed each other in a loop',
		fact: ({ field }) => `The loop runs ${field}.`,
		action: 'Give one of its stations by two properties.'
	}
};

/** A refusal in the user's units: the field, the value and the bound, and what to do. */
export function describeRefusal(refusal: Refusal, system: UnitSystem): Description {
	const text = (value: number | undefined, quantity: Quantity = refusal.quantity) =>
		value === undefined || !Number.isFinite(value) ? '–' : formatQuantity(value, quantity, system);
	const words: Words = {
		field: FIELD[refusal.field] ?? refusal.field,
		value: text(refusal.value),
		min: text(refusal.min),
		max: text(refusal.max)
	};
	const known = REFUSALS[refusal.code];
	if (known) return { title: known.title, fact: known.fact(words), action: known.action };
	const bounds =
		refusal.min !== undefined && refusal.max !== undefined
			? `${words.field} lies between ${words.min} and ${words.max}.`
			: `${words.field} cannot be used.`;
	return { title: `${words.field} ${words.value}`, fact: bounds, action: 'Correct the value.' };
}

/** A caution in the user's units: its code's numbers by name. */
export function describeIssue(issue: Issue, system: UnitSystem): Description {
	const facts = Object.entries(issue.values).map(
		([name, { value, quantity }]) => `${FIELD[name] ?? name} ${formatQuantity(value, quantity, system)}`
	);
	return { title: issue.code, fact: facts.join(', '), action: 'Look at the item before issue.' };
}
