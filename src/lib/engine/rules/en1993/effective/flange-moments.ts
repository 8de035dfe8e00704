import { plasticMomentOf } from '../../../response/plastic';
import { boxSizes } from '../../../section/kinds/box';
import { iSizes } from '../../../section/kinds/i';
import type { PreparedSection } from '../../../section/prepared';
import type { EnModel } from '../model';
import { cutMechanics } from './cut-mechanics';
import { elementWidth } from './element-width';
import { stripOf, type Strip } from './strip';

/** Bending about y: +My compresses the top. */
export type MajorSense = 'plusMy' | 'minusMy';

interface Flanges {
	readonly top: number;
	readonly bottom: number;
	/** Between the middles of the flanges. */
	readonly lever: number;
}

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
 * under a compressive N). Null for sections other than an I or a box.
 */
export function flangesMoment(model: EnModel, sense: MajorSense, N = 0): FlangesMoment | null {
	const flanges = flangesOf(model.section);
	if (flanges === null) return null;
	const { gammaM0 } = model.code;
	const [pressed, pulled] = flangeNames(sense);
	const lost = lostArea(flangeStrips(model, sense, N));
	const compression = (areaOf(flanges, pressed) - lost(pressed)) * strength(model, pressed);
	const tension = (areaOf(flanges, pulled) - lost(pulled)) * strength(model, pulled);
	const axialFactor = Math.max(0, 1 - (Math.abs(N) * 1e3 * gammaM0) / (compression + tension));
	const force = Math.min(compression, tension) / gammaM0;
	return {
		value: force * flanges.lever * axialFactor * 1e-6,
		compression,
		tension,
		lever: flanges.lever,
		axialFactor
	};
}

/**
 * Design plastic moment of the effective flanges with the web counted whole whatever its class, Mpl,Rd of
 * EN 1993-1-5 7.1(1), kNm; with N (kN, at the gross centroid, tension positive) the moment left beside
 * it, never more than without N. Null for sections other than an I or a box, and where N alone is
 * too much.
 */
export function flangesWithWebMoment(model: EnModel, sense: MajorSense, N = 0): number | null {
	if (flangesOf(model.section) === null) return null;
	const { gammaM0 } = model.code;
	const axisAngle = sense === 'plusMy' ? 0 : 180;
	const strips = flangeStrips(model, sense, N);
	const mechanics = cutMechanics(model.section, model.mechanics, strips);
	const at = (axial: number) =>
		plasticMomentOf(mechanics, { axisAngle, transverse: 'curvature-zero', N: axial * gammaM0 })
			.moment;
	const free = at(0);
	const moment = N === 0 ? free : at(N);
	if (moment === null || free === null) return null;
	return Math.max(0, Math.min(moment, free)) / gammaM0;
}

type FlangeName = 'topFlange' | 'bottomFlange';

const flangeNames = (sense: MajorSense): readonly [FlangeName, FlangeName] =>
	sense === 'plusMy' ? ['topFlange', 'bottomFlange'] : ['bottomFlange', 'topFlange'];

const areaOf = ({ top, bottom }: Flanges, name: FlangeName) =>
	name === 'topFlange' ? top : bottom;

function flangesOf({ definition }: PreparedSection): Flanges | null {
	if (definition.kind !== 'i' && definition.kind !== 'box') return null;
	const sizes = definition.kind === 'i' ? iSizes(definition) : boxSizes(definition);
	const { h, bTop, tfTop, bBottom, tfBottom } = sizes;
	return { top: bTop * tfTop, bottom: bBottom * tfBottom, lever: h - (tfTop + tfBottom) / 2 };
}

/** What a compressed flange loses under uniform compression, Tables 4.1 and 4.2 with ψ = 1. */
function flangeStrips({ elements }: EnModel, sense: MajorSense, N: number): Strip[] {
	if (elements.kind !== 'plates') return [];
	const [pressed, pulled] = flangeNames(sense);
	const compressed = N < 0 ? [pressed, pulled] : [pressed];
	return elements.plates
		.filter(({ part }) => compressed.some((name) => name === part))
		.flatMap((plate) => {
			const removed = elementWidth(plate, 1, 1, 0)?.removed;
			return removed ? [stripOf(plate, removed[0], removed[1])] : [];
		});
}

const lostArea = (strips: readonly Strip[]) => (name: FlangeName) =>
	strips.reduce((sum, { element, area }) => sum + (element.part === name ? area : 0), 0);

function strength({ section: { parts } }: EnModel, name: FlangeName): number {
	const material = parts.find((part) => part.name === name)?.material;
	return material ? Math.min(material.fy, material.fyc) : 0;
}
