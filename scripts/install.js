import { live } from './lib/lifetime.js';
import { checkNode, ensureNodePackages } from './lib/node-packages.js';

await live(async () => {
	checkNode();
	await ensureNodePackages();
	return 0;
});
