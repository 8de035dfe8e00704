import { plasticMomentOf } from '../../../response/plastic';
import type { EnModel } from '../model';
import { plateGirderOf, type GirderFlange, type PlateGirder } from '../plate-girder';
import { cutMechanics } from './cut-mechanics';
import { elementWidth } from './element-width';
import { stripOf, type Strip } from './strip';

/** Bending about y: +My compresses the top. */
export type MajorSense = 'plusMy' | 'minusMy';

/** What `flangesMoment` stands on, N, mm², mm and kNm; areas are effective. */
export interface FlangesMoment {
	readonly value: number;
	/** Flange forces at yield, N, without γM0. */
	readonly compression: number;
	readonly tension: number;
	readonly lever: number;
	/** Multiplies for N, EN 1993-1-5 5.4(2); 1 without. */
	readonly axialFactor: number;
}

/**
 * Design moment of the effective flanges alone, Mf,Rd of EN 1993-1-5 5.4(2) and 7.1(1), kNm: the weaker
 * flange's force over the distance between them, less the share of N (kN, either sign) in both
 * flanges. Flanges at their own strengths; a flange that is compressed by its effective width (both
 * under a compressive N). Null for sections other than an I, a box or plates that stand as an I.
 */
export function flangesMoment(model: EnModel, sense: MajorSense, N = 0): FlangesMoment | null {
	const girder = plateGirderOf(model.section.definition);
	if (girder === null) return null;
	const { gammaM0 } = model.code;
	const lost = lostArea(flangeStrips(model, girder, sense, N));
	const force = ({ part, b, t }: GirderFlange) => (b * t - lost(part)) * strength(model, part);
	const [compression, tension] = flangesBy(girder, sense).map(force) as [number, number];
	const axialFactor = Math.max(0, 1 - (Math.abs(N) * 1e3 * gammaM0) / (compression + tension));
	const least = Math.min(compression, tension) / gammaM0;
	return {
		value: least * girder.lever * axialFactor * 1e-6,
		compression,
		tension,
		lever: girder.lever,
		axialFactor
	};
}

/**
 * Design plastic moment of the effective flanges with the web counted whole whatever its class, Mpl,Rd of
 * EN 1993-1-5 7.1(1), kNm; with N (kN, at the gross centroid, tension positive) the moment left beside
 * it, never more than without N. Null for other sections than those, and where N alone is
 * too much.
 */
export function flangesWithWebMoment(model: EnModel, sense: MajorSense, N = 0): number | null {
	const girder = plateGirderOf(model.section.definition);
	if (girder === null) return null;
	const { gammaM0 } = model.code;
	const axisAngle = sense === 'plusMy' ? 0 : 180;
	const strips = flangeStrips(model, girder, sense, N);
	const mechanics = cutMechanics(model.section, model.mechanics, strips);
	const at = (axial: number) =>
		plasticMomentOf(mechanics, { axisAngle, transverse: 'curvature-zero', N: axial * gammaM0 })
			.moment;
	const free = at(0);
	const moment = N === 0 ? free : at(N);
	if (moment === null || free === null) return null;
	return Math.max(0, Math.min(moment, free)) / gammaM0;
}

/** The flange that bending compresses, and the other. */
const flangesBy = (
	{ top, bottom }: PlateGirder,
	sense: MajorSense
): [GirderFlange, GirderFlange] => (sense === 'plusMy' ? [top, bottom] : [bottom, top]);

/** What a compressed flange loses under uniform compression, Tables 4.1 and 4.2 with ψ = 1. */
function flangeStrips(
	{ elements }: EnModel,
	girder: PlateGirder,
	sense: MajorSense,
	N: number
): Strip[] {
	if (elements.kind !== 'plates') return [];
	const flanges = flangesBy(girder, sense).map(({ part }) => part);
	const compressed = N < 0 ? flanges : flanges.slice(0, 1);
	return elements.plates
		.filter(({ part }) => compressed.includes(part))
		.flatMap((plate) => {
			const removed = elementWidth(plate, 1, 1, 0)?.removed;
			return removed ? [stripOf(plate, removed[0], removed[1])] : [];
		});
}

const lostArea = (strips: readonly Strip[]) => (name: string) =>
	strips.reduce((sum, { element, area }) => sum + (element.part === name ? area : 0), 0);

function strength({ section: { parts } }: EnModel, name: string): number {
	const material = parts.find((part) => part.name === name)?.material;
	return material ? Math.min(material.fy, material.fyc) : 0;
}
