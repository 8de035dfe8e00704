import type { Note } from '../../result';
import type { Part, PreparedSection } from '../../section/prepared';
import type { Standard } from '../result';
import { clauseOf, editionName } from './edition';

/** N/mm², EN 1993-1-1 3.2.6. */
export const modulusOfCode = 210_000;
const strongestSteel = 460;
/** EN 1993-1-5, 4.3(6): recommended limit of flange over web strength in a hybrid girder. */
const hybridLimit = 2;
const leastHardening = 1.1;

/** Strengths of the parts as the rules need them, N/mm². */
export interface Strengths {
	/** The greater of tension and compression strength of a part. */
	readonly of: (part: string) => number;
	readonly least: number;
	readonly most: number;
	readonly hybrid: boolean;
	/** Tension and compression strengths are the same in every part. */
	readonly even: boolean;
	readonly modulus: number;
}

export function strengthsOf({ parts }: PreparedSection): Strengths {
	const strong = ({ material }: Part) => Math.max(material.fy, material.fyc);
	const byName = new Map(parts.map((part) => [part.name, strong(part)]));
	const weakest = parts.map(({ material }) => Math.min(material.fy, material.fyc));
	const most = Math.max(...byName.values());
	const even = parts.every(
		({ material: { fy, fyc, law } }) => fy === fyc && law.yieldTension === law.yieldCompression
	);
	return {
		of: (part) => byName.get(part) ?? most,
		least: Math.min(...weakest),
		most,
		hybrid: new Set(parts.map(({ material }) => `${material.fy} ${material.fyc}`)).size > 1,
		even,
		modulus: Math.min(...parts.map(({ material }) => material.E))
	};
}

/** ε = √(235/fy) of Table 5.2; a lower modulus than the code's 210 000 lowers it, a higher one does not help. */
export function epsilonOf(fy: number, modulus: number): number {
	return Math.sqrt((235 / fy) * Math.min(1, modulus / modulusOfCode));
}

/** Why EN 1993-1-1 may not be used for these materials; empty when it may. */
export function strengthIssues(
	{ parts }: PreparedSection,
	strengths: Strengths,
	standard: Standard
): Note[] {
	const notes: Note[] = [];
	const moduli = parts.map(({ material }) => material.E);
	if (strengths.most > strongestSteel)
		notes.push({
			code: 'strength-out-of-range',
			message: `The rules of ${editionName(standard)} are used here for steels up to fy ${strongestSteel}; this section has ${strengths.most}. No class and no resistance are given.`,
			clause: clauseOf(standard, 'material')
		});
	if (Math.min(...moduli) < 190_000 || Math.max(...moduli) > 220_000 || !allSame(moduli))
		notes.push({
			code: 'modulus-out-of-range',
			message:
				'EN 1993-1-1 is for structural steel with one modulus near 210 000 N/mm². No class and no resistance are given.',
			clause: clauseOf(standard, 'modulus')
		});
	if (strengths.most > hybridLimit * strengths.least)
		notes.push({
			code: 'hybrid-out-of-range',
			message: `The strongest part has more than ${hybridLimit} times the strength of the weakest. No class and no resistance are given.`,
			clause: 'EN 1993-1-5 4.3(6)'
		});
	if (parts.some(({ material: { fu, fy } }) => fu !== null && fu < leastHardening * fy))
		notes.push({
			code: 'ductility-out-of-range',
			message: `fu is less than ${leastHardening} fy in a part, too little for the ductility that EN 1993-1-1 asks for. No class and no resistance are given.`,
			clause: clauseOf(standard, 'ductility')
		});
	return notes;
}

const allSame = (values: readonly number[]): boolean => new Set(values).size === 1;
