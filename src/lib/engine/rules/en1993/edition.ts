import type { Note } from '../../result';
import type { Standard } from '../result';

/** What a figure of EN 1993-1-1 stands on. */
export type Topic = keyof typeof clauses;

/** Clauses of the 2005 and the 2022 edition; those of 2022 are from memory. */
const clauses = {
	material: ['3.2.1', '5.2.1'],
	ductility: ['3.2.2', '5.2.2'],
	modulus: ['3.2.6', '5.2.5'],
	plasticAnalysis: ['5.4.3', '7.4.3'],
	classification: ['5.5.2', '7.5.2'],
	stressLevel: ['5.5.2(9)', '7.5.2(9)'],
	internal: ['Table 5.2, sheet 1', 'Table 7.3, sheet 1'],
	outstand: ['Table 5.2, sheet 2', 'Table 7.3, sheet 2'],
	tubular: ['Table 5.2, sheet 3', 'Table 7.3, sheet 3'],
	angle: ['Table 5.2, sheet 3', 'Table 7.3, sheet 3'],
	resistance: ['6.2.1', '8.2.1'],
	vonMises: ['6.2.1(5)', '8.2.1(5)'],
	linearSum: ['6.2.1(7)', '8.2.1(7)'],
	effectiveClassTwo: ['6.2.2.4', '8.2.2.4'],
	tension: ['6.2.3', '8.2.3'],
	compression: ['6.2.4', '8.2.4'],
	bending: ['6.2.5', '8.2.5'],
	tensionHoles: ['6.2.5(4)', '8.2.5(4)'],
	shear: ['6.2.6', '8.2.6'],
	bendingShear: ['6.2.8', '8.2.8'],
	axialBending: ['6.2.9.1', '8.2.9.1'],
	biaxial: ['6.2.9.1(6)', '8.2.9.1(6)'],
	classThree: ['6.2.9.2', '8.2.9.2'],
	classFour: ['6.2.9.3', '8.2.9.3'],
	bendingShearAxial: ['6.2.10', '8.2.10'],
	memberBuckling: ['6.3', '8.3'],
	flexuralBuckling: ['6.3.1', '8.3.1'],
	lateralTorsional: ['6.3.2', '8.3.2'],
	interpolated: ['6.2.5', 'Annex B']
} as const satisfies Record<string, readonly [string, string]>;

const later = 'EN1993-1-1:2022';

/** Whether a code is an edition of EN 1993-1-1. */
export const isEn1993 = (standard: Standard): boolean =>
	standard === 'EN1993-1-1:2005' || standard === later;

/** Whether the rules of the 2022 edition are asked for. */
export const isLater = (standard: Standard): boolean => standard === later;

/** `EN 1993-1-1:2005` as a clause is quoted. */
export const editionName = (standard: Standard): string =>
	isLater(standard) ? 'EN 1993-1-1:2022' : 'EN 1993-1-1:2005';

/** The clause of a topic with its edition: `EN 1993-1-1:2005 6.2.5`. */
export function clauseOf(standard: Standard, topic: Topic): string {
	const [first, second] = clauses[topic];
	return `${editionName(standard)} ${isLater(standard) ? second : first}`;
}

/** That the text of the 2022 edition is from memory; empty for 2005. */
export function editionNotes(standard: Standard): Note[] {
	if (!isLater(standard)) return [];
	return [
		{
			code: 'edition-from-memory',
			message:
				'The rules and clause numbers of EN 1993-1-1:2022 are from memory, not compared with its text. Check them against the standard before relying on a figure.',
			clause: editionName(standard)
		}
	];
}

/** That one rule is from memory and uncertain; `what` begins a sentence. */
export const memoryNote = (what: string, clause: string): Note => ({
	code: 'rule-from-memory',
	message: `${what} is from memory and not certain: check it against the standard before relying on it.`,
	clause
});
