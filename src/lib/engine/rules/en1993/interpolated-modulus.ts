import { iSizes } from '../../section/kinds/i';
import type { ClassifiedElement } from '../result';
import type { AxisSense } from '../section-moments';
import type { ClassifiedCase } from './classify';
import type { EnModel } from './model';

/** One row of β_ep: slenderness, the class 2 limit it starts from and the class 3 span, in ε. */
export interface Row {
	readonly symbol: string;
	readonly slenderness: number;
	readonly epsilon: number;
	readonly from: number;
	readonly span: number;
	/** Tubes use ε². */
	readonly squared: boolean;
}

/** β_ep of Annex B of EN 1993-1-1:2022 with the rows it came from; 0 plastic, 1 elastic. */
export interface Interpolation {
	readonly beta: number;
	readonly rows: readonly Row[];
}

/**
 * β_ep of a class 3 section in bending about one axis: I and H about y and z, rectangular and
 * circular tubes. Null for other kinds, unequal flanges and hybrids, for which first yield
 * counts. The side walls of a rectangular tube in bending about z are held as its webs are about y.
 */
export function interpolationOf(
	{ section: { definition }, strengths, code }: EnModel,
	sense: AxisSense,
	{ overall, elements }: ClassifiedCase
): Interpolation | null {
	if (code.standard !== 'EN1993-1-1:2022' || overall !== 3) return null;
	if (strengths.hybrid || !strengths.even) return null;
	const weak = sense === 'plusMz' || sense === 'minusMz';
	const pressed = elements.filter(({ limits }) => limits.length > 0);
	switch (definition.kind) {
		case 'i': {
			const { bTop, tfTop, bBottom, tfBottom } = iSizes(definition);
			if (bTop !== bBottom || tfTop !== tfBottom) return null;
			const flange = rowOf(
				pressed,
				['topFlange', 'bottomFlange'],
				'outstand',
				'c_f',
				10,
				weak ? 6 : 4
			);
			return interpolated(
				weak ? flange : [...flange, ...rowOf(pressed, ['web'], 'internal', 'c_w', 83, 38)]
			);
		}
		case 'rectangular-hollow': {
			const flanges = weak ? sideWalls : levelWalls;
			const webs = weak ? levelWalls : sideWalls;
			return interpolated([
				...rowOf(pressed, flanges, 'internal', 'c_f', 34, 4),
				...rowOf(pressed, webs, 'internal', 'c_w', 83, 38)
			]);
		}
		case 'circular-hollow':
			return interpolated(
				rowOf(pressed, ['wall'], 'tubular', 'd', 70, 70).map((row) => ({ ...row, squared: true }))
			);
		default:
			return null;
	}
}

const levelWalls = ['topFlange', 'bottomFlange'];
const sideWalls = ['leftWeb', 'rightWeb'];

function interpolated(rows: readonly Row[]): Interpolation | null {
	if (rows.length === 0) return null;
	const beta = Math.max(0, ...rows.map(shareOf));
	return { beta: Math.min(1, beta), rows };
}

/** How far a part has come from its class 2 limit to its class 3 limit. */
export function shareOf({ slenderness, epsilon, from, span, squared }: Row): number {
	const unit = squared ? epsilon ** 2 : epsilon;
	return (slenderness - from * unit) / (span * unit);
}

/** The most slender of the named parts that is compressed. */
function rowOf(
	elements: readonly ClassifiedElement[],
	parts: readonly string[],
	type: ClassifiedElement['type'],
	symbol: string,
	from: number,
	span: number
): Row[] {
	const found = elements.filter((element) => element.type === type && parts.includes(element.part));
	const [first, ...rest] = found;
	if (!first) return [];
	const worst = rest.reduce((a, b) => (b.slenderness > a.slenderness ? b : a), first);
	const { slenderness, epsilon } = worst;
	return [{ symbol, slenderness, epsilon, from, span, squared: false }];
}
