import { existsSync, readdirSync } from 'node:fs';
import path from 'node:path';
import { ensureBuild } from './lib/build.js';
import { live } from './lib/lifetime.js';
import { inRoot } from './lib/paths.js';
import { prepare } from './lib/preparation.js';
import { run } from './lib/processes.js';
import { Refusal, say } from './lib/say.js';
import { chromium, ensureSystem, mariadb } from './lib/system-packages.js';

const place = inRoot('tests', 'bench');

/** @param {string[]} wishes parts of names; none means all */
const benches = (wishes) =>
	(existsSync(place) ? readdirSync(place) : [])
		.filter((name) => name.endsWith('.bench.ts'))
		.filter((name) => wishes.length === 0 || wishes.some((wish) => name.includes(wish)))
		.sort();

await live(
	async () => {
		await prepare();
		const names = benches(process.argv.slice(2));
		if (names.length === 0) throw new Refusal('No bench in tests/bench goes by that name.');
		await ensureSystem(mariadb, chromium);
		const env = { ...process.env, BUILD_FOLDER: await ensureBuild() };
		const tsx = inRoot('node_modules', 'tsx', 'dist', 'cli.mjs');
		let failed = 0;
		for (const name of names) {
			say(`\n— ${name}`);
			const { code } = await run(process.execPath, [tsx, path.join(place, name)], { env });
			if (code !== 0) failed += 1;
		}
		return failed === 0 ? 0 : 1;
	},
	{ signalCode: 130 }
);
