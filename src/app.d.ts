import type { Principal } from '$lib/access/principal';

declare global {
	namespace App {
		interface Locals {
			/** Who asks; null when nobody is signed in. Set by hooks/session.ts for every request. */
			principal: Principal | null;
			requestId: string;
		}
		interface Error {
			message: string;
			/** Ties what the user saw to the line in the log. */
			errorId?: string;
		}
	}
}
export {};
