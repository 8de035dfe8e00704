import { regionMoments } from '../../geometry/moments';
import { momentsBelow, profileOf } from '../../geometry/profile';
import { frameAt } from '../../geometry/frame';
import { momentCount } from '../../geometry/flank-moments';
import { plasticMomentOf } from '../../response/plastic';
import type { Note } from '../../result';
import type { Part, PreparedSection } from '../../section/prepared';
import { axisAngles, type AxisSense } from '../section-moments';
import { clauseOf } from './edition';
import { mechanicsWith } from './reduced-mechanics';
import type { EnModel } from './model';

/** Parts with bolt holes in them. */
export const holedParts = ({ definition }: PreparedSection): string[] => [
	...new Set((definition.boltHoles ?? []).filter(({ count }) => count > 0).map(({ part }) => part))
];

/** mm², what the holes take out of one part. */
export function holeArea({ definition }: PreparedSection, { name, thickness }: Part): number {
	const own = (definition.boltHoles ?? []).filter(({ part }) => part === name);
	return own.reduce((sum, { diameter, count }) => sum + diameter * count * thickness, 0);
}

/** What 6.2.3(2)b makes of the net section: 0.9 Anet fu/γM2, kN; null where a grade has no fu. */
export function netSection({ section, code }: EnModel) {
	const strengths = section.parts.map(({ material }) => material.fu);
	if (strengths.some((fu) => fu === null)) return null;
	const fu = Math.min(...(strengths as number[]));
	const lost = section.parts.reduce((sum, part) => sum + holeArea(section, part), 0);
	const area = section.gross.area - lost;
	return { area, fu, value: (0.9 * area * fu * 1e-3) / code.gammaM2 };
}

/** A part with holes on its pulled side, in bending of one sense. */
export interface PulledPart {
	readonly part: Part;
	/** mm²: pulled in the plastic block, and what the holes take out of it. */
	readonly area: number;
	readonly holes: number;
	/** Share of the pulled area that may be counted, 6.2.5(4) and (5); 1 where holes are ignored. */
	readonly share: number;
}

/**
 * The holed parts that bending of one sense pulls. All holes of a part are taken to lie in its
 * pulled area; holes in a part that is only compressed are filled by fasteners, 6.2.5(6). Null
 * where a grade has no fu.
 */
export function pulledParts(model: EnModel, sense: AxisSense): PulledPart[] | null {
	const { section, code } = model;
	const names = holedParts(section);
	const found: PulledPart[] = [];
	for (const part of section.parts) {
		if (!names.includes(part.name)) continue;
		const area = pulledArea(model, part, sense);
		const holes = holeArea(section, part);
		if (area <= 0) continue;
		const { fy, fu } = part.material;
		if (fu === null) return null;
		const net = Math.max(0, area - holes);
		const share = (0.9 * net * fu * code.gammaM0) / (area * fy * code.gammaM2);
		found.push({ part, area, holes, share: Math.min(1, share) });
	}
	return found;
}

/** A pulled area below this share of its part is rounding. */
const noArea = 1e-9;

/** mm² of a part on the pulled side of the plastic block. */
function pulledArea({ section, moments }: EnModel, { region }: Part, sense: AxisSense): number {
	const { neutralAxis } = moments[sense].plastic;
	const whole = regionMoments(region, section.gross.centroid).area;
	if (neutralAxis === null) return whole;
	const angle = (neutralAxis.angle * Math.PI) / 180;
	const below = new Float64Array(momentCount);
	const profile = profileOf(region.loops, frameAt(section.gross.centroid, angle));
	momentsBelow(profile, neutralAxis.distance, below);
	const turned = ((neutralAxis.angle - axisAngles[sense]) * Math.PI) / 180;
	const area = Math.cos(turned) > 0 ? below[0]! : whole - below[0]!;
	return area > noArea * whole ? area : 0;
}

/** Plastic moment with the pulled area of holed parts reduced, kNm without γM0. */
export function holedPlasticMoment(
	model: EnModel,
	sense: AxisSense,
	pulled: readonly PulledPart[]
): number | null {
	const shareOf = (name: string) => pulled.find(({ part }) => part.name === name)?.share ?? 1;
	const mechanics = mechanicsWith(model.section, ({ name, material: { fy, fyc } }) => ({
		fy: fy * shareOf(name),
		fyc
	}));
	const path = { axisAngle: axisAngles[sense], transverse: 'moment-zero', N: 0 } as const;
	return plasticMomentOf(mechanics, path).moment;
}

/** First-yield moment with the area of holed parts reduced throughout, kNm without γM0. */
export function holedElasticMoment(
	{ section }: EnModel,
	sense: AxisSense,
	pulled: readonly PulledPart[]
): number {
	const about = sense === 'plusMy' || sense === 'minusMy' ? 'z' : 'y';
	const sums = { area: 0, first: 0, second: 0 };
	for (const part of section.parts) {
		const share = pulled.find((one) => one.part.name === part.name)?.share ?? 1;
		const { area, firstY, firstZ, secondY, secondZ } = regionMoments(
			part.region,
			section.gross.centroid
		);
		sums.area += share * area;
		sums.first += share * (about === 'z' ? firstY : firstZ);
		sums.second += share * (about === 'z' ? secondY : secondZ);
	}
	const shift = sums.first / sums.area;
	const second = sums.second - sums.area * shift ** 2;
	return (leastStrength(section) * second * 1e-6) / (furthest(section, about) + Math.abs(shift));
}

const leastStrength = ({ parts }: PreparedSection): number =>
	Math.min(...parts.map(({ material: { fy, fyc } }) => Math.min(fy, fyc)));

function furthest({ bounds, gross: { centroid } }: PreparedSection, about: 'y' | 'z'): number {
	return about === 'z'
		? Math.max(bounds.top - centroid.z, centroid.z - bounds.bottom)
		: Math.max(bounds.right - centroid.y, centroid.y - bounds.left);
}

/** What holes take away from the figures, and where they cannot be judged. */
export function holeNotes(model: EnModel): Note[] {
	const { section, code } = model;
	const names = holedParts(section);
	if (names.length === 0) return [];
	const without = section.parts.filter(({ material }) => material.fu === null);
	if (without.length > 0)
		return [
			{
				code: 'net-section-not-checked',
				message:
					'The grade gives no fu, so the net section at bolt holes cannot be checked: there is no tension resistance, and no moment that pulls a holed part.',
				clause: clauseOf(code.standard, 'tension')
			}
		];
	return [
		{
			code: 'bolt-holes-pulled',
			message:
				'Bolt holes: tension keeps to the net section; in bending all holes of a part are taken to lie on its pulled side, and its area is reduced where the net section is the weaker. Holes that are compressed are taken as filled by fasteners.',
			clause: clauseOf(code.standard, 'tensionHoles')
		}
	];
}
