import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { isEnding } from './lifetime.js';
import { withLock } from './lock.js';
import { databaseUrl, startServer } from './mariadb.js';
import { inLocal } from './paths.js';
import { greets } from './ports.js';
import { birthOf, isAlive, stopProcess } from './processes.js';
import { complain } from './say.js';

const home = inLocal('database');
const users = path.join(home, 'users');
const memory = path.join(home, 'running.json');

/** @param {string} file */
const readJson = (file) => {
	try {
		return JSON.parse(readFileSync(file, 'utf8'));
	} catch {
		return null;
	}
};

const signIn = () => {
	mkdirSync(users, { recursive: true });
	const me = { pid: process.pid, birth: birthOf(process.pid) };
	writeFileSync(path.join(users, String(process.pid)), JSON.stringify(me));
};

/** How many other living scripts use the database; the marks of dead ones are wiped. */
const otherUsers = () => {
	let living = 0;
	for (const name of readdirSync(users)) {
		const user = readJson(path.join(users, name));
		if (user?.pid === process.pid) continue;
		if (user && isAlive(user)) living += 1;
		else rmSync(path.join(users, name), { force: true });
	}
	return living;
};

/** @returns {Promise<import('./mariadb.js').RunningServer>} */
const joinOrStart = async () => {
	const known = readJson(memory);
	if (known && isAlive(known) && (await greets(known.port))) return known;
	const { onExit, ...server } = await startServer({ home, purpose: 'keep', port: known?.port });
	writeFileSync(memory, JSON.stringify(server));
	onExit(() => void revive());
	return server;
};

const revivals = { count: 0 };

/** Brings the database back when it died while it was in use. */
const revive = async () => {
	if (isEnding() || revivals.count >= 5) return;
	revivals.count += 1;
	complain('The private database ended unexpectedly; starting it again …');
	try {
		await withLock('database', joinOrStart);
	} catch (error) {
		complain(error instanceof Error ? error.message : String(error));
	}
};

const release = () =>
	withLock('database', async () => {
		rmSync(path.join(users, String(process.pid)), { force: true });
		const known = readJson(memory);
		if (known && otherUsers() === 0) await stopProcess(known, 1300);
	});

/**
 * The clone's own database with the data that is kept. Several scripts may use it at once: the
 * first starts it, the last stops it.
 * @returns {Promise<{ url: string, port: number, release: () => Promise<void> }>}
 */
export const openKeptDatabase = () =>
	withLock('database', async () => {
		signIn();
		const server = await joinOrStart();
		return { url: databaseUrl(home, server.port), port: server.port, release };
	});
