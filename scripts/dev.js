import { startTethered } from './lib/app.js';
import { appEnvironment, loadDotEnv, setting, wishedPort } from './lib/environment.js';
import { atEnd, isEnding, live } from './lib/lifetime.js';
import { checkNode } from './lib/node-packages.js';
import { inRoot } from './lib/paths.js';
import { claimPort } from './lib/ports.js';
import { openDatabase, prepare } from './lib/preparation.js';

await live(async () => {
	checkNode();
	loadDotEnv();
	const port = wishedPort(5173);
	const host = setting('HOST') ?? '127.0.0.1';
	await claimPort(port, host, 'npm run dev');
	await prepare();
	const { url } = await openDatabase();
	if (isEnding()) return;
	const env = appEnvironment({ databaseUrl: url, host, port });
	const vite = inRoot('node_modules', 'vite', 'bin', 'vite.js');
	const args = [vite, 'dev', '--host', host, '--port', String(port), '--strictPort'];
	const server = startTethered([...args, ...process.argv.slice(2)], env);
	atEnd(() => server.stop());
	return server.ended;
});
