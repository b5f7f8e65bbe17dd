import { diagramSchema, type Diagram } from '$lib/diagram/schema';
import { z } from 'zod';
import type { ProjectDetail } from './project';

/** A diagram on the project's page. The document comes along: cards draw their own thumbnail from it. */
export interface DiagramCard {
	readonly id: string;
	readonly name: string;
	readonly revision: number;
	readonly updatedAt: string;
	readonly updatedBy: string;
	readonly document: Diagram;
}

export interface BinnedDiagram {
	readonly id: string;
	readonly name: string;
	readonly deletedAt: string;
	readonly deletedBy: string;
	/** The day it is removed for good. */
	readonly purgeAt: string;
}

/** All the workspace needs. */
export interface OpenedDiagram {
	readonly id: string;
	readonly name: string;
	readonly revision: number;
	readonly savedAt: string;
	readonly savedBy: string;
	readonly document: Diagram;
	readonly project: ProjectDetail;
}

/** Body of PUT /diagrams/:id/document; the revision it is based on comes in If-Match: "<revision>". */
export const saveRequestSchema = diagramSchema;

/** Answer of a kept save. The same revision stands in the ETag. */
export const savedSchema = z.object({ revision: z.number().int(), savedAt: z.string() });
export type Saved = z.infer<typeof savedSchema>;

/** Members of the problem (RFC 9457) with code "stale", status 412. */
export const staleSchema = z.object({
	code: z.literal('stale'),
	revision: z.number().int(),
	savedAt: z.string(),
	savedBy: z.string()
});
export type Stale = z.infer<typeof staleSchema>;
