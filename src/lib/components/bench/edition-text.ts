import { codeChoice } from '$lib/engine/rules/code-choice';
import { formatNumber, type Preferences } from '$lib/units';
import type { Study } from './study';

const editions: Readonly<Record<string, string>> = {
	'EN1993-1-1:2005': 'EN 1993-1-1:2005',
	'EN1993-1-1:2022': 'EN 1993-1-1:2022',
	'AISC360-22': 'AISC 360-22',
	'CSA-S16:19': 'CSA S16:19',
	AS4100: 'AS 4100',
	IS800: 'IS 800'
};

export const editionName = (standard: string): string => editions[standard] ?? standard;

/** Edition, strengths, γM0 and η in one line, in the reader's decimal mark. */
export function editionText(
	{ code, strengthBasis }: Pick<Study, 'code' | 'strengthBasis'>,
	preferences: Pick<Preferences, 'decimal'>
): string {
	const { standard, gammaM0, eta } = codeChoice(code);
	const factor = (value: number) => formatNumber(value, preferences, { decimals: 2 });
	const strengths =
		strengthBasis === 'code-table' ? 'strengths by code table' : 'strengths by product standard';
	return `${editionName(standard)}, ${strengths} · γM0 ${factor(gammaM0)} · η ${factor(eta)}`;
}

/** The choices of the code that are not numbers, in a sentence. */
export const codeText = ({ code }: Pick<Study, 'code'>): string =>
	codeChoice(code).allowEffectiveClass2
		? 'A class 3 web is counted as effective class 2 where 6.2.2.4 allows it.'
		: 'A class 3 web is not counted as effective class 2 (6.2.2.4 is not used).';
