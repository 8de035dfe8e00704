import type { ClassifiedElement, SectionClass } from '../result';
import {
	internalLimits,
	outstandLimits,
	sameRatio,
	tubularLimits,
	type ClassLimits,
	type CompressedEnd
} from './limits';
import type { PlateElement, TubeElement } from './plate-elements';
import type { StressCase } from './stress-case';

/** How far along a part compression reaches and how steeply it falls; null where there is none. */
interface Gradient {
	/** Compressed share of the width. */
	share: number;
	/** Other end over the more compressed end. */
	ratio: number;
	/** `from` is the root, `to` the tip. */
	end: CompressedEnd;
}

/** Greatest size of a stress case's figures over the section: what is nil beside it is nil. */
export interface StressScale {
	readonly plastic: number;
	readonly elastic: number;
}

const table = 'EN 1993-1-1:2005 Table 5.2';

/**
 * Class of a flat part under a stress case. A part counts as compressed where its mid-thickness
 * is. A part without compression at either limit is in tension: class 1, no limits.
 */
export function classifyPlate(
	element: PlateElement,
	stress: StressCase,
	scale: StressScale
): ClassifiedElement {
	const at = (value: StressCase['plastic'], size: number) =>
		gradientOf(value(element.from), value(element.to), sameRatio * size);
	const plastic = at(stress.plastic, scale.plastic);
	const elastic = at(stress.elastic, scale.elastic);
	const share = plastic?.share ?? elastic?.share;
	if (share === undefined) return inTension(element);
	const psi = elastic?.ratio ?? Number.NEGATIVE_INFINITY;
	const plasticEnd = (plastic ?? elastic)?.end ?? 'tip';
	const elasticEnd = (elastic ?? plastic)?.end ?? 'tip';
	const limits =
		element.type === 'internal'
			? internalLimits(element.epsilon, share, psi)
			: outstandLimits(element.epsilon, { alpha: share, plasticEnd, psi, elasticEnd });
	const row = described(element, limits, stressName(share, psi));
	row.alpha = share;
	if (elastic) row.psi = psi;
	return row;
}

export function classifyTube(
	element: TubeElement,
	compressed: 'compression' | 'bending' | 'combined' | 'tension'
): ClassifiedElement {
	if (compressed === 'tension') return inTension(element);
	return described(element, tubularLimits(element.epsilon), compressed);
}

function gradientOf(from: number, to: number, zero: number): Gradient | null {
	const [most, least] = [Math.max(from, to), Math.min(from, to)];
	if (most <= zero) return null;
	return {
		share: least >= -zero ? 1 : most / (most - least),
		ratio: least / most,
		end: to >= from ? 'tip' : 'root'
	};
}

function stressName(share: number, psi: number): ClassifiedElement['stress'] {
	if (share >= 1 - sameRatio && psi >= 1 - sameRatio) return 'compression';
	const bending = Math.abs(share - 0.5) <= sameRatio && Math.abs(psi + 1) <= sameRatio;
	return bending ? 'bending' : 'combined';
}

function described(
	{ part, type, c, t, epsilon }: PlateElement | TubeElement,
	limits: ClassLimits,
	stress: ClassifiedElement['stress']
): ClassifiedElement {
	const slenderness = c / t;
	const own = classWithin(slenderness, limits);
	return {
		part,
		type,
		stress,
		c,
		t,
		slenderness,
		epsilon,
		limits,
		class: own,
		clause: sheets[type]
	};
}

const sheets = {
	internal: `${table}, sheet 1`,
	outstand: `${table}, sheet 2`,
	tubular: `${table}, sheet 3`
} as const;

/** Unrounded: on a limit is within it. */
export function classWithin(slenderness: number, limits: ClassLimits): SectionClass {
	if (slenderness <= limits[0]) return 1;
	if (slenderness <= limits[1]) return 2;
	return slenderness <= limits[2] ? 3 : 4;
}

function inTension(element: PlateElement | TubeElement): ClassifiedElement {
	const { part, type, c, t, epsilon } = element;
	return {
		part,
		type,
		stress: 'tension',
		c,
		t,
		slenderness: c / t,
		epsilon,
		limits: [],
		class: 1,
		clause: 'EN 1993-1-1:2005 5.5.2'
	};
}
