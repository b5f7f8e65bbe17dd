import {
	double,
	index,
	int,
	longtext,
	mysqlEnum,
	mysqlTable,
	primaryKey,
	timestamp,
	varchar
} from 'drizzle-orm/mysql-core';
import { createdAt, idOf, primaryId } from '../columns';
import { firms } from './firms';
import { users } from './users';

export const projects = mysqlTable(
	'projects',
	{
		id: primaryId(),
		firmId: idOf()
			.notNull()
			.references(() => firms.id, { onDelete: 'cascade' }),
		jobNumber: varchar({ length: 40 }).notNull(),
		name: varchar({ length: 120 }).notNull(),
		part: varchar({ length: 120 }).notNull().default(''),
		client: varchar({ length: 120 }).notNull().default(''),
		place: varchar({ length: 120 }).notNull().default(''),
		phase: varchar({ length: 60 }).notNull().default(''),
		/** As typed, with its unit: what comes back is what went in. */
		elevation: double(),
		elevationUnit: mysqlEnum(['m', 'ft']),
		measuredPressure: double(),
		measuredPressureUnit: mysqlEnum(['kPa', 'hPa', 'inHg']),
		unitSystem: mysqlEnum(['SI', 'IP']).notNull().default('SI'),
		relations: mysqlEnum(['ideal', 'real']).notNull().default('ideal'),
		createdAt: createdAt(),
		updatedAt: createdAt()
	},
	(t) => [index('projects_by_firm').on(t.firmId, t.updatedAt)]
);

export const projectMembers = mysqlTable(
	'project_members',
	{
		projectId: idOf()
			.notNull()
			.references(() => projects.id, { onDelete: 'cascade' }),
		userId: idOf()
			.notNull()
			.references(() => users.id, { onDelete: 'cascade' }),
		role: mysqlEnum(['lead', 'author', 'checker', 'viewer']).notNull()
	},
	(t) => [primaryKey({ columns: [t.projectId, t.userId] })]
);

export const diagrams = mysqlTable(
	'diagrams',
	{
		id: primaryId(),
		projectId: idOf()
			.notNull()
			.references(() => projects.id, { onDelete: 'cascade' }),
		name: varchar({ length: 80 }).notNull(),
		/** The document as text: MariaDB has no JSON type of its own, and `openDiagram` is the one reader. */
		document: longtext().notNull(),
		revision: int().notNull().default(1),
		savedAt: createdAt(),
		savedBy: idOf().references(() => users.id, { onDelete: 'set null' }),
		deletedAt: timestamp({ fsp: 3 }),
		createdAt: createdAt()
	},
	(t) => [index('diagrams_by_project').on(t.projectId, t.deletedAt)]
);
