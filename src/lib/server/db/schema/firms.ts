import { mysqlTable, varchar } from 'drizzle-orm/mysql-core';
import { createdAt, primaryId } from '../columns';

export const firms = mysqlTable('firms', {
	id: primaryId(),
	name: varchar({ length: 120 }).notNull(),
	createdAt: createdAt()
});
