import { ensureBuild } from './lib/build.js';
import { live } from './lib/lifetime.js';
import { inRoot } from './lib/paths.js';
import { prepare } from './lib/preparation.js';
import { run } from './lib/processes.js';
import { chromium, ensureSystem, mariadb } from './lib/system-packages.js';

const wishes = process.argv.slice(2);

/** Only the tests over HTTP need a built app. */
const needsBuild = () => {
	const projects = wishes.join(' ').match(/--project[= ]\S+/g) ?? [];
	return projects.length === 0 || projects.some((project) => project.includes('e2e'));
};

await live(
	async () => {
		await prepare();
		await ensureSystem(mariadb, chromium);
		if (needsBuild()) await ensureBuild();
		const vitest = inRoot('node_modules', 'vitest', 'vitest.mjs');
		const env = { ...process.env, NODE_ENV: 'test' };
		const args = [vitest, 'run', ...wishes];
		return (await run(process.execPath, args, { env, patience: 2500 })).code;
	},
	{ signalCode: 130 }
);
