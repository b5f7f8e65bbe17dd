import { drizzle } from 'drizzle-orm/mysql2';
import mysql from 'mysql2/promise';

export type Db = ReturnType<typeof connect>;

/** A pool on a MariaDB. All times are UTC. */
export function connect(url: string) {
	const pool = mysql.createPool({ uri: url, timezone: 'Z', connectionLimit: 10 });
	return drizzle(pool, { casing: 'snake_case' });
}
