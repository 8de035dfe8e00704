import { codeChoice } from '$lib/engine/rules/code-choice';
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

/** Edition, strengths, γM0 and η in one line. */
export function editionText({
	code,
	strengthBasis
}: Pick<Study, 'code' | 'strengthBasis'>): string {
	const { standard, gammaM0, eta } = codeChoice(code);
	const strengths =
		strengthBasis === 'code-table' ? 'strengths by code table' : 'strengths by product standard';
	return `${editionName(standard)}, ${strengths} · γM0 ${gammaM0.toFixed(2)} · η ${eta.toFixed(2)}`;
}
