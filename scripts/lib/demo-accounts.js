import { readFileSync } from 'node:fs';
import { inRoot } from './paths.js';
import { setting } from './environment.js';

/** @typedef {{ firm: string, password: string, people: { email: string, role: string }[] }} Demo */

/**
 * Lines that tell who can sign in to the demo firm; none when DEMO=off.
 * @returns {string[]}
 */
export const demoAccounts = () => {
	if (setting('DEMO') === 'off') return [];
	const file = inRoot('src', 'lib', 'server', 'seed', 'demo-accounts.json');
	/** @type {Demo} */
	const { firm, password, people } = JSON.parse(readFileSync(file, 'utf8'));
	const width = Math.max(...people.map(({ email }) => email.length));
	return [
		`Demo firm ${firm}, password ${password}:`,
		...people.map(({ email, role }) => `  ${email.padEnd(width)}  ${role}`)
	];
};
