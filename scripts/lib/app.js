import { spawn } from 'node:child_process';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { inRoot, root } from './paths.js';

/** @typedef {{ pid: number | undefined, ended: Promise<number>, isGone: () => boolean, stop: (patience?: number) => Promise<void> }} App */

/**
 * Starts a Node program that ends with this one, in its own process group so that a Ctrl-C at the
 * keyboard reaches it only through us.
 * @param {string[]} args
 * @param {NodeJS.ProcessEnv} env
 * @param {'inherit' | 'ignore' | number} output
 * @returns {App}
 */
export const startTethered = (args, env, output = 'inherit') => {
	const child = spawn(
		process.execPath,
		['--import', inRoot('scripts', 'lib', 'tether.js'), ...args],
		{ cwd: root, env, detached: true, stdio: ['ignore', output, output, 'ipc'] }
	);
	let gone = false;
	/** @type {Promise<number>} */
	const ended = new Promise((resolve) => {
		child.once('error', () => resolve(1));
		child.once('exit', (code) => resolve(code ?? 1));
	}).then((code) => {
		gone = true;
		return code;
	});
	return {
		pid: child.pid,
		ended,
		isGone: () => gone,
		stop: async (patience = 1400) => {
			if (gone) return;
			child.kill('SIGTERM');
			await Promise.race([ended, sleep(patience)]);
			if (!gone) child.kill('SIGKILL');
			await ended;
		}
	};
};

/**
 * Starts the built server.
 * @param {string} build folder made by ensureBuild
 * @param {NodeJS.ProcessEnv} env
 * @param {'inherit' | 'ignore' | number} [output]
 */
export const startApp = (build, env, output) =>
	startTethered([path.join(build, 'index.js')], { ...env, NODE_ENV: 'production' }, output);

/** @param {string} address */
const answers = async (address) => {
	try {
		const response = await fetch(`${address}/api/v1/health`, { signal: AbortSignal.timeout(2000) });
		await response.arrayBuffer();
		return true;
	} catch {
		return false;
	}
};

/**
 * Resolves to true when the server answers at the address, to false when it ended before that.
 * @param {App} app
 * @param {string} address
 */
export const awaitApp = async (app, address) => {
	while (!app.isGone()) {
		if (await answers(address)) return true;
		await sleep(60);
	}
	return false;
};

/**
 * The address to reach a listening host from this machine.
 * @param {string} host
 * @param {number} port
 */
export const addressOf = (host, port) => {
	const everywhere = host === '0.0.0.0' || host === '::';
	const name = everywhere ? '127.0.0.1' : host.includes(':') ? `[${host}]` : host;
	return `http://${name}:${port}`;
};
