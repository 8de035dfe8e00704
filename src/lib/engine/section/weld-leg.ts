import type { SizeField } from './sizes';
import { radius } from './sizes';
import type { Issue } from '../result';

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

/** Leg and throat say the same thing twice; both are accepted only when they agree. */
export function weldIssues({ weldLeg, weldThroat }: Welded): Issue[] {
	if (weldLeg === undefined || weldThroat === undefined) return [];
	const agree = Math.abs(weldThroat * Math.SQRT2 - weldLeg) <= 0.01 * weldLeg;
	const message = 'Give the weld leg or the weld throat: the two do not agree (leg = throat × √2).';
	return agree ? [] : [{ path: 'weldThroat', message }];
}
