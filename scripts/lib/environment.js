import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { inLocal, inRoot, local } from './paths.js';
import { Refusal } from './say.js';

/** Takes the settings of `.env`, where there is one; what is set already stays. */
export const loadDotEnv = () => {
	const file = inRoot('.env');
	if (!existsSync(file)) return;
	try {
		process.loadEnvFile(file);
	} catch (error) {
		throw new Refusal(`.env cannot be read: ${error instanceof Error ? error.message : error}.`);
	}
};

/** @param {string} name */
export const setting = (name) => process.env[name]?.trim() || undefined;

/**
 * The port asked for by PORT.
 * @param {number} fallback
 */
export const wishedPort = (fallback) => {
	const wish = setting('PORT');
	if (wish === undefined) return fallback;
	const port = Number(wish);
	if (Number.isInteger(port) && port >= 1 && port <= 65_535) return port;
	throw new Refusal(`PORT must be a whole number from 1 to 65535; it is "${wish}".`);
};

/** The secret that signs sessions: AUTH_SECRET, else one made at the first start and kept. */
export const authSecret = () => {
	const given = setting('AUTH_SECRET');
	if (given) return given;
	const file = inLocal('auth-secret');
	mkdirSync(local, { recursive: true });
	try {
		writeFileSync(file, randomBytes(32).toString('base64url'), { mode: 0o600, flag: 'wx' });
	} catch {
		// made at an earlier start: keep it
	}
	const kept = readFileSync(file, 'utf8').trim();
	if (kept.length >= 32) return kept;
	throw new Refusal(`${file} is damaged. Delete it; the next start makes a new secret.`);
};

/**
 * What the app needs to know, from the settings and what this start made.
 * @param {{ databaseUrl: string, host: string, port: number }} given
 * @returns {NodeJS.ProcessEnv}
 */
export const appEnvironment = ({ databaseUrl, host, port }) => {
	const origin = setting('ORIGIN') ?? `http://localhost:${port}`;
	return {
		BODY_SIZE_LIMIT: '32M',
		...process.env,
		DATABASE_URL: databaseUrl,
		HOST: host,
		PORT: String(port),
		ORIGIN: origin,
		AUTH_URL: origin,
		AUTH_SECRET: authSecret(),
		SHUTDOWN_TIMEOUT: setting('SHUTDOWN_TIMEOUT') ?? '1'
	};
};
