import { authSecret, loadDotEnv, setting } from './environment.js';
import { openKeptDatabase } from './kept-database.js';
import { atEnd } from './lifetime.js';
import { checkNode, ensureNodePackages } from './node-packages.js';
import { ensureSystem, mariadb } from './system-packages.js';

/** What every script needs before its own work: Node, settings, packages. */
export const prepare = async () => {
	checkNode();
	loadDotEnv();
	authSecret();
	await ensureNodePackages();
};

/** The database of DATABASE_URL, else the clone's private one, started when it is not running. */
export const openDatabase = async () => {
	const given = setting('DATABASE_URL');
	if (given) return { url: given, isPrivate: false };
	await ensureSystem(mariadb);
	const { url, release } = await openKeptDatabase();
	atEnd(release);
	return { url, isPrivate: true };
};
