import type { Quantity, UnitSystem } from '$lib/units/quantities';
import type { Balance, ChartPoint, Duties, Issue, Measured, Refusal, Relations, Stream, WorkingStep } from '../types';

export type ProcessKind =
	| 'sensibleHeating'
	| 'sensibleCooling'
	| 'coolingCoil'
	| 'steamHumidification'
	| 'adiabaticHumidification'
	| 'waterSpray'
	| 'mixing'
	| 'sensibleRecovery'
	| 'enthalpyRecovery'
	| 'sorptionDehumidification'
	| 'indirectEvaporativeCooling'
	| 'fan'
	| 'duct'
	| 'room'
	| 'freeLine';

/** A number a process can be given: what it is, in words and units, and its hard bounds (SI). */
export interface SettingDefinition {
	readonly name: string;
	readonly label: string;
	readonly quantity: Quantity;
	readonly min: number;
	readonly max: number;
	/** Where a new process starts (SI), or a value the user may leave as it is. */
	readonly preset?: number;
	/** True for settings outside the modes that may always be given (steam pressure, condensate temperature). */
	readonly optional?: boolean;
}

export interface ProcessInput {
	/** In the order of the process's inlets; two for mixing and recovery, one for all others. */
	readonly inlets: readonly Stream[];
	/** Given settings, SI. Exactly the names of one mode, and any optional ones. */
	readonly given: Readonly<Record<string, number>>;
}

/** A named figure of the process beside its duties: effectiveness, apparatus dew point, condensate, ... */
export interface Figure extends Measured {
	readonly name: string;
	readonly label: string;
}

export interface ProcessSolution {
	readonly ok: true;
	readonly outlet: Stream;
	/** All settings, given and derived, SI, by name: what the inspector shows open or locked. */
	readonly settings: Readonly<Record<string, number>>;
	readonly duties: Duties;
	readonly balances: { readonly dryAir: Balance; readonly water: Balance; readonly energy: Balance };
	readonly figures: readonly Figure[];
	readonly issues: readonly Issue[];
	/** The line to draw, inlet first. Two points where it is straight on the chart. */
	readonly line: readonly ChartPoint[];
	/** A construction point with its name, such as the apparatus dew point. */
	readonly marks: readonly (ChartPoint & { readonly name: string; readonly label: string })[];
}

export type ProcessResult = ProcessSolution | { readonly ok: false; readonly refusal: Refusal };

export interface ProcessDefinition {
	readonly kind: ProcessKind;
	readonly label: string;
	readonly inletCount: 1 | 2;
	readonly settings: readonly SettingDefinition[];
	/** Sets of setting names that fix the outlet; the first is what a new process starts with. */
	readonly modes: readonly (readonly string[])[];
	/** Solved forward. Never throws on numeric input. */
	solve(input: ProcessInput): ProcessResult;
	/** Settings of `mode` for which the outlet is `outlet`, or why there are none. */
	infer(inlets: readonly Stream[], outlet: Stream, mode: readonly string[]): Inference;
	/** Curve along which the outlet may be dragged, and the given settings that put it nearest to a point. */
	locus(input: ProcessInput): readonly ChartPoint[];
	dragTo(input: ProcessInput, mode: readonly string[], to: ChartPoint): Inference;
	/** Working of the solution in display units; last steps equal the screen's figures to the digit. */
	working(input: ProcessInput, solution: ProcessSolution, system: UnitSystem): readonly WorkingStep[];
}

export type Inference =
	| { readonly ok: true; readonly given: Readonly<Record<string, number>> }
	| { readonly ok: false; readonly refusal: Refusal };

export type { Relations };
