import type { Given } from '$lib/units/quantities';

export type GivenValues = Readonly<Record<string, Given>>;

export interface LockRules {
	/** Values the document holds. A new object whenever one changed. */
	readonly given: GivenValues;
	/** Sets of names that fix the item; null: any two. */
	readonly modes: readonly (readonly string[])[] | null;
	/** Names outside the modes that may always be given. */
	readonly optional: readonly string[];
	/** What they fix, as in "Two values fix a state." */
	readonly noun: string;
	readonly labelOf: (name: string) => string;
}

const COUNT = ['No', 'One', 'Two', 'Three', 'Four'];

/**
 * Which values of one item are locked. Opening a lock changes nothing yet: the item keeps its last complete values
 * until others are given in their place, so the chart never loses a station between two clicks.
 */
export class Locks {
	readonly #rules: () => LockRules;
	readonly #keep: (given: GivenValues) => string | null;
	#change: { readonly from: GivenValues; readonly now: GivenValues } | null = $state.raw(null);

	/** `keep` takes a complete set into the document and answers with the sentence of a refusal, or null. */
	constructor(rules: () => LockRules, keep: (given: GivenValues) => string | null) {
		this.#rules = rules;
		this.#keep = keep;
	}

	/** Values locked now. A change is forgotten when the document's own values change: undo, a drag. */
	get locked(): GivenValues {
		const { given } = this.#rules();
		return this.#change?.from === given ? this.#change.now : given;
	}

	/** True while a lock is open and the item waits for another value. */
	get isWaiting(): boolean {
		return this.#change?.from === this.#rules().given;
	}

	open(name: string): void {
		const { given, optional } = this.#rules();
		const now = Object.fromEntries(Object.entries(this.locked).filter(([other]) => other !== name));
		if (optional.includes(name)) this.#keep(now);
		else this.#change = { from: given, now };
	}

	give(name: string, value: Given): string | null {
		const { given, modes, optional } = this.#rules();
		const names = Object.keys(this.locked).filter((n) => !optional.includes(n));
		const always = optional.includes(name);
		// Where one value fixes the item there is no doubt which lock to open.
		const swap = !always && !names.includes(name) && modes !== null && modes.every((m) => m.length === 1);
		const kept = swap
			? Object.fromEntries(Object.entries(this.locked).filter(([n]) => !names.includes(n)))
			: this.locked;
		const wanted = swap ? [name] : always ? names : names.includes(name) ? names : [...names, name];
		const next = { ...kept, [name]: value };
		const refusal = this.#refuse(wanted, name);
		if (refusal !== null) return refusal;
		if (!this.#isComplete(wanted)) {
			this.#change = { from: given, now: next };
			return null;
		}
		return this.#keep(next);
	}

	forget(): void {
		this.#change = null;
	}

	#isComplete(names: readonly string[]): boolean {
		const { modes } = this.#rules();
		if (modes === null) return names.length === 2;
		return modes.some((m) => m.length === names.length && m.every((n) => names.includes(n)));
	}

	#refuse(names: readonly string[], added: string): string | null {
		const { modes, noun, labelOf } = this.#rules();
		const most = modes === null ? 2 : Math.max(...modes.map((m) => m.length));
		if (names.length > most) {
			return `${COUNT[most] ?? most} ${most === 1 ? 'value fixes' : 'values fix'} ${noun}. Open one first.`;
		}
		if (modes === null || modes.some((m) => names.every((n) => m.includes(n)))) return null;
		const others = names.filter((n) => n !== added).map((n) => labelOf(n).toLowerCase());
		return `${labelOf(added)} is not given together with ${others.join(' and ')}. Open that lock first.`;
	}
}
