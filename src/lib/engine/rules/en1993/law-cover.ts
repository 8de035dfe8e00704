import { initialModulus } from '../../material/laws';
import type { Material } from '../../material/material';
import type { Note } from '../../result';
import type { Part } from '../../section/prepared';
import type { Standard } from '../result';
import { clauseOf } from './edition';

const rounding = 1e-9;
/** How far the first slope of a tabulated law may stand off E: digits of the table, from no standard. */
const sameModulus = 1e-3;

/**
 * Whether the code's strengths hold for a stress–strain law: it starts with E and never lies below
 * the elastic–perfectly plastic law of E and fy (fyc in compression).
 */
const isCovered = ({ law, E, fy, fyc }: Material): boolean => {
	const stiff = [initialModulus(law), slopeBelowZero(law)];
	if (stiff.some((slope) => Math.abs(slope - E) > sameModulus * E)) return false;
	return (law.slopes.at(-1) ?? 0) >= 0 && (law.slopes[0] ?? 0) >= 0 && holds(law, E, fy, fyc);
};

type Law = Material['law'];

function slopeBelowZero({ kinks, slopes }: Law): number {
	const at = kinks.findIndex((kink) => kink >= 0);
	return slopes[at < 0 ? slopes.length - 1 : at] ?? 0;
}

/** Both laws are straight between their kinks, so that the kinks decide. */
function holds(law: Law, E: number, fy: number, fyc: number): boolean {
	const least = (strain: number) => Math.min(E * Math.abs(strain), strain < 0 ? fyc : fy);
	return [...law.kinks, fy / E, -fyc / E].every((strain) =>
		sizesAt(law, strain).every((size) => size >= least(strain) * (1 - rounding))
	);
}

/** Stress on either side of a strain as a size in the strain's own sense, N/mm². */
function sizesAt({ kinks, offsets, slopes }: Law, strain: number): number[] {
	const first = kinks.filter((kink) => kink < strain).length;
	const last = kinks.filter((kink) => kink <= strain).length;
	return [first, last].map((at) => Math.sign(strain) * (offsets[at]! + slopes[at]! * strain));
}

/** Whether a law gives more than fy anywhere. */
function hardens({ law, fy, fyc }: Material): boolean {
	const { kinks, offsets, slopes } = law;
	if ((slopes.at(-1) ?? 0) > 0 || (slopes[0] ?? 0) > 0) return true;
	return kinks.some((kink, i) =>
		[i, i + 1].some((at) => {
			const stress = offsets[at]! + slopes[at]! * kink;
			return stress > fy * (1 + rounding) || -stress > fyc * (1 + rounding);
		})
	);
}

/** Why a stress–strain law keeps the code's class and resistances away; empty when none does. */
export function lawIssues(parts: readonly Part[], standard: Standard): Note[] {
	const names = namesOf(parts, ({ material }) => !isCovered(material));
	if (names.length === 0) return [];
	return [
		{
			code: 'law-not-covered',
			message: `The stress–strain law of ${names.join(', ')} lies below the elastic–perfectly plastic law of E and fy, or starts with another modulus. The code's strengths do not hold for it: no class and no resistance are given.`,
			clause: clauseOf(standard, 'plasticAnalysis')
		}
	];
}

/** That resistances stay on fy where a law hardens beyond it. */
export function lawNotes(parts: readonly Part[], standard: Standard): Note[] {
	const names = namesOf(parts, ({ material }) => hardens(material));
	if (names.length === 0) return [];
	return [
		{
			code: 'hardening-not-counted',
			message: `The stress–strain law of ${names.join(', ')} gives more than fy. Class and resistances are of fy alone.`,
			clause: clauseOf(standard, 'resistance')
		}
	];
}

const namesOf = (parts: readonly Part[], which: (part: Part) => boolean): string[] => [
	...new Set(parts.filter(which).map(({ name }) => name))
];
