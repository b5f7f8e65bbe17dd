/** A document of any version: only its envelope is known. */
export type OldDocument = Readonly<Record<string, unknown>> & { readonly version: number };

/** One step from the version before to `to`. Frozen once released. */
export interface Migration {
	readonly to: number;
	/** What changed, for the developers' guide and for messages. */
	readonly what: string;
	readonly migrate: (document: OldDocument) => Readonly<Record<string, unknown>>;
}
