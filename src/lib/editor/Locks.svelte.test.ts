import type { Given } from '$lib/units/quantities';
import { describe, expect, it } from 'vitest';
import { Locks, type GivenValues, type LockRules } from './Locks.svelte';

const kW = (value: number): Given => ({ value, unit: 'kW' });
const degC = (value: number): Given => ({ value, unit: 'degC' });
const one = (value: number): Given => ({ value, unit: 'one' });

function bench(given: GivenValues, rules: Partial<LockRules>) {
	const item = { given };
	const locks = new Locks(
		() => ({ given: item.given, modes: null, optional: [], noun: 'a state', labelOf: (n) => n, ...rules }),
		(next) => {
			item.given = next;
			return null;
		}
	);
	return { item, locks };
}

describe('Locks', () => {
	it('refuses a third value of a state with the sentence of the design', () => {
		const { item, locks } = bench({ dryBulb: degC(20), wetBulb: degC(15) }, {});
		expect(locks.give('dewPoint', degC(10))).toBe('Two values fix a state. Open one first.');
		expect(Object.keys(item.given)).toEqual(['dryBulb', 'wetBulb']);
	});
	it('keeps the document until another value is given for the opened one', () => {
		const { item, locks } = bench({ dryBulb: degC(20), wetBulb: degC(15) }, {});
		locks.open('wetBulb');
		expect(Object.keys(locks.locked)).toEqual(['dryBulb']);
		expect(Object.keys(item.given)).toEqual(['dryBulb', 'wetBulb']);
		expect(locks.give('dewPoint', degC(10))).toBeNull();
		expect(item.given).toEqual({ dryBulb: degC(20), dewPoint: degC(10) });
		expect(locks.isWaiting).toBe(false);
	});
	it('forgets an opened lock when the document changes under it', () => {
		const { item, locks } = bench({ dryBulb: degC(20), wetBulb: degC(15) }, {});
		locks.open('wetBulb');
		item.given = { dryBulb: degC(21), wetBulb: degC(15) };
		expect(Object.keys(locks.locked)).toEqual(['dryBulb', 'wetBulb']);
	});
	it('swaps the value where one value fixes the item', () => {
		const { item, locks } = bench(
			{ dryBulb: degC(30) },
			{ modes: [['dryBulb'], ['duty'], ['rise']], noun: 'a heater' }
		);
		expect(locks.give('duty', kW(12))).toBeNull();
		expect(item.given).toEqual({ duty: kW(12) });
	});
	it('names the lock that stands in the way of a mode', () => {
		const modes = [
			['adp', 'bypass'],
			['duty', 'ratio']
		];
		const { item, locks } = bench({ adp: degC(10), bypass: one(0.1) }, { modes, noun: 'a coil' });
		locks.open('adp');
		expect(locks.give('duty', kW(-20))).toBe('duty is not given together with bypass. Open that lock first.');
		locks.open('bypass');
		expect(locks.give('duty', kW(-20))).toBeNull();
		expect(locks.isWaiting).toBe(true);
		expect(locks.give('ratio', one(0.7))).toBeNull();
		expect(item.given).toEqual({ duty: kW(-20), ratio: one(0.7) });
	});
	it('gives and opens an optional value beside the mode', () => {
		const { item, locks } = bench({ duty: kW(5) }, { modes: [['duty']], optional: ['condensate'], noun: 'a coil' });
		expect(locks.give('condensate', degC(8))).toBeNull();
		expect(item.given).toEqual({ duty: kW(5), condensate: degC(8) });
		locks.open('condensate');
		expect(item.given).toEqual({ duty: kW(5) });
	});
});
