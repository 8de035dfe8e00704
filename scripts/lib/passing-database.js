import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { databaseUrl, startServer } from './mariadb.js';
import { inLocal } from './paths.js';
import { birthOf, isAlive, stopProcess } from './processes.js';

const place = inLocal('passing');

/** @param {string} home */
const ownerOf = (home) => {
	try {
		return JSON.parse(readFileSync(path.join(home, 'owner.json'), 'utf8'));
	} catch {
		return null;
	}
};

/** Clears what test runs left that were killed before they could clear it themselves. */
const sweep = async () => {
	for (const name of readdirSync(place)) {
		const home = path.join(place, name);
		const owner = ownerOf(home);
		if (!owner || isAlive(owner)) continue;
		if (owner.server) await stopProcess(owner.server, 0);
		rmSync(home, { recursive: true, force: true });
	}
};

/**
 * A database server that lives as long as a test run and is then wiped. `kill` and `revive` are for
 * tests of what happens meanwhile; it comes back at the same port with what was committed.
 */
export const openPassingDatabase = async () => {
	mkdirSync(place, { recursive: true });
	await sweep();
	const home = mkdtempSync(path.join(place, 'run-'));
	const owner = { pid: process.pid, birth: birthOf(process.pid) };
	const remember = (server = {}) =>
		writeFileSync(path.join(home, 'owner.json'), JSON.stringify({ ...owner, server }));
	const start = async (/** @type {number | undefined} */ port) => {
		const { onExit: _, ...server } = await startServer({ home, purpose: 'test', port });
		remember(server);
		return server;
	};
	remember();
	let server = await start(undefined);
	return {
		url: databaseUrl(home, server.port),
		kill: () => stopProcess(server, 0),
		revive: async () => {
			server = await start(server.port);
		},
		release: async () => {
			await stopProcess(server, 1000);
			rmSync(home, { recursive: true, force: true });
		}
	};
};
