/** The two systems a project can be shown in. Inside the program every number is SI. */
export type UnitSystem = 'SI' | 'IP';

/**
 * A unit: its quantity, the symbol a person reads, and the exact linear conversion
 * `si = value * factor + offset` to the internal SI unit of that quantity.
 */
export interface Unit {
	readonly quantity: Quantity;
	readonly symbol: string;
	readonly factor: number;
	readonly offset: number;
}

/**
 * Internal SI units: temperature °C, temperatureDifference K, humidityRatio kg/kg dry air, fraction 1,
 * enthalpy kJ/kg dry air, specificVolume m³/kg dry air, density kg/m³, pressure kPa, elevation m, power kW,
 * massFlow kg/s, waterFlow kg/s, volumeFlow m³/s, number (no unit).
 */
export type Quantity =
	| 'temperature'
	| 'temperatureDifference'
	| 'humidityRatio'
	| 'fraction'
	| 'number'
	| 'enthalpy'
	| 'specificVolume'
	| 'density'
	| 'pressure'
	| 'pressureDifference'
	| 'elevation'
	| 'power'
	| 'massFlow'
	| 'waterFlow'
	| 'volumeFlow';

// International pound and foot (1959): exact. Btu is the International Table one: 2.326 kJ/kg is 1 Btu/lb, exactly.
const LB = 0.45359237;
const FT = 0.3048;
const BTU_PER_LB = 2.326;
const PSI = (LB * 9.80665) / 0.0254 ** 2 / 1000;

const unit = (quantity: Quantity, symbol: string, factor: number, offset = 0): Unit => ({
	quantity,
	symbol,
	factor,
	offset
});

/** Every unit the product reads or writes. The key is what a document stores beside a typed value. */
export const UNITS = {
	degC: unit('temperature', '°C', 1),
	degF: unit('temperature', '°F', 5 / 9, -160 / 9),
	K: unit('temperatureDifference', 'K', 1),
	deltaF: unit('temperatureDifference', '°F', 5 / 9),
	'g/kg': unit('humidityRatio', 'g/kg', 1e-3),
	'gr/lb': unit('humidityRatio', 'gr/lb', 1 / 7000),
	percent: unit('fraction', '%', 0.01),
	one: unit('number', '', 1),
	'kJ/kg': unit('enthalpy', 'kJ/kg', 1),
	// The IP datum is dry air at 0 °F: 1.006 kJ/(kg K) × 17.777… K below the SI datum of dry air at 0 °C.
	'Btu/lb': unit('enthalpy', 'Btu/lb', BTU_PER_LB, (-1.006 * 160) / 9),
	'm3/kg': unit('specificVolume', 'm³/kg', 1),
	'ft3/lb': unit('specificVolume', 'ft³/lb', FT ** 3 / LB),
	'kg/m3': unit('density', 'kg/m³', 1),
	'lb/ft3': unit('density', 'lb/ft³', LB / FT ** 3),
	kPa: unit('pressure', 'kPa', 1),
	// Conventional inch of mercury at 0 °C (ISO 80000-4 note): 3.386389 kPa.
	inHg: unit('pressure', 'inHg', 3.386389),
	psi: unit('pressure', 'psi', PSI),
	hPa: unit('pressure', 'hPa', 0.1),
	Pa: unit('pressureDifference', 'Pa', 1e-3),
	inWg: unit('pressureDifference', 'in. w.g.', 0.2490889),
	m: unit('elevation', 'm', 1),
	ft: unit('elevation', 'ft', FT),
	kW: unit('power', 'kW', 1),
	'kBtu/h': unit('power', 'kBtu/h', (BTU_PER_LB * LB * 1000) / 3600),
	'kg/s': unit('massFlow', 'kg/s', 1),
	'lb/h': unit('massFlow', 'lb/h', LB / 3600),
	'kg/h': unit('waterFlow', 'kg/h', 1 / 3600),
	'lb/h water': unit('waterFlow', 'lb/h', LB / 3600),
	'm3/s': unit('volumeFlow', 'm³/s', 1),
	'm3/h': unit('volumeFlow', 'm³/h', 1 / 3600),
	'L/s': unit('volumeFlow', 'L/s', 1e-3),
	cfm: unit('volumeFlow', 'cfm', FT ** 3 / 60)
} as const satisfies Record<string, Unit>;

export type UnitId = keyof typeof UNITS;

/** A number as a person typed it: kept in their unit, so what comes back is what went in. */
export interface Given {
	readonly value: number;
	readonly unit: UnitId;
}

/** The unit a system shows a quantity in, and the decimals it is shown to. */
export const DISPLAY: Record<UnitSystem, Record<Quantity, { readonly unit: UnitId; readonly decimals: number }>> = {
	SI: {
		temperature: { unit: 'degC', decimals: 1 },
		temperatureDifference: { unit: 'K', decimals: 1 },
		humidityRatio: { unit: 'g/kg', decimals: 2 },
		fraction: { unit: 'percent', decimals: 1 },
		number: { unit: 'one', decimals: 2 },
		enthalpy: { unit: 'kJ/kg', decimals: 1 },
		specificVolume: { unit: 'm3/kg', decimals: 3 },
		density: { unit: 'kg/m3', decimals: 3 },
		pressure: { unit: 'kPa', decimals: 2 },
		pressureDifference: { unit: 'Pa', decimals: 0 },
		elevation: { unit: 'm', decimals: 0 },
		power: { unit: 'kW', decimals: 1 },
		massFlow: { unit: 'kg/s', decimals: 3 },
		waterFlow: { unit: 'kg/h', decimals: 1 },
		volumeFlow: { unit: 'm3/h', decimals: 0 }
	},
	IP: {
		temperature: { unit: 'degF', decimals: 1 },
		temperatureDifference: { unit: 'deltaF', decimals: 1 },
		humidityRatio: { unit: 'gr/lb', decimals: 1 },
		fraction: { unit: 'percent', decimals: 1 },
		number: { unit: 'one', decimals: 2 },
		enthalpy: { unit: 'Btu/lb', decimals: 2 },
		specificVolume: { unit: 'ft3/lb', decimals: 2 },
		density: { unit: 'lb/ft3', decimals: 4 },
		pressure: { unit: 'inHg', decimals: 3 },
		pressureDifference: { unit: 'inWg', decimals: 2 },
		elevation: { unit: 'ft', decimals: 0 },
		power: { unit: 'kBtu/h', decimals: 1 },
		massFlow: { unit: 'lb/h', decimals: 0 },
		waterFlow: { unit: 'lb/h water', decimals: 1 },
		volumeFlow: { unit: 'cfm', decimals: 0 }
	}
};
