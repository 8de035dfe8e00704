import type { Issue } from '../result';
import { fits, millimetres, radius, type SizeField } from './sizes';

interface Welded {
	readonly weldLeg?: number;
	readonly weldThroat?: number;
}

/** Fillet leg, mm: as given, or throat × √2 (equal-leg fillet), 0 when neither is. */
export const weldLegOf = ({ weldLeg, weldThroat }: Welded): number =>
	weldLeg ?? (weldThroat ?? 0) * Math.SQRT2;

export const weldFields = ({ weldLeg, weldThroat }: Welded): SizeField[] => [
	radius('weldLeg', 'Weld leg', weldLeg),
	radius('weldThroat', 'Weld throat', weldThroat)
];

/** Where a fillet stands, mm: what it has room on, and the thicker of the plates that it joins. */
export interface WeldPlace {
	readonly outstand: number;
	/** Length of web that one fillet may take, and what that is called. */
	readonly web: number;
	readonly webWords: string;
	/** Thicknesses of the plates that meet, joint by joint. */
	readonly joints: readonly (readonly [number, number])[];
}

/**
 * What is wrong with a fillet: leg and throat that disagree, no room for the leg, or a throat that
 * is more than the thicker joined plate (common practice, no source). A longer leg would only
 * shorten the plate beside it and so its slenderness.
 */
export function weldIssues(welded: Welded, place: WeldPlace): Issue[] {
	return [...roomIssues(welded, place), ...agreementIssues(welded)];
}

function roomIssues(welded: Welded, { outstand, web, webWords, joints }: WeldPlace): Issue[] {
	const leg = weldLegOf(welded);
	const thicker = Math.min(...joints.map(([a, b]) => Math.max(a, b)));
	const limits: [number, string][] = [
		[outstand, 'the flange outstand'],
		[web, webWords],
		[Math.SQRT2 * thicker, '√2 times the thicker joined plate']
	];
	const [limit, words] = limits.reduce((least, next) => (next[0] < least[0] ? next : least));
	if (leg === 0 || fits(leg, limit)) return [];
	const message = `${legWords(welded)} must not be more than ${words}, ${millimetres(limit)}.`;
	return [{ path: welded.weldLeg === undefined ? 'weldThroat' : 'weldLeg', message }];
}

function legWords(welded: Welded): string {
	const leg = millimetres(weldLegOf(welded));
	if (welded.weldLeg !== undefined) return `Weld leg ${leg}`;
	return `Weld throat ${millimetres(welded.weldThroat ?? 0)} (leg ${leg})`;
}

/** Leg and throat say the same thing twice; both are accepted only when they agree. */
function agreementIssues({ weldLeg, weldThroat }: Welded): Issue[] {
	if (weldLeg === undefined || weldThroat === undefined) return [];
	const agree = Math.abs(weldThroat * Math.SQRT2 - weldLeg) <= 0.01 * weldLeg;
	const message = 'Give the weld leg or the weld throat: the two do not agree (leg = throat × √2).';
	return agree ? [] : [{ path: 'weldThroat', message }];
}
