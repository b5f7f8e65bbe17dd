import { pressureAtElevation } from '$lib/physics/air/atmosphere';
import type { Relations } from '$lib/physics/types';
import { toSI } from '$lib/units/convert';
import type { Given } from '$lib/units/quantities';
import type { Site } from './evaluated';
import type { Diagram } from './schema';

export interface SiteInput {
	readonly elevation: Given | null;
	readonly measuredPressure: Given | null;
	readonly relations: Relations;
}

/**
 * Where the air of a diagram is. A pressure of the diagram comes before a measured one, and that before the standard
 * atmosphere's at the elevation; without any, sea level. The pressure's range is the engine's to check.
 */
export function siteOf(project: SiteInput, override: Diagram['override'] = {}): Site {
	const elevationM = project.elevation ? toSI(project.elevation) : null;
	const relations = override.relations ?? project.relations;
	if (override.pressure)
		return { pressureKPa: toSI(override.pressure), pressureFrom: 'diagram', elevationM, relations };
	if (project.measuredPressure)
		return { pressureKPa: toSI(project.measuredPressure), pressureFrom: 'measured', elevationM, relations };
	return { pressureKPa: pressureAtElevation(elevationM ?? 0), pressureFrom: 'elevation', elevationM, relations };
}
