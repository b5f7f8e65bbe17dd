import { int, mysqlEnum, mysqlTable, primaryKey, varchar } from 'drizzle-orm/mysql-core';
import { createdAt, idOf, primaryId } from '../columns';
import { firms } from './firms';

export const users = mysqlTable('users', {
	id: primaryId(),
	// The server's collation ignores case, which is wanted here: one address, one person.
	email: varchar({ length: 254 }).notNull().unique(),
	name: varchar({ length: 120 }).notNull(),
	initials: varchar({ length: 6 }).notNull(),
	/** argon2id; null for who has never set one. */
	passwordHash: varchar({ length: 255 }),
	/** Raised to end every session at once: a session carries the number it was made under. */
	sessionVersion: int().notNull().default(1),
	createdAt: createdAt()
});

export const memberships = mysqlTable(
	'memberships',
	{
		userId: idOf()
			.notNull()
			.references(() => users.id, { onDelete: 'cascade' }),
		firmId: idOf()
			.notNull()
			.references(() => firms.id, { onDelete: 'cascade' }),
		role: mysqlEnum(['principal', 'designer', 'trainee', 'guest']).notNull()
	},
	(t) => [primaryKey({ columns: [t.userId, t.firmId] })]
);
