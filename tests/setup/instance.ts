import { closeSync, mkdirSync, openSync, readFileSync } from 'node:fs';
import { inject } from 'vitest';
import { awaitApp, startApp } from '../../scripts/lib/app.js';
import { freePort } from '../../scripts/lib/ports.js';

export interface Instance {
	url: string;
	port: number;
	pid: number;
	/** Resolves to the exit code. */
	ended: Promise<number>;
	/** What it has logged so far. */
	log: () => string;
	stop: () => Promise<void>;
}

const testSecret = 'a secret that only the tests use, 32 or more';

const environment = (port: number, env: Readonly<Record<string, string>>) => ({
	PATH: process.env.PATH,
	HOST: '127.0.0.1',
	PORT: String(port),
	ORIGIN: `http://127.0.0.1:${port}`,
	AUTH_URL: `http://127.0.0.1:${port}`,
	AUTH_SECRET: testSecret,
	BODY_SIZE_LIMIT: '32M',
	SHUTDOWN_TIMEOUT: '1',
	COMPUTE_RATE_PER_MINUTE: '0',
	LOG_LEVEL: 'info',
	...env
});

/** Starts one instance of a build on a free port; resolves when it answers. */
export const startInstanceOf = async (
	buildFolder: string,
	env: Readonly<Record<string, string>>
): Promise<Instance> => {
	const port = env.PORT ? Number(env.PORT) : await freePort();
	mkdirSync('tests/output', { recursive: true });
	const file = `tests/output/server-${port}.log`;
	const output = openSync(file, 'w');
	const app = startApp(buildFolder, environment(port, env), output);
	closeSync(output);
	const url = `http://127.0.0.1:${port}`;
	const log = () => readFileSync(file, 'utf8');
	if (!(await awaitApp(app, url)) || app.pid === undefined)
		throw new Error(`The app ended before it answered:\n${log()}`);
	return { url, port, pid: app.pid, ended: app.ended, log, stop: () => app.stop() };
};

/** Starts one more instance of the app under test, by default on the same database. */
export const startInstance = (env: Readonly<Record<string, string>> = {}): Promise<Instance> =>
	startInstanceOf(inject('buildFolder'), { DATABASE_URL: inject('databaseUrl'), ...env });
