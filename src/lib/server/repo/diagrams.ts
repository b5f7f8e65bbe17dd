import type { ProjectRole } from '$lib/access/principal';
import type { Db } from '$lib/server/db/client';
import { diagrams, projectMembers, projects } from '$lib/server/db/schema/projects';
import { users } from '$lib/server/db/schema/users';
import { and, eq, isNull } from 'drizzle-orm';

/** A project of the firm and the asker's role on it; undefined when the firm has none of that id. */
export async function findProject(db: Db, id: string, asker: { firmId: string; userId: string }) {
	const [row] = await db
		.select({ id: projects.id, projectRole: projectMembers.role })
		.from(projects)
		.leftJoin(projectMembers, and(eq(projectMembers.projectId, projects.id), eq(projectMembers.userId, asker.userId)))
		.where(and(eq(projects.id, id), eq(projects.firmId, asker.firmId)));
	return row as { id: string; projectRole: ProjectRole | null } | undefined;
}

/** A diagram with its document, in the bin or not. */
export async function findDiagram(db: Db, id: string) {
	const [row] = await db
		.select({
			id: diagrams.id,
			projectId: diagrams.projectId,
			name: diagrams.name,
			document: diagrams.document,
			revision: diagrams.revision,
			savedAt: diagrams.savedAt,
			savedBy: users.name,
			deletedAt: diagrams.deletedAt
		})
		.from(diagrams)
		.leftJoin(users, eq(users.id, diagrams.savedBy))
		.where(eq(diagrams.id, id));
	return row;
}
export type DiagramRow = NonNullable<Awaited<ReturnType<typeof findDiagram>>>;

export async function insertDiagram(db: Db, row: typeof diagrams.$inferInsert): Promise<string> {
	const [made] = await db.insert(diagrams).values(row).$returningId();
	if (!made) throw new Error('The database returned no id for a new diagram.');
	return made.id;
}

/**
 * Keeps a document if `revision` is still the stored one, and tells whether it was. One statement, not
 * read-then-write: the revision in WHERE is the lock.
 */
export async function updateDocument(
	db: Db,
	id: string,
	revision: number,
	row: { document: string; savedAt: Date; savedBy: string }
): Promise<boolean> {
	const [result] = await db
		.update(diagrams)
		.set({ ...row, revision: revision + 1 })
		.where(and(eq(diagrams.id, id), eq(diagrams.revision, revision), isNull(diagrams.deletedAt)));
	return result.affectedRows === 1;
}

export async function setDeletedAt(db: Db, id: string, deletedAt: Date | null): Promise<void> {
	await db.update(diagrams).set({ deletedAt }).where(eq(diagrams.id, id));
}
