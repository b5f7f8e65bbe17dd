// Plain Node, no dependencies: a private MariaDB on loopback, its data folder inside the project.
import { spawn, spawnSync } from 'node:child_process';
import fs from 'node:fs';
import net from 'node:net';
import os from 'node:os';
import path from 'node:path';

/** @param {string[]} names */
const bin = (names) => {
	const dirs = [...(process.env.PATH ?? '').split(':'), '/usr/sbin', '/usr/bin', '/usr/local/sbin'];
	for (const n of names) for (const d of dirs) if (d && fs.existsSync(path.join(d, n))) return path.join(d, n);
	return null;
};
export const mariadbd = () => bin(['mariadbd', 'mysqld']);
const installDb = () => bin(['mariadb-install-db', 'mysql_install_db']);

export function freePort(port, host = '127.0.0.1') {
	return new Promise((res) => {
		const s = net.createServer();
		s.once('error', () => res(false));
		s.listen(port, host, () => s.close(() => res(true)));
	});
}

/** true when the server sends its greeting packet (protocol version 10) */
export function greets(port, host = '127.0.0.1', timeout = 1000) {
	return new Promise((res) => {
		const s = net.connect({ port, host });
		const done = (v) => {
			s.destroy();
			res(v);
		};
		s.setTimeout(timeout, () => done(false));
		s.once('error', () => done(false));
		s.once('close', () => res(false));
		s.once('data', (b) => done(b.length > 5 && b[4] === 10));
	});
}

const userName = () => {
	try {
		return os.userInfo().username;
	} catch {
		return 'root';
	}
}; // a uid without a passwd entry throws

const alive = (pid) => {
	try {
		process.kill(pid, 0);
		return true;
	} catch (e) {
		return e.code === 'EPERM';
	}
};

/** pid in the pid file, only if that process really is a mariadbd on this datadir */
export function runningPid(o) {
	let pid;
	try {
		pid = Number(fs.readFileSync(o.pidFile, 'utf8'));
	} catch {
		return null;
	}
	if (!pid || !alive(pid)) return null;
	try {
		const cmd = fs.readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0');
		if (!cmd.includes(`--datadir=${o.dataDir}`)) return null;
	} catch {
		/* no /proc */
	}
	return pid;
}

export function options(dir, { port, database = 'isohume', user = 'isohume', password }) {
	dir = path.resolve(dir);
	// sun_path holds 107 bytes: a socket in a deep folder would not open
	let socket = path.join(dir, 'db.sock');
	if (Buffer.byteLength(socket) > 100) socket = path.join(os.tmpdir(), `isohume-db-${process.getuid()}-${port}.sock`);
	return {
		dir,
		dataDir: path.join(dir, 'data'),
		tmpDir: path.join(dir, 'tmp'),
		log: path.join(dir, 'error.log'),
		pidFile: path.join(dir, 'db.pid'),
		initFile: path.join(dir, 'init.sql'),
		socket,
		port,
		database,
		user,
		password
	};
}

export async function start(o, extra = []) {
	const pid = runningPid(o);
	if (pid && (await greets(o.port))) return { pid, reused: true };
	fs.mkdirSync(o.tmpDir, { recursive: true });
	const root = process.getuid() === 0;
	const t0 = Date.now();
	let fresh = false;
	if (!fs.existsSync(path.join(o.dataDir, 'ready'))) {
		fresh = true;
		fs.rmSync(o.dataDir, { recursive: true, force: true });
		const r = spawnSync(
			installDb(),
			[
				'--no-defaults',
				`--datadir=${o.dataDir}`,
				'--auth-root-authentication-method=socket',
				`--auth-root-socket-user=${userName()}`,
				'--skip-test-db',
				...(root ? ['--user=root'] : [])
			],
			{ encoding: 'utf8' }
		);
		if (r.status !== 0) throw new Error(`mariadb-install-db: ${r.stdout}\n${r.stderr}`);
		fs.writeFileSync(path.join(o.dataDir, 'ready'), new Date().toISOString());
	}
	const q = (s) => s.replaceAll("'", "''");
	fs.writeFileSync(
		o.initFile,
		[
			`CREATE DATABASE IF NOT EXISTS \`${o.database}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_uca1400_ai_ci;`,
			`CREATE OR REPLACE USER '${q(o.user)}'@'127.0.0.1' IDENTIFIED BY '${q(o.password)}';`,
			`GRANT ALL ON \`${o.database}\`.* TO '${q(o.user)}'@'127.0.0.1';`,
			`GRANT ALL ON \`${o.database}\\_%\`.* TO '${q(o.user)}'@'127.0.0.1';`
		].join('\n') + '\n',
		{ mode: 0o600 }
	);
	if (!(await freePort(o.port))) throw new Error(`port ${o.port} is taken`);
	const out = fs.openSync(o.log, 'a');
	const child = spawn(
		mariadbd(),
		[
			'--no-defaults',
			...(root ? ['--user=root'] : []),
			`--datadir=${o.dataDir}`,
			`--socket=${o.socket}`,
			`--pid-file=${o.pidFile}`,
			`--port=${o.port}`,
			'--bind-address=127.0.0.1',
			'--skip-name-resolve',
			`--tmpdir=${o.tmpDir}`,
			`--init-file=${o.initFile}`,
			'--character-set-server=utf8mb4',
			'--collation-server=utf8mb4_uca1400_ai_ci',
			'--default-time-zone=+00:00',
			'--innodb-buffer-pool-size=128M',
			'--max-connections=100',
			...extra
		],
		{ stdio: ['ignore', out, out], detached: true }
	);
	let exit = null;
	child.once('exit', (c, s) => (exit = s ?? c));
	child.unref();
	fs.closeSync(out);
	for (;;) {
		if (exit !== null)
			throw new Error(`mariadbd ended (${exit}):\n${fs.readFileSync(o.log, 'utf8').split('\n').slice(-25).join('\n')}`);
		if (runningPid(o) === child.pid && (await greets(o.port))) break;
		if (Date.now() - t0 > 60_000) {
			try {
				process.kill(child.pid, 'SIGKILL');
			} catch {
				/* gone */
			}
			throw new Error('mariadbd not up in 60 s');
		}
		await new Promise((r) => setTimeout(r, 25));
	}
	return { pid: child.pid, reused: false, fresh, ms: Date.now() - t0, child };
}

export async function stop(o, signal = 'SIGTERM') {
	const pid = runningPid(o);
	if (!pid) return false;
	process.kill(pid, signal);
	const t0 = Date.now();
	while (alive(pid)) {
		if (Date.now() - t0 > 30_000) throw new Error('mariadbd did not stop in 30 s');
		await new Promise((r) => setTimeout(r, 25));
	}
	return Date.now() - t0;
}
