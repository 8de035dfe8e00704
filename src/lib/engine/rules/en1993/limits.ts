import type { Standard } from '../result';
import { isLater } from './edition';

/** Slenderness limits of classes 1, 2 and 3. */
export type ClassLimits = [number, number, number];

/** Ratios closer than this are the same: α 0.5, α 1, ψ 1 and ψ −1 have rows of their own. */
export const sameRatio = 1e-9;

/** ψ below this is taken as this: the class 3 limits only grow further, without end. */
export const leastPsi = -3;

/** A limit of class 1 or 2: in bending alone, all compressed, low/α up to α 0.5, high/(factor α − 1) above. */
interface PlasticRow {
	readonly bending: number;
	readonly compression: number;
	readonly low: number;
	readonly high: number;
	readonly factor: number;
}

/** Limits of internal parts in one edition. */
interface InternalTable {
	readonly plastic: readonly [PlasticRow, PlasticRow];
	/** Class 3 in bending, in compression, and per (1 − ψ) beyond ψ −1. */
	readonly bending: number;
	readonly compression: number;
	readonly beyond: number;
	/** Divisor of the compression limit for ψ over −1. */
	readonly divisor: readonly [constant: number, linear: number, square: number];
}

/** EN 1993-1-1:2005 Table 5.2, sheet 1. */
const first: InternalTable = {
	plastic: [
		{ bending: 72, compression: 33, low: 36, high: 396, factor: 13 },
		{ bending: 83, compression: 38, low: 41.5, high: 456, factor: 13 }
	],
	bending: 124,
	compression: 42,
	beyond: 62,
	divisor: [0.67, 0.33, 0]
};

/** EN 1993-1-1:2022 Table 7.3, sheet 1, from memory. */
const later: InternalTable = {
	plastic: [
		{ bending: 72, compression: 28, low: 36, high: 126, factor: 5.5 },
		{ bending: 83, compression: 34, low: 41.5, high: 188, factor: 6.53 }
	],
	bending: 121,
	compression: 38,
	beyond: 60.5,
	divisor: [0.608, 0.343, 0.049]
};

export const internalTable = (standard: Standard): InternalTable =>
	isLater(standard) ? later : first;

/** The branch of a row that α or ψ falls on; each has its own formula. */
export type PlasticBranch = 'bending' | 'compression' | 'low' | 'high';
export type ElasticBranch = 'bending' | 'over' | 'beyond';

export function plasticBranch(alpha: number): PlasticBranch {
	if (Math.abs(alpha - 0.5) <= sameRatio) return 'bending';
	if (alpha >= 1 - sameRatio) return 'compression';
	return alpha > 0.5 ? 'high' : 'low';
}

export function elasticBranch(psi: number): ElasticBranch {
	if (Math.abs(psi + 1) <= sameRatio) return 'bending';
	return psi > -1 ? 'over' : 'beyond';
}

/**
 * c/t limits of an internal part, Table 5.2 sheet 1 (2022: Table 7.3). `alpha`: compressed share
 * of c in the plastic block, above 0; `psi`: stress ratio of the edges at first yield, compression
 * positive, over the more compressed one.
 */
export function internalLimits(
	standard: Standard,
	epsilon: number,
	alpha: number,
	psi: number
): ClassLimits {
	const table = internalTable(standard);
	const [one, two] = table.plastic;
	return [
		epsilon * plasticLimit(one, alpha),
		epsilon * plasticLimit(two, alpha),
		epsilon * elasticInternalLimit(standard, table, psi)
	];
}

function plasticLimit(row: PlasticRow, alpha: number): number {
	const branch = plasticBranch(alpha);
	switch (branch) {
		case 'bending':
		case 'compression':
			return row[branch];
		case 'low':
			return row.low / alpha;
		case 'high':
			return row.high / (row.factor * alpha - 1);
	}
}

function elasticInternalLimit(standard: Standard, table: InternalTable, psi: number): number {
	const branch = elasticBranch(psi);
	if (branch === 'bending') return table.bending;
	if (branch === 'over') {
		const ratio = Math.min(psi, 1);
		const [constant, linear, square] = table.divisor;
		return table.compression / (constant + linear * ratio + square * ratio ** 2);
	}
	const ratio = Math.max(psi, leastPsi);
	const slope = table.beyond * (1 - ratio);
	return isLater(standard) ? slope : slope * Math.sqrt(-ratio);
}

/** Which end of an outstand is the more compressed: the free tip or the supported root. */
export type CompressedEnd = 'tip' | 'root';

/** Stress of an outstand in the plastic block and at first yield. */
export interface OutstandStress {
	alpha: number;
	plasticEnd: CompressedEnd;
	psi: number;
	elasticEnd: CompressedEnd;
}

/** Class 1, 2 and 3 limits of an outstand in uniform compression, over ε. */
export const outstandRow = [9, 10, 14] as const;

/** c/t limits of an outstand flange, Table 5.2 sheet 2; the same in both editions. */
export function outstandLimits(epsilon: number, stress: OutstandStress): ClassLimits {
	const { alpha, plasticEnd, psi, elasticEnd } = stress;
	const share = plasticEnd === 'tip' ? alpha : alpha * Math.sqrt(alpha);
	const [one, two, three] = outstandRow;
	const uniform = psi >= 1 - sameRatio;
	const elastic = uniform ? three : 21 * Math.sqrt(outstandBuckling(psi, elasticEnd));
	return [(one * epsilon) / share, (two * epsilon) / share, epsilon * elastic];
}

/** Buckling factor kσ of an outstand, EN 1993-1-5 Table 4.2; ψ beyond the table is taken at its end. */
export function outstandBuckling(psi: number, end: CompressedEnd): number {
	if (end === 'tip') {
		const ratio = Math.max(psi, leastPsi);
		return 0.57 - 0.21 * ratio + 0.07 * ratio ** 2;
	}
	const ratio = Math.max(psi, -1);
	return ratio > 0 ? 0.578 / (ratio + 0.34) : 1.7 - 5 * ratio + 17.1 * ratio ** 2;
}

/**
 * d/t limits of a round tube, Table 5.2 sheet 3: ε squared. 2005: one row for bending, compression
 * or both. 2022 (from memory): class 3 by the stress ratio ψ of the most and least compressed
 * fibres, 2520ε²/(5ψ + 23), which is 90ε² in compression and 140ε² in bending.
 */
export function tubularLimits(standard: Standard, epsilon: number, psi: number): ClassLimits {
	const square = epsilon ** 2;
	return [50 * square, 70 * square, square * elasticTubularLimit(standard, psi)];
}

function elasticTubularLimit(standard: Standard, psi: number): number {
	if (!isLater(standard)) return 90;
	return 2520 / (5 * Math.min(Math.max(psi, -1), 1) + 23);
}

/** Class 3 limits of an angle in compression over ε: h/t and (b + h)/(2t), Table 5.2 sheet 3. */
export const angleRow = { leg: 15, mean: 11.5 } as const;
