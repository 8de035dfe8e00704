import { closeSync, mkdirSync, openSync } from 'node:fs';
import { awaitApp, startApp } from '../../scripts/lib/app.js';
import { freePort } from '../../scripts/lib/ports.js';

/** Runs a built app of its own on the bench's database, and stops it whatever happens. */
export async function withServer(
	env: Readonly<Record<string, string>>,
	work: (server: { url: string; pid: number }) => Promise<void>
): Promise<void> {
	const { BUILD_FOLDER, DATABASE_URL, PATH } = process.env;
	if (!BUILD_FOLDER || !DATABASE_URL) throw new Error('Run the benches with `npm run bench`.');
	const port = await freePort();
	const url = `http://127.0.0.1:${port}`;
	mkdirSync('tests/output', { recursive: true });
	const output = openSync('tests/output/bench-server.log', 'w');
	const settings = {
		PATH,
		DATABASE_URL,
		HOST: '127.0.0.1',
		PORT: String(port),
		ORIGIN: url,
		AUTH_URL: url,
		AUTH_SECRET: 'a secret that only the benches use, 32 or more',
		LOG_LEVEL: 'error',
		...env
	};
	const app = startApp(BUILD_FOLDER, settings, output);
	closeSync(output);
	try {
		if (!(await awaitApp(app, url)) || app.pid === undefined)
			throw new Error('The app ended before it answered: see tests/output/bench-server.log.');
		await work({ url, pid: app.pid });
	} finally {
		await app.stop();
	}
}
