/** Role in the firm. */
export type FirmRole = 'principal' | 'designer' | 'trainee' | 'guest';
/** Role on a project. */
export type ProjectRole = 'lead' | 'author' | 'checker' | 'viewer';

/** Who asks. Further kinds (share link, API key) join this union; nothing else knows how they came to be. */
export interface UserPrincipal {
	readonly kind: 'user';
	readonly userId: string;
	readonly firmId: string;
	readonly firmRole: FirmRole;
	readonly name: string;
	readonly email: string;
	readonly initials: string;
}
export type Principal = UserPrincipal;
