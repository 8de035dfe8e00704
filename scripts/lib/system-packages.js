import { accessSync, constants } from 'node:fs';
import path from 'node:path';
import { withLock } from './lock.js';
import { run } from './processes.js';
import { Refusal, say } from './say.js';

const places = [
	...(process.env.PATH ?? '').split(path.delimiter),
	'/usr/local/bin',
	'/usr/bin',
	'/usr/sbin',
	'/usr/local/sbin',
	'/usr/libexec'
];

/**
 * Where the first of these programs is, or null.
 * @param {...string} names
 */
export const findProgram = (...names) => {
	for (const name of names)
		for (const place of places) {
			const file = path.join(place, name);
			try {
				accessSync(file, constants.X_OK);
				return file;
			} catch {
				// not there: look further
			}
		}
	return null;
};

/** @typedef {{ name: string, programs: string[][], packages: string[] }} Need */

/** @type {Need} */
export const mariadb = {
	name: 'MariaDB',
	programs: [
		['mariadbd', 'mysqld'],
		['mariadb-install-db', 'mysql_install_db']
	],
	packages: ['mariadb-server-core', 'mariadb-client-core']
};

/** @type {Need} */
export const chromium = {
	name: 'Chromium',
	programs: [['chromium', 'chromium-browser', 'google-chrome']],
	packages: ['chromium']
};

/** @param {Need} need */
const isMissing = (need) => need.programs.some((names) => !findProgram(...names));

/** @param {Need[]} needs */
const installByHand = (needs) => {
	const packages = needs.flatMap((need) => need.packages).join(' ');
	return `Missing: ${needs.map((need) => need.name).join(' and ')}. Install the Debian packages ${packages} (as root: apt-get install ${packages})`;
};

/** @param {string[]} args */
const apt = async (args) => {
	const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
	return (await run('apt-get', ['-q', '-y', ...args], { env, quiet: true })).code === 0;
};

/**
 * Installs by apt what is not there yet, or says which packages to install.
 * @param {...Need} needs
 */
export const ensureSystem = async (...needs) => {
	if (!needs.some(isMissing)) return;
	await withLock('apt', async () => {
		const missing = needs.filter(isMissing);
		if (missing.length === 0) return;
		if (process.getuid?.() !== 0 || !findProgram('apt-get'))
			throw new Refusal(`${installByHand(missing)}, then try again.`);
		const packages = missing.flatMap((need) => need.packages);
		say(`Installing ${packages.join(', ')} …`);
		await apt(['update']);
		const installed = await apt(['install', '--no-install-recommends', ...packages]);
		const still = needs.filter(isMissing);
		if (!installed || still.length > 0)
			throw new Refusal(`apt-get could not install it. ${installByHand(still)}, then try again.`);
	});
};
