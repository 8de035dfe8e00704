import { startTethered } from './lib/app.js';
import { atEnd, isEnding, live } from './lib/lifetime.js';
import { inRoot } from './lib/paths.js';
import { openDatabase, prepare } from './lib/preparation.js';

await live(async () => {
	await prepare();
	const { url } = await openDatabase();
	if (isEnding()) return;
	const kit = inRoot('node_modules', 'drizzle-kit', 'bin.cjs');
	const env = { ...process.env, DATABASE_URL: url };
	const studio = startTethered([kit, 'studio', ...process.argv.slice(2)], env);
	atEnd(() => studio.stop());
	return studio.ended;
});
