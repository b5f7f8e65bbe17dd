import type { UnitSystem } from '$lib/units/quantities';
import { DIAGRAM_FORMAT, DIAGRAM_VERSION, type Airflow, type Diagram } from './schema';

// A floor of offices, roughly: a figure to start from that nobody takes for a design value.
const FIRST_AIRFLOW: Record<UnitSystem, Airflow['given']> = {
	SI: { value: 10_000, unit: 'm3/h' },
	IP: { value: 6_000, unit: 'cfm' }
};

/** An empty diagram: one path with an airflow in round figures of the unit system, no station. */
export function newDiagram(start: { pathId: string; pathName?: string; system: UnitSystem }): Diagram {
	const airflow: Airflow = { kind: 'volume', given: FIRST_AIRFLOW[start.system], stationId: null };
	return {
		format: DIAGRAM_FORMAT,
		version: DIAGRAM_VERSION,
		subtitle: '',
		notes: '',
		override: {},
		paths: [{ id: start.pathId, name: start.pathName ?? 'Path 1', airflow }],
		stations: [],
		processes: []
	};
}
