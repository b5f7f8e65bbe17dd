import type { Pair } from '$lib/diagram/schema';
import type { PropertyName } from '$lib/physics/types';
import type { GivenValues } from './Locks.svelte';

/** Two locked values as the document keeps them; null when there are not exactly two. */
export function pairOf(values: GivenValues): Pair | null {
	const entries = Object.entries(values);
	if (entries.length !== 2) return null;
	return entries.map(([property, given]) => ({ property: property as PropertyName, given }));
}

/** The document's pair as values by name. */
export function valuesOf(pair: Pair): GivenValues {
	return Object.fromEntries(pair.map(({ property, given }) => [property, given]));
}
