import { z } from 'zod';
import { migrate } from './migrations';
import { DIAGRAM_FORMAT, DIAGRAM_VERSION, diagramSchema, type Diagram } from './schema';

export interface OpenError {
	readonly code: 'notJson' | 'notADiagram' | 'tooNew' | 'invalid';
	/** Fact, then action. */
	readonly message: string;
	/** Where in the document and what, for the log. */
	readonly details: readonly string[];
}
export type OpenResult =
	{ readonly ok: true; readonly diagram: Diagram } | { readonly ok: false; readonly error: OpenError };

const envelopeSchema = z.looseObject({ format: z.literal(DIAGRAM_FORMAT), version: z.int().min(1) });
const MAX_DETAILS = 10;

const refuse = (code: OpenError['code'], message: string, details: string[] = []): OpenResult => ({
	ok: false,
	error: { code, message, details }
});

/** Reads a diagram of any released version: the version is what it says, never guessed from the shape. */
export function openDocument(input: unknown): OpenResult {
	const envelope = envelopeSchema.safeParse(input);
	if (!envelope.success)
		return refuse('notADiagram', 'This is no Isohume diagram. Choose another one.', wordsOf(envelope.error));
	if (envelope.data.version > DIAGRAM_VERSION)
		return refuse(
			'tooNew',
			`This diagram was kept by a newer version of Isohume (format ${envelope.data.version}, this one reads up to ${DIAGRAM_VERSION}). Reload the page, or update the server.`
		);
	const parsed = diagramSchema.safeParse(migrate(envelope.data));
	return parsed.success
		? { ok: true, diagram: parsed.data }
		: refuse('invalid', 'This diagram is damaged. Bring back an earlier one.', wordsOf(parsed.error));
}

/** {@link openDocument} for the text that is kept. */
export function openDocumentText(text: string): OpenResult {
	try {
		return openDocument(JSON.parse(text));
	} catch (error) {
		if (!(error instanceof SyntaxError)) throw error;
		return refuse('notJson', 'This diagram is damaged. Bring back an earlier one.', [error.message]);
	}
}

const wordsOf = (error: z.ZodError): string[] =>
	error.issues.slice(0, MAX_DETAILS).map(({ path, message }) => `${path.join('.') || 'document'}: ${message}`);
