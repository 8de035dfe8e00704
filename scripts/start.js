import { addressOf, awaitApp, startApp } from './lib/app.js';
import { ensureBuild } from './lib/build.js';
import { demoAccounts } from './lib/demo-accounts.js';
import { appEnvironment, loadDotEnv, setting, wishedPort } from './lib/environment.js';
import { atEnd, isEnding, live } from './lib/lifetime.js';
import { checkNode } from './lib/node-packages.js';
import { claimPort } from './lib/ports.js';
import { openDatabase, prepare } from './lib/preparation.js';
import { Refusal, say } from './lib/say.js';

const greet = (/** @type {string} */ origin) => {
	say(`\nFlangewright is ready: ${origin}`);
	for (const line of demoAccounts()) say(line);
	say('Ctrl-C stops it.\n');
};

await live(async () => {
	checkNode();
	loadDotEnv();
	const port = wishedPort(3000);
	const host = setting('HOST') ?? '127.0.0.1';
	await claimPort(port, host, 'npm start');
	await prepare();
	const database = await openDatabase();
	const build = await ensureBuild();
	if (isEnding()) return;
	const env = appEnvironment({ databaseUrl: database.url, host, port });
	const app = startApp(build, env);
	atEnd(() => app.stop());
	if (await awaitApp(app, addressOf(host, port))) greet(String(env.ORIGIN));
	const code = await app.ended;
	if (isEnding()) return;
	throw new Refusal(`The app ended by itself (code ${code}); see the lines above.`);
});
