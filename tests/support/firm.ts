import type { FirmRole, Principal, ProjectRole } from '$lib/access/principal';
import { diagramSchema } from '$lib/diagram/schema';
import type { Db } from '$lib/server/db/client';
import { firms } from '$lib/server/db/schema/firms';
import { projectMembers, projects } from '$lib/server/db/schema/projects';
import { memberships, users } from '$lib/server/db/schema/users';
import { v7 } from 'uuid';

export const emptyDiagram = diagramSchema.parse({
	format: 'isohume.diagram',
	version: 1,
	subtitle: '',
	notes: '',
	override: {},
	paths: [{ id: 'p1', name: 'Summer', airflow: { kind: 'mass', given: { value: 1, unit: 'kg/s' } } }],
	stations: [],
	processes: []
});

/** A firm with one project, for one test. */
export async function makeFirm(db: Db) {
	const firmId = v7();
	const projectId = v7();
	await db.insert(firms).values({ id: firmId, name: `Firm ${firmId}` });
	await db
		.insert(projects)
		.values({ id: projectId, firmId, jobNumber: 'T-1', name: 'Test hall', elevation: 1550, elevationUnit: 'm' });
	return {
		firmId,
		projectId,
		async person(firmRole: FirmRole, projectRole: ProjectRole | null = null): Promise<Principal> {
			const userId = v7();
			const email = `${userId}@firm.example`;
			await db
				.insert(users)
				.values({ id: userId, email, name: `${firmRole} ${projectRole ?? ''}`.trim(), initials: 'TP' });
			await db.insert(memberships).values({ userId, firmId, role: firmRole });
			if (projectRole) await db.insert(projectMembers).values({ projectId, userId, role: projectRole });
			return { kind: 'user', userId, firmId, firmRole, name: firmRole, email, initials: 'TP' };
		}
	};
}
