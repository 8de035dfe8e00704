import { createHash } from 'node:crypto';
import net from 'node:net';
import { setTimeout as sleep } from 'node:timers/promises';
import { isEnding } from './lifetime.js';
import { root } from './paths.js';

/**
 * @param {string} name
 * @returns {Promise<net.Server | null>}
 */
const tryLock = (name) =>
	new Promise((resolve, reject) => {
		const digest = createHash('sha256').update(`${root}\0${name}`).digest('hex').slice(0, 24);
		const server = net.createServer((socket) => socket.destroy());
		server.once('error', (/** @type {NodeJS.ErrnoException} */ error) =>
			error.code === 'EADDRINUSE' ? resolve(null) : reject(error)
		);
		server.listen(`\0flangewright-${digest}`, () => resolve(server.unref()));
	});

/**
 * Does work while no other script of this clone does work of the same name. The lock is an abstract
 * socket: the kernel drops it with its process, so none is ever left behind. Only Linux has them;
 * elsewhere the work is done without a lock.
 * @template T
 * @param {string} name
 * @param {() => Promise<T>} work
 * @param {() => void} [onWait] called once when another script holds the lock
 * @returns {Promise<T>}
 */
export const withLock = async (name, work, onWait) => {
	if (process.platform !== 'linux') return work();
	let lock = await tryLock(name);
	if (!lock) onWait?.();
	const deadline = isEnding() ? Date.now() + 1000 : Infinity;
	while (!lock && Date.now() < deadline) {
		await sleep(40);
		lock = await tryLock(name);
	}
	try {
		return await work();
	} finally {
		lock?.close();
	}
};
