import { mkdirSync } from 'node:fs';
import type { TestProject } from 'vitest/node';
import { ensureBuild } from '../../scripts/lib/build.js';
import { isFree } from '../../scripts/lib/ports.js';
import { chromium, ensureSystem, findProgram } from '../../scripts/lib/system-packages.js';
import { startInstanceOf } from './instance';
import { startMailFake } from './mail';
import { openTestDatabase } from './test-database';

declare module 'vitest' {
	interface ProvidedContext {
		/** Address of the running app, without a closing slash. */
		baseUrl: string;
		/** The app's database; its account may create further databases. */
		databaseUrl: string;
		/** Answers GET with all mail sent so far, as JSON (see mail.ts). */
		mailboxUrl: string;
		smtpUrl: string;
		/** Folder of the built server, for tests that start instances of their own. */
		buildFolder: string;
		/** The browser's program, for playwright-core's `executablePath`. */
		chromiumPath: string;
	}
}

type Ending = () => Promise<unknown>;

const undo = async (endings: Ending[]) => {
	for (const end of endings.reverse()) await end().catch(() => undefined);
};

/** PORT where it is given and free; otherwise a free port is taken, so that a running app is no obstacle. */
const wishedPort = async (): Promise<{ PORT?: string }> => {
	const wish = Number(process.env.PORT);
	const usable = Number.isInteger(wish) && wish > 0 && wish < 65_536 && (await isFree(wish));
	return usable ? { PORT: String(wish) } : {};
};

const start = async (project: TestProject, endings: Ending[]) => {
	mkdirSync('tests/output', { recursive: true });
	await ensureSystem(chromium);
	const buildFolder = await ensureBuild();
	const database = await openTestDatabase();
	endings.push(database.release);
	const mail = await startMailFake();
	endings.push(mail.stop);
	const env = { DATABASE_URL: database.url, SMTP_URL: mail.smtpUrl, ...(await wishedPort()) };
	const app = await startInstanceOf(buildFolder, env);
	endings.push(app.stop);
	project.provide('baseUrl', app.url);
	project.provide('databaseUrl', database.url);
	project.provide('mailboxUrl', mail.mailboxUrl);
	project.provide('smtpUrl', mail.smtpUrl);
	project.provide('buildFolder', buildFolder);
	project.provide(
		'chromiumPath',
		findProgram('chromium', 'chromium-browser', 'google-chrome') ?? ''
	);
};

/** Starts what the tests over HTTP need, on free ports, and takes it all down again. */
export default async function setUp(project: TestProject): Promise<Ending> {
	const endings: Ending[] = [];
	try {
		await start(project, endings);
	} catch (error) {
		await undo(endings);
		throw error;
	}
	return () => undo(endings);
}
