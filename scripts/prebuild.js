import { ensureBuild } from './lib/build.js';
import { live } from './lib/lifetime.js';
import { prepare } from './lib/preparation.js';

/** Builds what `npm start` and `npm test` serve, when the sources have changed. */
await live(async () => {
	await prepare();
	await ensureBuild();
	return 0;
});
