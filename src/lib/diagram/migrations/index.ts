import { initial } from './001-initial';
import type { Migration, OldDocument } from './types';

/** Every step in order; step n makes version n. */
export const migrations: readonly Migration[] = [initial];

/** Takes a document through every step after its version. `steps` differ only in tests. */
export function migrate(document: OldDocument, steps: readonly Migration[] = migrations): OldDocument {
	return steps
		.filter(({ to }) => to > document.version)
		.reduce<OldDocument>((old, step) => ({ ...step.migrate(old), version: step.to }), document);
}
