import net from 'node:net';
import { setTimeout as sleep } from 'node:timers/promises';
import { Refusal } from './say.js';

/**
 * Opens and closes a port to see whether it can be had.
 * @param {number} port 0 for any
 * @param {string} host
 * @returns {Promise<{ port: number } | { code: string }>}
 */
const tryPort = (port, host) =>
	new Promise((resolve) => {
		const server = net.createServer();
		server.once('error', (/** @type {NodeJS.ErrnoException} */ error) =>
			resolve({ code: error.code ?? error.message })
		);
		server.listen({ port, host, exclusive: true }, () => {
			const address = server.address();
			server.close(() =>
				resolve({ port: typeof address === 'object' && address ? address.port : 0 })
			);
		});
	});

/** A port nobody uses now, on loopback. */
export const freePort = async () => {
	const found = await tryPort(0, '127.0.0.1');
	if ('port' in found) return found.port;
	throw new Refusal(`No free port could be had on 127.0.0.1 (${found.code}).`);
};

/** @param {number} port */
export const isFree = async (port) => 'port' in (await tryPort(port, '127.0.0.1'));

/**
 * Refuses, with the way out, when the address asked for cannot be had.
 * @param {number} port
 * @param {string} host
 * @param {string} command
 */
export const claimPort = async (port, host, command) => {
	const found = await tryPort(port, host);
	if ('port' in found) return;
	const other = port < 65_535 ? port + 1 : 3000;
	if (found.code === 'EADDRINUSE')
		throw new Refusal(
			`Port ${port} at ${host} is taken by another program. Choose another one: PORT=${other} ${command}`
		);
	if (found.code === 'EACCES')
		throw new Refusal(
			`Port ${port} may not be opened by this user. Choose one above 1023: PORT=3000 ${command}`
		);
	throw new Refusal(
		`HOST "${host}" cannot be listened on (${found.code}). Use an address of this machine, such as 127.0.0.1 or 0.0.0.0.`
	);
};

/**
 * True when a MariaDB or MySQL greets on that port.
 * @param {number} port
 * @returns {Promise<boolean>}
 */
export const greets = (port) =>
	new Promise((resolve) => {
		const socket = net.connect({ port, host: '127.0.0.1' });
		/** @param {boolean} answer */
		const answer = (answer) => {
			socket.destroy();
			resolve(answer);
		};
		socket.setTimeout(1000, () => answer(false));
		socket.once('data', () => answer(true));
		socket.once('error', () => answer(false));
		socket.once('close', () => answer(false));
	});

/**
 * @param {number} port
 * @param {() => boolean} isHopeless
 * @param {number} patience milliseconds
 */
export const awaitGreeting = async (port, isHopeless, patience = 60_000) => {
	const deadline = Date.now() + patience;
	while (Date.now() < deadline && !isHopeless()) {
		if (await greets(port)) return true;
		await sleep(30);
	}
	return false;
};
