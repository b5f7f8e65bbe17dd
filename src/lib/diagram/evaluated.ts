import type { ProcessInput, ProcessKind, ProcessResult } from '$lib/physics/processes/types';
import type { AirState, Issue, PropertyName, Refusal, Relations } from '$lib/physics/types';

/** Where a diagram's air is: what the project says, unless the diagram overrides it. */
export interface Site {
	readonly pressureKPa: number;
	readonly pressureFrom: 'elevation' | 'measured' | 'diagram';
	/** Null where only a measured pressure is known. */
	readonly elevationM: number | null;
	readonly relations: Relations;
}

export interface EvaluatedStation {
	readonly id: string;
	/** 1, 2, 3 …: how people name it. */
	readonly number: number;
	readonly name: string;
	readonly pathId: string;
	readonly origin: 'given' | 'process';
	/** Properties the user gave; empty for a station produced by a process. */
	readonly given: readonly PropertyName[];
	/** Null when it could not be computed; then `refusal` says why (its own, or that of the process feeding it). */
	readonly state: AirState | null;
	readonly refusal: Refusal | null;
	/** kg dry air per second, null when the path has no flow or nothing is computed. */
	readonly dryAirKgPerS: number | null;
	readonly volumeM3PerS: number | null;
}

export interface EvaluatedProcess {
	readonly id: string;
	readonly kind: ProcessKind;
	readonly label: string;
	readonly pathId: string;
	readonly inletIds: readonly string[];
	readonly outletId: string;
	/** Names of the settings the user gave. */
	readonly given: readonly string[];
	/** Null when an inlet has no state. */
	readonly input: ProcessInput | null;
	readonly result: ProcessResult | null;
}

export interface EvaluatedPath {
	readonly id: string;
	readonly name: string;
	readonly dryAirKgPerS: number | null;
	readonly refusal: Refusal | null;
	/** Station and process ids in the order of the air, inlet first. */
	readonly order: readonly string[];
	readonly totalKW: number;
	readonly sensibleKW: number;
	readonly latentKW: number;
	readonly moistureKgPerS: number;
}

/** A diagram with every number worked out. Built by `evaluate`; never kept. */
export interface EvaluatedDiagram {
	readonly site: Site;
	readonly stations: readonly EvaluatedStation[];
	readonly processes: readonly EvaluatedProcess[];
	readonly paths: readonly EvaluatedPath[];
	/** Of the whole diagram, each with the id of its item. */
	readonly issues: readonly Issue[];
	station(id: string): EvaluatedStation | undefined;
	process(id: string): EvaluatedProcess | undefined;
}
