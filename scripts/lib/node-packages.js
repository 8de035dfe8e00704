import { existsSync, readFileSync } from 'node:fs';
import { withLock } from './lock.js';
import { inRoot } from './paths.js';
import { run } from './processes.js';
import { Refusal, say } from './say.js';

/** @typedef {Record<string, { version?: string, integrity?: string, optional?: boolean }>} Packages */

/**
 * @param {string} file
 * @returns {Packages | null}
 */
const lockedPackages = (file) => {
	if (!existsSync(file)) return null;
	try {
		return JSON.parse(readFileSync(file, 'utf8')).packages;
	} catch {
		return null;
	}
};

/** True when node_modules holds exactly what package-lock.json asks for. */
const isInstalled = () => {
	const wanted = lockedPackages(inRoot('package-lock.json')) ?? {};
	const present = lockedPackages(inRoot('node_modules', '.package-lock.json'));
	if (!present) return false;
	return Object.entries(wanted).every(([name, { version, integrity, optional }]) => {
		const found = present[name];
		if (name === '') return true;
		if (!found) return optional === true;
		return found.version === version && found.integrity === integrity;
	});
};

/** Installs the npm packages when they are missing or are not those of the lock file. */
export const ensureNodePackages = () =>
	withLock('npm', async () => {
		if (isInstalled()) return;
		say('Installing npm packages …');
		const env = { ...process.env, NODE_ENV: 'development' };
		const { code } = await run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'], { env });
		if (code !== 0)
			throw new Refusal(
				'The npm packages could not be installed (npm ci failed, see above). Check that the npm registry can be reached, then try again.'
			);
	});

const oldest = [20, 19];

/** Refuses on a Node.js that is too old to run what follows. */
export const checkNode = () => {
	const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
	const [wantedMajor = 0, wantedMinor = 0] = oldest;
	if (major > wantedMajor || (major === wantedMajor && minor >= wantedMinor)) return;
	throw new Refusal(
		`Node.js ${oldest.join('.')} or later is needed; this is ${process.versions.node}.`
	);
};
