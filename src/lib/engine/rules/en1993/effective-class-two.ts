import type { Working } from '../../explain/working';
import { plasticMomentOf, type PlasticState } from '../../response/plastic';
import type { Standard } from '../result';
import { axisAngles, type AxisSense } from '../section-moments';
import type { ClassifiedCase } from './classify';
import { websOf, type Webs } from './class-two-webs';
import { clauseOf } from './edition';
import type { EnModel } from './model';

/** A section whose class 3 web counts as an effective class 2 web; mm, N, kNm without γM0. */
export interface ClassTwoTaken {
	readonly kind: 'taken';
	readonly standard: Standard;
	readonly moment: number;
	/** Full block of the gross section with its axis where that of the effective section is, about the gross centroid. */
	readonly block: number;
	/** Clear depth of web from its root to that axis, and what is kept of it: 40 ε tw. */
	readonly compressed: number;
	readonly kept: number;
	/** Web strength times thickness, all webs together, N/mm. */
	readonly strength: number;
	/** Depth that is not counted, and the height of its middle over the gross centroid. */
	readonly removed: number;
	readonly removedLever: number;
	readonly epsilon: number;
	readonly t: number;
}

/** `refused`: a class 3 web between class 1 or 2 flanges for which the rule gives no section. */
export type ClassTwo =
	{ readonly kind: 'not-applicable' } | { readonly kind: 'refused' } | ClassTwoTaken;

const refused: ClassTwo = { kind: 'refused' };

/** Share of a moment below which the moment across it is rounding. */
const nothingAcross = 1e-9;

/**
 * Plastic moment of a section with a class 3 web and class 1 or 2 flanges as an effective class 2
 * section under bending alone, EN 1993-1-1:2005 6.2.2.4: of the compressed web only 20 ε tw beside
 * the compression flange and 20 ε tw beside the plastic neutral axis of the effective section are
 * kept. The gap g holds no force, so that the gross block at the same axis has the resultant −g tw fyw
 * and the axis lies where that is so; with the axis in the clear web that is a straight line. Refused
 * where the axis would leave the clear web, webs differ, or a moment across is left.
 */
export function effectiveClassTwo(
	model: EnModel,
	sense: AxisSense,
	classified: ClassifiedCase
): ClassTwo {
	const webs = websOf(model, sense, classified);
	if (webs === 'none') return { kind: 'not-applicable' };
	const state = model.moments[sense].plastic;
	const gross = levelOf(state, sense);
	if (webs === 'uneven' || gross === null || state.moment === null) return refused;
	if (gross >= webs.edge || gross <= webs.far) return refused;
	const kept = 40 * webs.epsilon * webs.t;
	const excess = webs.edge - gross - kept;
	if (excess <= 0) return taken(model, webs, { axis: gross, removed: 0, block: state.moment });
	const axis = gross - (excess * webs.compression) / webs.tension;
	if (axis < webs.far) return refused;
	const removed = webs.edge - axis - kept;
	const force = removed * webs.compression;
	const axisAngle = axisAngles[sense];
	const path = { axisAngle, transverse: 'curvature-zero', N: -force * 1e-3 } as const;
	const block = plasticMomentOf(model.mechanics, path);
	if (block.moment === null || momentAcross(block, webs, sense, force) > nothingAcross)
		return refused;
	return taken(model, webs, { axis, removed, block: block.moment });
}

interface Found {
	readonly axis: number;
	readonly removed: number;
	readonly block: number;
}

function taken(model: EnModel, webs: Webs, { axis, removed, block }: Found): ClassTwoTaken {
	const { edge, epsilon, t, compression: strength } = webs;
	const removedLever = (edge + axis) / 2;
	return {
		kind: 'taken',
		standard: model.code.standard,
		moment: block - removed * strength * removedLever * 1e-6,
		block,
		compressed: edge - axis,
		kept: 40 * epsilon * t,
		strength,
		removed,
		removedLever,
		epsilon,
		t
	};
}

/** Height of the plastic axis over the centroid towards the compressed side, mm. */
function levelOf({ neutralAxis }: PlasticState, sense: AxisSense): number | null {
	if (neutralAxis === null) return null;
	const { angle, distance } = neutralAxis;
	const turned = axisAngles[sense] - angle;
	return Math.abs(turned) < 90 ? distance : -distance;
}

/** Moment across what is left, as a share of the block's moment. */
function momentAcross(block: PlasticState, webs: Webs, sense: AxisSense, force: number): number {
	const aboutY = sense === 'plusMy' || sense === 'minusMy';
	const strip = force * webs.offset * 1e-6;
	const across = aboutY ? (block.Mz ?? 0) + strip : (block.My ?? 0) - strip;
	return Math.abs(across / (block.moment ?? 1));
}

/** How the moment of a taken section came about, over γM0. */
export function effectiveClassTwoWorking(
	found: ClassTwoTaken,
	gammaM0: number,
	edition: string
): Working {
	const gamma = {
		symbol: 'γM0',
		value: gammaM0,
		unit: '',
		from: 'partial factor of the code chosen'
	};
	const block = { symbol: 'M_b', value: found.block, unit: 'kNm' };
	const common = {
		title: 'Moment resistance, class 3 web taken as class 2',
		clause: clauseOf(found.standard, 'effectiveClassTwo'),
		edition,
		result: { value: found.moment / gammaM0, unit: 'kNm' }
	};
	if (found.removed === 0)
		return {
			...common,
			formula: 'M_c,Rd = M_b/γM0',
			inputs: [{ ...block, from: 'full block: no web is left out' }, gamma]
		};
	return {
		...common,
		formula: 'M_c,Rd = (M_b − (d − 40·ε·tw)·S_w·z_w·10^-6)/γM0',
		inputs: [
			{ ...block, from: 'full block of the gross section about the axis of the effective one' },
			{
				symbol: 'd',
				value: found.compressed,
				unit: 'mm',
				from: 'clear web from root to that axis'
			},
			{ symbol: 'ε', value: found.epsilon, unit: '', from: '√(235/fy) of the web' },
			{ symbol: 'tw', value: found.t, unit: 'mm', from: 'thickness of one web' },
			{ symbol: 'S_w', value: found.strength, unit: 'N/mm', from: 'thickness times fy, all webs' },
			{
				symbol: 'z_w',
				value: found.removedLever,
				unit: 'mm',
				from: 'gross centroid to the gap’s middle'
			},
			gamma
		]
	};
}
