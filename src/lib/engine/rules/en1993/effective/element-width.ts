import type { CompressedEnd } from '../limits';
import { sameRatio } from '../limits';
import type { PlateElement } from '../elements/element';
import { bucklingFactor } from './buckling-factor';
import {
	plateSlenderness,
	reducedSlenderness,
	reductionAtStress,
	reductionFactor
} from './reduction';

/** The effective width of a compressed element and what it comes from; mm. */
export interface ElementWidth {
	readonly element: PlateElement;
	/** Stresses at the more and the less compressed edge, compression positive, in the field's scale. */
	readonly most: number;
	readonly least: number;
	readonly psi: number;
	/** Of an outstand: which end is the more compressed; of an internal part `to` counts as the tip. */
	readonly end: CompressedEnd;
	readonly kSigma: number;
	readonly slenderness: number;
	/** λp,red where the stress level is used, 4.4(4). */
	readonly reducedSlenderness: number | null;
	readonly rho: number;
	readonly compressedWidth: number;
	readonly effective: number;
	/** be1 beside the more compressed edge and be2; an outstand keeps its width beside its support: [beff, 0]. */
	readonly edges: readonly [number, number];
	/** Distances from the element's `from` end between which nothing counts; null where all counts. */
	readonly removed: readonly [number, number] | null;
}

/** Greatest design stress of an element over fy/γM0, 4.4(4). */
export type StressUse = (element: PlateElement) => number;

/**
 * Effective width by EN 1993-1-5 4.4(2), Tables 4.1 and 4.2, for the elastic stresses at the ends of an
 * element (compression positive); null without compression. `zero` is the stress that counts as none.
 */
export function elementWidth(
	element: PlateElement,
	atFrom: number,
	atTo: number,
	zero: number,
	use?: StressUse
): ElementWidth | null {
	const [most, least] = atTo >= atFrom ? [atTo, atFrom] : [atFrom, atTo];
	if (most <= zero) return null;
	const psi =
		Math.abs(most - least) <= sameRatio * most ? 1 : Math.abs(least) <= zero ? 0 : least / most;
	const end = atTo >= atFrom || psi === 1 ? 'tip' : 'root';
	const { type, c, t, epsilon } = element;
	const kSigma = bucklingFactor(type, psi, end);
	const slenderness = plateSlenderness(c, t, epsilon, kSigma);
	const reduced = use ? reducedSlenderness(slenderness, use(element)) : null;
	const rho =
		reduced === null
			? reductionFactor(type, slenderness, psi)
			: reductionAtStress(type, slenderness, reduced, psi);
	const compressedWidth = psi < 0 ? c / (1 - psi) : c;
	const effective = rho * compressedWidth;
	const edges = edgeWidths(type, psi, effective);
	return {
		element,
		most,
		least,
		psi,
		end,
		kSigma,
		slenderness,
		reducedSlenderness: reduced,
		rho,
		compressedWidth,
		effective,
		edges,
		removed: rho < 1 ? removedPart(element, end, compressedWidth, effective, edges[0]) : null
	};
}

function edgeWidths(type: PlateElement['type'], psi: number, effective: number): [number, number] {
	if (type === 'outstand') return [effective, 0];
	if (psi === 1) return [effective / 2, effective / 2];
	const first = psi < 0 ? 0.4 * effective : (2 * effective) / (5 - psi);
	return [first, psi < 0 ? 0.6 * effective : effective - first];
}

/** Internal: between the strips beside the edges. Outstand: what lies furthest from the support of its compressed width. */
function removedPart(
	{ type, c }: PlateElement,
	end: CompressedEnd,
	compressed: number,
	effective: number,
	first: number
): [number, number] {
	const lost = compressed - effective;
	if (type === 'internal')
		return end === 'tip' ? [c - first - lost, c - first] : [first, first + lost];
	return end === 'tip' ? [c - lost, c] : [effective, compressed];
}
