import type { Note } from '../result';
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
	allowEffectiveClass2: true,
	useStressLevel: false,
	ltbCurves: 'general'
};

/** The code asked for, with defaults for what was left open. */
export function codeChoice(asked: Partial<CodeChoice> = {}): CodeChoice {
	const given = Object.entries(asked).filter(([, value]) => value !== undefined);
	return { ...defaultCode, ...Object.fromEntries(given) };
}

/** Partial factors of any national annex lie well within these; from no standard. */
const leastGamma = 0.9;
const mostGamma = 2;

/** Factors that no figure may be built on; empty when all may be used. */
export function factorIssues({ gammaM0, gammaM1, gammaM2, eta }: CodeChoice): Note[] {
	const wrong = Object.entries({ γM0: gammaM0, γM1: gammaM1, γM2: gammaM2 })
		.filter(([, value]) => !(value >= leastGamma && value <= mostGamma))
		.map(([name, value]) => outOfRange(name, value, `from ${leastGamma} to ${mostGamma}`));
	return eta === 1 || eta === 1.2 ? wrong : [...wrong, outOfRange('η', eta, '1 or 1.2')];
}

const outOfRange = (name: string, value: number, range: string): Note => ({
	code: 'factor-out-of-range',
	message: `${name} must be ${range}, not ${value}. No class and no resistance are given.`
});
