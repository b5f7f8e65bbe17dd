declare module 'psychrolib' {
	/** The functions of the library that the tests compare with; SI: °C, Pa, J/kg. */
	const psychrolib: {
		readonly SI: number;
		SetUnitSystem(system: number): void;
		GetHumRatioFromRelHum(dryBulb: number, relativeHumidity: number, pressurePa: number): number;
		GetMoistAirEnthalpy(dryBulb: number, humidityRatio: number): number;
		GetMoistAirVolume(dryBulb: number, humidityRatio: number, pressurePa: number): number;
	};
	export default psychrolib;
}
