import type { ClassifiedElement, SectionClass, Standard } from '../result';
import { clauseOf } from './edition';
import type { AngleElement, PlateElement, TubeElement } from './elements/element';
import {
	angleRow,
	internalLimits,
	outstandLimits,
	sameRatio,
	tubularLimits,
	type ClassLimits,
	type CompressedEnd
} from './limits';
import type { StressCase } from './stress-case';

/** How far along a part compression reaches and how steeply it falls. */
export interface Gradient {
	/** Value at the more and at the less compressed end. */
	readonly most: number;
	readonly least: number;
	/** Compressed share of the width. */
	readonly share: number;
	/** Other end over the more compressed end. */
	readonly ratio: number;
	/** `from` is the root, `to` the tip. */
	readonly end: CompressedEnd;
}

/** Greatest size of a stress case's figures over the section: what is nil beside it is nil. */
export interface StressScale {
	readonly plastic: number;
	readonly elastic: number;
}

/** A part's class with what its limits were taken from; a gradient is null where nothing is compressed. */
export interface JudgedElement {
	readonly row: ClassifiedElement;
	/** Strength behind ε, N/mm². */
	readonly fy: number;
	readonly plastic: Gradient | null;
	readonly elastic: Gradient | null;
	/** Of a part that the plastic block leaves in tension: its row once its elastic stress must hold. */
	readonly held: (() => ClassifiedElement) | null;
}

/**
 * Class of a flat part under a stress case. A part counts as compressed where its mid-thickness
 * is. A part that the plastic block leaves in tension (α 0) is class 1 without limits; where the elastic
 * stress compresses it, it is `held` to its class 3 limit in a section that must hold that stress.
 */
export function classifyPlate(
	standard: Standard,
	element: PlateElement,
	stress: StressCase,
	scale: StressScale
): JudgedElement {
	const at = (value: StressCase['plastic'], size: number) =>
		gradientOf(value(element.from), value(element.to), sameRatio * size);
	const plastic = at(stress.plastic, scale.plastic);
	const elastic = at(stress.elastic, scale.elastic);
	const { fy, epsilon } = element;
	if (plastic === null) {
		const row = { ...inTension(standard, element), element: element.id };
		const held = elastic && (() => heldRow(standard, element, elastic));
		return { row, fy, plastic, elastic, held };
	}
	const { share, end: plasticEnd } = plastic;
	const psi = elastic?.ratio ?? Number.NEGATIVE_INFINITY;
	const elasticEnd = (elastic ?? plastic).end;
	const limits =
		element.type === 'internal'
			? internalLimits(standard, epsilon, share, psi)
			: outstandLimits(epsilon, { alpha: share, plasticEnd, psi, elasticEnd });
	const row = described(standard, element, limits, stressName(share, psi));
	row.element = element.id;
	row.alpha = share;
	if (elastic) row.psi = psi;
	return { row, fy, plastic, elastic, held: null };
}

/** A part that only the elastic stress compresses, by its class 3 limit alone: α is 0. */
function heldRow(standard: Standard, element: PlateElement, { ratio, end }: Gradient) {
	const { epsilon } = element;
	const elastic =
		element.type === 'internal'
			? internalLimits(standard, epsilon, 1, ratio)[2]
			: outstandLimits(epsilon, { alpha: 1, plasticEnd: end, psi: ratio, elasticEnd: end })[2];
	const row = described(standard, element, [elastic, elastic, elastic], 'combined');
	return { ...row, element: element.id, alpha: 0, psi: ratio };
}

type TubeStress = 'compression' | 'bending' | 'combined' | 'tension';

/** Class of a round tube; in 2022 its elastic stress counts for class 3. */
export function classifyTube(
	standard: Standard,
	element: TubeElement,
	compressed: TubeStress,
	elastic: StressCase['elastic']
): JudgedElement {
	const { fy, epsilon } = element;
	if (compressed === 'tension')
		return { row: inTension(standard, element), fy, plastic: null, elastic: null, held: null };
	const gradient = tubeGradient(element, elastic);
	const limits = tubularLimits(standard, epsilon, gradient?.ratio ?? -1);
	const row = described(standard, element, limits, compressed);
	return { row, fy, plastic: null, elastic: gradient, held: null };
}

/** Most and least compressed fibre of a round tube. */
function tubeGradient({ c, centre }: TubeElement, elastic: StressCase['elastic']) {
	const { y, z } = centre;
	const middle = elastic(centre);
	const reach = Math.hypot(
		elastic({ y: y + c / 2, z }) - middle,
		elastic({ y, z: z + c / 2 }) - middle
	);
	return gradientOf(middle - reach, middle + reach, 0);
}

/**
 * Class of an angle in compression as a whole, Table 5.2 sheet 3: h/t and (b + h)/(2t), the
 * harder of the two. The row knows class 3 alone; within it the legs as outstands decide.
 */
export function classifyAngle(standard: Standard, element: AngleElement): JudgedElement {
	const { longer, shorter, t, part, fy, epsilon } = element;
	const mean = (longer + shorter) / 2;
	const byMean = mean * angleRow.leg > longer * angleRow.mean;
	const limit = (byMean ? angleRow.mean : angleRow.leg) * epsilon;
	const whole = { part, type: 'angle', c: byMean ? mean : longer, t, epsilon } as const;
	const row = described(standard, whole, [limit, limit, limit], 'compression');
	return { row, fy, plastic: null, elastic: null, held: null };
}

function gradientOf(from: number, to: number, zero: number): Gradient | null {
	const [most, least] = [Math.max(from, to), Math.min(from, to)];
	if (most <= zero) return null;
	return {
		most,
		least,
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

type Measured = Pick<ClassifiedElement, 'part' | 'type' | 'c' | 't' | 'epsilon'>;

function described(
	standard: Standard,
	{ part, type, c, t, epsilon }: Measured,
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
		clause: clauseOf(standard, type)
	};
}

/** Unrounded: on a limit is within it. */
export function classWithin(slenderness: number, limits: ClassLimits): SectionClass {
	if (slenderness <= limits[0]) return 1;
	if (slenderness <= limits[1]) return 2;
	return slenderness <= limits[2] ? 3 : 4;
}

function inTension(standard: Standard, { part, type, c, t, epsilon }: Measured): ClassifiedElement {
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
		clause: clauseOf(standard, 'classification')
	};
}
