import type { Quantity } from '$lib/units/quantities';

/** Which relations between the properties of moist air are used; the project chooses, the sheet says which. */
export type Relations = 'ideal' | 'real';

/** The properties of which two fix a state at a known pressure. */
export type PropertyName =
	| 'dryBulb'
	| 'wetBulb'
	| 'dewPoint'
	| 'relativeHumidity'
	| 'humidityRatio'
	| 'enthalpy'
	| 'specificVolume'
	| 'degreeOfSaturation';

/** Exactly two of the eight properties, in internal SI units. */
export type KnownPair = Partial<Record<PropertyName, number>>;

/**
 * One state of moist air. °C, kPa, kg/kg dry air, kJ/kg dry air, m³/kg dry air, fractions 0..1.
 * Extensive properties are per kg of dry air.
 */
export interface AirState {
	readonly relations: Relations;
	readonly pressure: number;
	readonly dryBulb: number;
	readonly wetBulb: number;
	readonly dewPoint: number;
	readonly relativeHumidity: number;
	readonly humidityRatio: number;
	readonly enthalpy: number;
	readonly specificVolume: number;
	readonly degreeOfSaturation: number;
	/** kg moist air per m³. */
	readonly density: number;
	readonly vapourPressure: number;
	readonly saturationHumidityRatio: number;
	readonly diagnostics: AirDiagnostics;
}

/** What a reader must know of how a state was found. */
export interface AirDiagnostics {
	/** The phase the wet bulb was taken over; in the freezing gap there is a root for each. */
	readonly wetBulbOver: 'water' | 'ice';
	/** The other root of the wet-bulb equation where two exist, °C; else null. */
	readonly otherWetBulb: number | null;
	/** Over what relative humidity and dew point are meant: ice below 0.01 °C unless stated otherwise. */
	readonly saturationOver: 'water' | 'ice';
}

/** A value, its quantity and a name: what a message needs to speak in the user's units. */
export interface Measured {
	readonly quantity: Quantity;
	readonly value: number;
}

/**
 * Why an input fixes no state. `field` is the property, setting or 'pressure'; numbers are SI, converted when
 * the message is written (see `describeIssue`).
 */
export interface Refusal {
	readonly code: string;
	readonly field: string;
	readonly value: number;
	readonly quantity: Quantity;
	readonly min?: number;
	readonly max?: number;
	/** Further numbers of the message by name. */
	readonly values?: Readonly<Record<string, Measured>>;
}

export type AirResult =
	{ readonly ok: true; readonly state: AirState } | { readonly ok: false; readonly refusal: Refusal };

export type Severity = 'note' | 'caution' | 'stop';

/** A typed warning: what is the case, with numbers. Words are written by `describeIssue`. */
export interface Issue {
	readonly code: string;
	readonly severity: Severity;
	/** Id of the station or process it belongs to, once a diagram is evaluated. */
	readonly itemId?: string;
	readonly values: Readonly<Record<string, Measured>>;
}

/** Air on its way: state, and kg of dry air per second. */
export interface Stream {
	readonly state: AirState;
	readonly dryAirKgPerS: number;
}

/** A point of the chart: dry bulb in °C and humidity ratio in kg/kg. */
export interface ChartPoint {
	readonly dryBulb: number;
	readonly humidityRatio: number;
}

/** Duties of a process in kW, positive into the air; see `spec` of the sign rule in DEVELOPERS.md. */
export interface Duties {
	readonly total: number;
	readonly sensible: number;
	readonly latent: number;
	/** kg of water per second into the air; negative when condensed out. */
	readonly moistureKgPerS: number;
	/** sensible / (sensible + latent), air side; null where their sum is 0. */
	readonly sensibleHeatRatio: number | null;
}

/** One balance: what goes in, what comes out, and the residual relative to the larger term. */
export interface Balance {
	readonly in: number;
	readonly out: number;
	readonly residual: number;
}

/** One step of working, already in the display units and words of a unit system. */
export interface WorkingStep {
	readonly symbol: string;
	readonly equation: string;
	readonly substituted: string;
	readonly result: string;
	readonly unit: string;
	readonly source: string;
}
