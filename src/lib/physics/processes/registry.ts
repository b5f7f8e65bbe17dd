import { sensibleCooling } from './sensibleCooling';
import { sensibleHeating } from './sensibleHeating';
import type { ProcessDefinition, ProcessKind } from './types';

/** Every process the product can draw. A new one is a file of its own and an entry here. */
export const processes: Partial<Record<ProcessKind, ProcessDefinition>> = { sensibleHeating, sensibleCooling };

/** The definition of a kind; undefined for one this version does not know how to solve. */
export function processOf(kind: ProcessKind): ProcessDefinition | undefined {
	return processes[kind];
}
