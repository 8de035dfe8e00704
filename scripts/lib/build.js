import { createHash } from 'node:crypto';
import {
	existsSync,
	mkdirSync,
	readdirSync,
	readFileSync,
	rmSync,
	statSync,
	utimesSync,
	writeFileSync
} from 'node:fs';
import path from 'node:path';
import { withLock } from './lock.js';
import { inLocal, inRoot, root } from './paths.js';
import { birthOf, isAlive, run } from './processes.js';
import { Refusal, say } from './say.js';

const sources = [
	'src',
	'static',
	'data',
	'package-lock.json',
	'svelte.config.js',
	'vite.config.ts',
	'tailwind.config.ts',
	'postcss.config.js',
	'tsconfig.json'
];

/**
 * @param {string} place
 * @returns {string[]} files below, in a fixed order, without tests
 */
const filesIn = (place) => {
	if (!existsSync(place)) return [];
	if (!statSync(place).isDirectory()) return [place];
	return readdirSync(place)
		.sort()
		.flatMap((name) => filesIn(path.join(place, name)))
		.filter((file) => !file.endsWith('.test.ts'));
};

/** A digest of everything that a build is made of. */
export const sourceDigest = () => {
	const hash = createHash('sha256').update(process.versions.node);
	for (const file of sources.flatMap((source) => filesIn(inRoot(source)))) {
		hash.update(`\0${path.relative(root, file)}\0`);
		hash.update(readFileSync(file));
	}
	return hash.digest('hex').slice(0, 16);
};

const builds = inLocal('builds');
const kept = 4;

/** @param {string} out who is using a build: one file for each process */
const usersOf = (out) => path.join(out, '.users');

/** @param {string} out */
export const isUsed = (out) => {
	const place = usersOf(out);
	if (!existsSync(place)) return false;
	return readdirSync(place).some((pid) => {
		const birth = readFileSync(path.join(place, pid), 'utf8');
		return isAlive({ pid: Number(pid), birth });
	});
};

/** @param {string} out */
export const use = (out) => {
	mkdirSync(usersOf(out), { recursive: true });
	writeFileSync(path.join(usersOf(out), String(process.pid)), String(birthOf(process.pid) ?? ''));
	utimesSync(out, new Date(), new Date());
};

/** Removes all but the builds used last and those that a living process still reads from. */
const sweep = () => {
	const age = (/** @type {string} */ name) => statSync(path.join(builds, name)).mtimeMs;
	const old = readdirSync(builds)
		.sort((a, b) => age(b) - age(a))
		.slice(kept)
		.filter((name) => !isUsed(path.join(builds, name)));
	for (const name of old) rmSync(path.join(builds, name), { recursive: true, force: true });
};

/** @param {string} out */
const build = async (out) => {
	say('Building the app …');
	rmSync(out, { recursive: true, force: true });
	const env = { ...process.env, NODE_ENV: 'production', BUILD_OUT: out };
	const vite = inRoot('node_modules', 'vite', 'bin', 'vite.js');
	const { code, output } = await run(process.execPath, [vite, 'build'], { env, quiet: true });
	if (code !== 0 || !existsSync(path.join(out, 'index.js')))
		throw new Refusal(`The app could not be built:\n${output}`);
};

/**
 * The folder of the server built from the sources as they are now; builds only when there is none.
 * Each state of the sources has its own folder, so that a running server keeps the files it is using.
 * @returns {Promise<string>}
 */
export const ensureBuild = () =>
	withLock(
		'build',
		async () => {
			const out = path.join(builds, sourceDigest());
			mkdirSync(builds, { recursive: true });
			if (!existsSync(path.join(out, 'index.js'))) await build(out);
			use(out);
			sweep();
			return out;
		},
		() => say('Waiting for another build of this folder …')
	);
