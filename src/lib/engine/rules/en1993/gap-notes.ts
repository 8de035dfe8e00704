import type { Note } from '../../result';
import type { DemandCase } from './demand-case';
import { clauseOf } from './edition';
import { platesGaps } from './plates-gaps';

/** Why checks of a demand that apply have no figure. */
export function gapNotes(c: DemandCase, gap: 'holes' | 'slender' | null): Note[] {
	return [...ruleGap(c, gap), ...shearGap(c), ...platesGaps(c)];
}

function ruleGap(
	{ name, context: { model } }: DemandCase,
	gap: 'holes' | 'slender' | null
): Note[] {
	if (gap === null) return [];
	const { standard } = model.code;
	if (gap === 'slender')
		return [
			{
				code: 'class-4-not-built',
				message: `Under ${name} the section is class 4 where no effective widths apply (a round tube is for EN 1993-1-6), so nothing is counted.`,
				clause: 'EN 1993-1-5 4.4'
			}
		];
	return [
		{
			code: 'resistance-missing',
			message: `${capital(name)} pulls a part with bolt holes for which no resistance is given: its grade has no fu, or its plates are class 4.`,
			clause: clauseOf(standard, 'tensionHoles')
		}
	];
}

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);

function shearGap({ name, demand, shear, context: { model } }: DemandCase): Note[] {
	const { Vy = 0, Vz = 0 } = demand;
	const { y, z } = shear.resistances;
	if (!((Vz !== 0 && z === null) || (Vy !== 0 && y === null))) return [];
	return [
		{
			code: 'shear-not-checked',
			message: `The shear of ${name} has no resistance to be checked against.`,
			clause: clauseOf(model.code.standard, 'shear')
		}
	];
}
