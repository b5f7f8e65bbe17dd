import { pairSchema } from '$lib/diagram/schema';
import type { Site } from '$lib/diagram/evaluated';
import type { ProjectRole, FirmRole } from '$lib/access/principal';
import type { Relations } from '$lib/physics/types';
import type { Given, UnitSystem } from '$lib/units/quantities';
import { z } from 'zod';

/** A named design condition of a site: two properties as typed. */
export const conditionSchema = z.object({
	id: z.string(),
	name: z.string().trim().min(1, 'A design condition needs a name.').max(80),
	pair: pairSchema
});
export type Condition = z.infer<typeof conditionSchema>;

/** What the server tells of a project in a list. */
export interface ProjectRow {
	readonly id: string;
	readonly jobNumber: string;
	readonly name: string;
	readonly client: string;
	readonly place: string;
	readonly pressureKPa: number;
	readonly elevation: Given | null;
	readonly diagramCount: number;
	readonly updatedAt: string;
}

/** A project as its page and its diagrams need it. */
export interface ProjectDetail {
	readonly id: string;
	readonly jobNumber: string;
	readonly name: string;
	readonly part: string;
	readonly client: string;
	readonly place: string;
	readonly phase: string;
	/** As typed; null when only a pressure was measured. */
	readonly elevation: Given | null;
	/** As typed; overrides the standard atmosphere's. */
	readonly measuredPressure: Given | null;
	readonly unitSystem: UnitSystem;
	readonly relations: Relations;
	readonly site: Site;
	readonly conditions: readonly Condition[];
	readonly people: readonly {
		readonly userId: string;
		readonly name: string;
		readonly initials: string;
		readonly firmRole: FirmRole;
		readonly projectRole: ProjectRole;
	}[];
	readonly firmName: string;
	readonly may: ProjectRights;
	readonly updatedAt: string;
}

/** What the reader may do here; pages hide what they may not, the server refuses it. */
export interface ProjectRights {
	readonly edit: boolean;
	readonly draw: boolean;
	readonly bin: boolean;
}
