/** A start that cannot go on; the message is a whole sentence for the person at the keyboard. */
export class Refusal extends Error {}

/** @param {string} line */
export const say = (line) => {
	process.stdout.write(`${line}\n`);
};

/** @param {string} line */
export const complain = (line) => {
	process.stderr.write(`${line}\n`);
};
