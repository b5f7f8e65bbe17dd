import { char, timestamp } from 'drizzle-orm/mysql-core';
import { v7 } from 'uuid';

/** UUIDv7 made by the application: sortable by time, and no two database nodes ever clash. */
export const primaryId = () => char({ length: 36 }).primaryKey().$defaultFn(v7);
export const idOf = () => char({ length: 36 });
export const createdAt = () =>
	timestamp({ fsp: 3 })
		.notNull()
		.$defaultFn(() => new Date());
