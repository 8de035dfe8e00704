import { spawn } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';
import { atEnd, isEnding } from './lifetime.js';
import { root } from './paths.js';
import { Refusal } from './say.js';

/**
 * When the process began, in clock ticks since boot; tells a reused pid from the one remembered.
 * Null where there is no such process, '' where the system has no /proc.
 * @param {number} pid
 */
export const birthOf = (pid) => {
	try {
		const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
		const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
		return fields[0] === 'Z' ? null : (fields[19] ?? '');
	} catch {
		return signalReaches(pid) && process.platform !== 'linux' ? '' : null;
	}
};

/** @param {number} pid */
const signalReaches = (pid) => {
	try {
		return process.kill(pid, 0);
	} catch {
		return false;
	}
};

/** @param {{ pid: number, birth: string | null }} remembered */
export const isAlive = ({ pid, birth }) => birth !== null && birthOf(pid) === birth;

/**
 * Asks a process to stop, and makes it when the time is over. Resolves when it is gone.
 * @param {{ pid: number, birth: string | null }} remembered
 * @param {number} patience milliseconds
 */
export const stopProcess = async (remembered, patience) => {
	const deadline = Date.now() + patience;
	if (isAlive(remembered)) process.kill(remembered.pid, 'SIGTERM');
	while (isAlive(remembered)) {
		if (Date.now() > deadline) process.kill(remembered.pid, 'SIGKILL');
		await sleep(15);
	}
};

/** @typedef {{ env?: NodeJS.ProcessEnv, quiet?: boolean, patience?: number }} StepOptions */

/**
 * Runs a command to its end in its own process group and resolves to its exit code; stopping this
 * script stops the whole group.
 * @param {string} command
 * @param {string[]} args
 * @param {StepOptions} [options]
 * @returns {Promise<{ code: number, output: string }>}
 */
export const run = (command, args, { env = process.env, quiet = false, patience = 1500 } = {}) =>
	new Promise((resolve, reject) => {
		const stdio = quiet ? 'pipe' : 'inherit';
		const child = spawn(command, args, {
			cwd: root,
			env,
			detached: true,
			stdio: ['ignore', stdio, stdio]
		});
		let output = '';
		child.stdout?.on('data', (chunk) => (output += chunk));
		child.stderr?.on('data', (chunk) => (output += chunk));
		let over = false;
		child.on('error', (error) => {
			over = true;
			reject(new Refusal(`${command} could not be run: ${error.message}.`));
		});
		const closed = new Promise((done) => child.on('close', done));
		child.on('close', (code) => {
			over = true;
			if (!isEnding()) resolve({ code: code ?? 1, output });
		});
		atEnd(async () => {
			if (over || child.pid === undefined) return;
			signalGroup(child.pid, 'SIGTERM');
			await Promise.race([closed, sleep(patience)]);
			if (!over) signalGroup(child.pid, 'SIGKILL');
		});
	});

/**
 * @param {number} pid
 * @param {NodeJS.Signals} signal
 */
const signalGroup = (pid, signal) => {
	try {
		process.kill(-pid, signal);
	} catch {
		// the group is already gone
	}
};
