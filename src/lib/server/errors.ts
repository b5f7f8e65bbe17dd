export type ErrorCode = 'notFound' | 'forbidden' | 'stale';

/** HTTP status of each expected failure. */
export const STATUS: Record<ErrorCode, number> = { notFound: 404, forbidden: 403, stale: 412 };

/** A failure a use case expects. What is not yours and what is not there are both "notFound". */
export class AppError extends Error {
	constructor(
		readonly code: ErrorCode,
		readonly details: Readonly<Record<string, unknown>> = {}
	) {
		super(code);
	}
}
