import { defineConfig } from 'drizzle-kit';

export default defineConfig({
	dialect: 'mysql',
	schema: './src/lib/server/db/schema',
	out: './drizzle',
	casing: 'snake_case',
	dbCredentials: { url: process.env.DATABASE_URL ?? '' }
});
