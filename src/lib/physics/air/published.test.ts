import { describe, expect, it } from 'vitest';
import { elevationAtPressure, pressureAtElevation } from './atmosphere';
import { saturationPressureKPa, saturationPressureOverWaterKPa, saturationTemperature } from './saturationPressure';

describe('pressureAtElevation against the US Standard Atmosphere 1976 (geopotential)', () => {
	it.each([
		[1000, 89.8746],
		[2000, 79.4952],
		[3000, 70.1085],
		[4000, 61.6402],
		[5000, 54.0199]
	])('%d m', (elevation, pressure) => {
		expect(Math.abs(pressureAtElevation(elevation) / pressure - 1)).toBeLessThan(1e-4);
		expect(elevationAtPressure(pressureAtElevation(elevation))).toBeCloseTo(elevation, 6);
	});
	it('has no value outside −500..11 000 m', () => {
		expect(pressureAtElevation(-501)).toBeNaN();
		expect(pressureAtElevation(11_001)).toBeNaN();
	});
});

describe('saturationPressureKPa', () => {
	// ASHRAE Handbook—Fundamentals, ch. 1, table 3 (Pa).
	it.each([
		[-60, 1.08],
		[-20, 103.24],
		[-5, 401.74],
		[5, 872.6],
		[25, 3169.7],
		[50, 12351.3],
		[100, 101418.0]
	])('agrees with the handbook at %d °C', (t, pascal) => {
		expect(Math.abs((saturationPressureKPa(t) * 1000) / pascal - 1)).toBeLessThan(t === -60 ? 5e-3 : 3e-4);
	});
	it('agrees with the tables of Hyland and Wexler (1983)', () => {
		expect(saturationPressureKPa(0) * 1000).toBeCloseTo(611.153, 2);
		expect(saturationPressureOverWaterKPa(0) * 1000).toBeCloseTo(611.213, 2);
		expect(saturationPressureKPa(100)).toBeCloseTo(101.419, 2);
	});
	it('agrees with IAPWS R7-97 table 35 and R14-08 within 350 ppm', () => {
		expect(Math.abs(saturationPressureKPa(300 - 273.15) / 3.53658941 - 1)).toBeLessThan(350e-6);
		expect(Math.abs(saturationPressureKPa(230 - 273.15) / 8.94735e-3 - 1)).toBeLessThan(350e-6);
	});
	it('is inverted by saturationTemperature', () => {
		for (let t = -95; t < 195; t += 0.73) expect(saturationTemperature(saturationPressureKPa(t))).toBeCloseTo(t, 10);
	});
});
