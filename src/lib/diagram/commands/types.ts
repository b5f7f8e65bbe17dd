import { describeRefusal } from '$lib/physics/describeIssue';
import type { Refusal } from '$lib/physics/types';
import type { UnitSystem } from '$lib/units/quantities';
import type { EvaluatedDiagram } from '../evaluated';
import type { Diagram, DiagramStation } from '../schema';

/** What a command may need to know beside the document: its numbers worked out, and the units people see. */
export interface Situation {
	/** Of the very document the command gets. */
	readonly evaluated: EvaluatedDiagram;
	readonly system: UnitSystem;
}

export interface Done {
	readonly ok: true;
	readonly diagram: Diagram;
	/** Completes "Undo …": "move station 2". */
	readonly label: string;
	/** The station or process to select. */
	readonly itemId?: string;
	/** What was done otherwise than asked, in a sentence. */
	readonly note?: string;
}

/** Why nothing was changed. */
export interface Refused {
	readonly ok: false;
	readonly code: string;
	/** Property or setting it is about, where there is one. */
	readonly field: string | null;
	/** Fact and action, in the user's units. */
	readonly message: string;
}

export type CommandResult = Done | Refused;

/** A change of the document. Pure: the same document and situation give the same result. */
export type Command = (diagram: Diagram, situation: Situation) => CommandResult;

/** A refusal by a rule of the drawing. */
export function refuse(code: string, message: string, field: string | null = null): Refused {
	return { ok: false, code, field, message };
}

/** A refusal of the engine, in words. */
export function refuseAs(refusal: Refusal, system: UnitSystem): Refused {
	const { fact, action } = describeRefusal(refusal, system);
	return { ok: false, code: refusal.code, field: refusal.field, message: `${fact} ${action}` };
}

/** How people name a station: by its number. */
export function stationWords(diagram: Diagram, stationId: string): string {
	return `station ${diagram.stations.findIndex(({ id }) => id === stationId) + 1}`;
}

/** The diagram with one station changed. */
export function withStation(diagram: Diagram, id: string, change: Partial<Omit<DiagramStation, 'id'>>): Diagram {
	return { ...diagram, stations: diagram.stations.map((s) => (s.id === id ? { ...s, ...change } : s)) };
}

export const noSuchStation = refuse('stationGone', 'This station is not in the diagram any more.');
export const noSuchProcess = refuse('processGone', 'This process is not in the diagram any more.');
export const noSuchPath = refuse('pathGone', 'This path is not in the diagram any more.');
