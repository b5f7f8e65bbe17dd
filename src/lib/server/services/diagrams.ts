import { can, type Action } from '$lib/access/can';
import type { Principal } from '$lib/access/principal';
import type { Saved } from '$lib/contract/diagram';
import { openDocumentText } from '$lib/diagram/open';
import type { Diagram } from '$lib/diagram/schema';
import type { Db } from '$lib/server/db/client';
import { AppError } from '$lib/server/errors';
import {
	findDiagram,
	findProject,
	insertDiagram,
	setDeletedAt,
	updateDocument,
	type DiagramRow
} from '$lib/server/repo/diagrams';

/** Refuses what a person may not do on a project; who may not even view it learns only "not found". */
async function requireOnProject(db: Db, who: Principal, action: Action, projectId: string): Promise<void> {
	const project = await findProject(db, projectId, who);
	if (!project || !can('project.view', who.firmRole, project.projectRole)) throw new AppError('notFound');
	if (!can(action, who.firmRole, project.projectRole)) throw new AppError('forbidden', { action });
}

async function requireDiagram(db: Db, who: Principal, action: Action, id: string): Promise<DiagramRow> {
	const row = await findDiagram(db, id);
	if (!row) throw new AppError('notFound');
	await requireOnProject(db, who, action, row.projectId);
	return row;
}

/** Makes a diagram and returns its id. */
export async function createDiagram(
	db: Db,
	who: Principal,
	input: { projectId: string; name: string; document: Diagram }
): Promise<string> {
	await requireOnProject(db, who, 'diagram.draw', input.projectId);
	return insertDiagram(db, { ...input, document: JSON.stringify(input.document), savedBy: who.userId });
}

/** A diagram that is not in the bin, with its document checked. */
export async function openDiagram(db: Db, who: Principal, id: string) {
	const row = await requireDiagram(db, who, 'diagram.view', id);
	if (row.deletedAt) throw new AppError('notFound');
	const opened = openDocumentText(row.document);
	if (!opened.ok) throw new Error(`Diagram ${id}: ${opened.error.message} ${opened.error.details.join('; ')}`);
	return {
		id: row.id,
		projectId: row.projectId,
		name: row.name,
		revision: row.revision,
		savedAt: row.savedAt.toISOString(),
		savedBy: row.savedBy ?? '',
		document: opened.diagram
	};
}

/**
 * Keeps a document based on `revision`; "stale" with who saved since and when, if someone did. The same document sent
 * twice is kept once: an answer that was lost on the way must not look like a conflict to who tries again.
 */
export async function saveDiagram(
	db: Db,
	who: Principal,
	id: string,
	{ revision, document }: { revision: number; document: Diagram }
): Promise<Saved> {
	await requireDiagram(db, who, 'diagram.draw', id);
	const text = JSON.stringify(document);
	const savedAt = new Date();
	if (await updateDocument(db, id, revision, { document: text, savedAt, savedBy: who.userId }))
		return { revision: revision + 1, savedAt: savedAt.toISOString() };
	const stored = await requireDiagram(db, who, 'diagram.draw', id);
	if (stored.deletedAt) throw new AppError('notFound');
	if (stored.revision === revision + 1 && stored.document === text)
		return { revision: stored.revision, savedAt: stored.savedAt.toISOString() };
	throw new AppError('stale', {
		revision: stored.revision,
		savedAt: stored.savedAt.toISOString(),
		savedBy: stored.savedBy ?? ''
	});
}

/** Puts a diagram into the bin. */
export async function binDiagram(db: Db, who: Principal, id: string): Promise<void> {
	await requireDiagram(db, who, 'diagram.bin', id);
	await setDeletedAt(db, id, new Date());
}

/** Takes a diagram out of the bin. */
export async function restoreDiagram(db: Db, who: Principal, id: string): Promise<void> {
	await requireDiagram(db, who, 'diagram.bin', id);
	await setDeletedAt(db, id, null);
}
