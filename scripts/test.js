import { ensureBuild } from './lib/build.js';
import { live } from './lib/lifetime.js';
import { inRoot } from './lib/paths.js';
import { prepare } from './lib/preparation.js';
import { run } from './lib/processes.js';
import { chromium, ensureSystem, mariadb } from './lib/system-packages.js';

await live(
	async () => {
		await prepare();
		await ensureSystem(mariadb, chromium);
		await ensureBuild();
		const vitest = inRoot('node_modules', 'vitest', 'vitest.mjs');
		const env = { ...process.env, NODE_ENV: 'test' };
		const args = [vitest, 'run', ...process.argv.slice(2)];
		return (await run(process.execPath, args, { env, patience: 2500 })).code;
	},
	{ signalCode: 130 }
);
