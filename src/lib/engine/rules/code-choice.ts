import type { CodeChoice } from './result';

/** Recommended values of the Eurocodes; each is an input because national annexes differ. */
export const defaultCode: CodeChoice = {
	standard: 'EN1993-1-1:2005',
	gammaM0: 1,
	gammaM1: 1,
	gammaM2: 1.25,
	eta: 1.2,
	method: 'LRFD',
	classAlpha: 'actual-N',
	allowEffectiveClass2: true
};

/** The code asked for, with defaults for what was left open. */
export function codeChoice(asked: Partial<CodeChoice> = {}): CodeChoice {
	const given = Object.entries(asked).filter(([, value]) => value !== undefined);
	return { ...defaultCode, ...Object.fromEntries(given) };
}
