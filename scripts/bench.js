import { existsSync, readdirSync } from 'node:fs';
import path from 'node:path';
import { ensureBuild } from './lib/build.js';
import { atEnd, live } from './lib/lifetime.js';
import { openPassingDatabase } from './lib/passing-database.js';
import { inLocal, inRoot } from './lib/paths.js';
import { prepare } from './lib/preparation.js';
import { run } from './lib/processes.js';
import { Refusal, say } from './lib/say.js';
import { chromium, ensureSystem, findProgram, mariadb } from './lib/system-packages.js';

const place = inRoot('tests', 'bench');

/** @param {string[]} wishes parts of names; none means all */
const benches = (wishes) =>
	(existsSync(place) ? readdirSync(place) : [])
		.filter((name) => name.endsWith('.bench.ts'))
		.filter((name) => wishes.length === 0 || wishes.some((wish) => name.includes(wish)))
		.sort();

/**
 * A bench as plain JavaScript, the way the app itself is built: nothing is transformed while it runs.
 * @param {string} name
 */
const compiled = async (name) => {
	const { build } = await import('vite');
	const outDir = inLocal('bench');
	await build({
		configFile: false,
		logLevel: 'error',
		build: {
			ssr: path.join(place, name),
			outDir,
			emptyOutDir: false,
			minify: false,
			target: 'node20'
		}
	});
	return path.join(outDir, name.replace(/\.ts$/, '.js'));
};

await live(
	async () => {
		await prepare();
		const names = benches(process.argv.slice(2));
		if (names.length === 0) throw new Refusal('No bench in tests/bench goes by that name.');
		await ensureSystem(mariadb, chromium);
		const database = await openPassingDatabase();
		atEnd(database.release);
		const env = {
			...process.env,
			NODE_ENV: 'production',
			BUILD_FOLDER: await ensureBuild(),
			DATABASE_URL: database.url,
			CHROMIUM: findProgram('chromium', 'chromium-browser', 'google-chrome') ?? ''
		};
		let failed = 0;
		for (const name of names) {
			say(`\n— ${name}`);
			const { code } = await run(process.execPath, [await compiled(name)], { env });
			if (code !== 0) failed += 1;
		}
		return failed === 0 ? 0 : 1;
	},
	{ signalCode: 130 }
);
