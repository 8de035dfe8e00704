import { complain, Refusal, say } from './say.js';

/** @type {(() => Promise<unknown> | void)[]} */
const endings = [];
/** @type {Promise<void> | undefined} */
let ending;

/** True once this process has begun to stop. */
export const isEnding = () => ending !== undefined;

/**
 * Registers something to undo when this process stops; the last registered is undone first.
 * @param {() => Promise<unknown> | void} undo
 */
export const atEnd = (undo) => {
	endings.push(undo);
};

const runEndings = async () => {
	for (let undo = endings.pop(); undo; undo = endings.pop()) {
		try {
			await undo();
		} catch (error) {
			complain(`While stopping: ${error instanceof Error ? error.message : String(error)}`);
		}
	}
};

/**
 * Stops everything once, however often it is asked to, and leaves with the code of the first asker.
 * @param {number} code
 */
export const end = (code) => {
	ending ??= runEndings().finally(() => process.exit(code));
	return ending;
};

/**
 * Runs a script's work with the same manners for all of them: a signal stops what was started, a
 * refusal is one sentence, a bug shows its stack.
 * @param {() => Promise<number | void>} work resolves to an exit code, or nothing to keep running
 * @param {{ signalCode?: number }} [options]
 */
export const live = async (work, { signalCode = 0 } = {}) => {
	for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
		process.on(signal, () => {
			if (!isEnding()) say('Stopping …');
			void end(signalCode);
		});
	}
	try {
		const code = await work();
		if (code !== undefined) await end(code);
	} catch (error) {
		if (isEnding()) return;
		if (error instanceof Refusal) complain(`\n${error.message}`);
		else complain(error instanceof Error ? String(error.stack) : String(error));
		await end(1);
	}
};
