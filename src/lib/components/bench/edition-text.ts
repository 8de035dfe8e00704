import { codeChoice, defaultCode } from '$lib/engine/rules/code-choice';
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

/** The choices of the code that stand in no other line, each in a sentence where it matters. */
export function codeText({ code }: Pick<Study, 'code'>): string {
	const { standard, gammaM1, gammaM2, ...choice } = codeChoice(code);
	const later = standard === 'EN1993-1-1:2022';
	const clause = later ? '8.2.2.4' : '6.2.2.4';
	const factors = [
		gammaM1 === defaultCode.gammaM1 ? '' : `γM1 ${gammaM1}`,
		gammaM2 === defaultCode.gammaM2 ? '' : `γM2 ${gammaM2}`
	].filter(Boolean);
	return [
		choice.allowEffectiveClass2
			? `A class 3 web is counted as effective class 2 where ${clause} allows it.`
			: `A class 3 web is not counted as effective class 2 (${clause} is not used).`,
		choice.useStressLevel
			? `Class 4 is taken as class 3 where the stress is low (${later ? '7.5.2(9)' : '5.5.2(9)'}).`
			: '',
		choice.classAlpha === 'proportional' ? 'α of a web under N with N and M in proportion.' : '',
		!later && choice.ltbCurves === 'rolled-or-equivalent'
			? 'Lateral–torsional buckling by the curves for rolled or equivalent sections (6.3.2.3).'
			: '',
		factors.length > 0 ? `${factors.join(', ')}.` : ''
	]
		.filter(Boolean)
		.join(' ');
}
