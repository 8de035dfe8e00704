import { flanksOf } from '../../geometry/flank';
import { momentCount } from '../../geometry/flank-moments';
import { frameAt } from '../../geometry/frame';
import { momentsBelow, profileOf, widthAt } from '../../geometry/profile';
import type { PreparedSection } from '../../section/prepared';
import { sectionSymmetry } from '../../section/symmetry';

/** How far beside a level its width is looked at, as a share of the depth: less than any plate. */
const beside = 1e-9;

/**
 * Elastic shear stress τ = V S/(I t) of 6.2.6(4), N/mm² (a size), from a shear V (kN) along `axis` on the
 * cut at `level` (mm from the definition's origin: z for shear along z, y for shear along y). S is the
 * exact first moment of the steel beyond the cut, t the width cut, the lesser where it steps; Iyz counts.
 * It is the stress along V: what flows along a flange is not in it. Null where the cut crosses
 * several walls that are not mirror images, which the formula cannot tell apart.
 */
export const shearStressAt = (
	section: PreparedSection,
	V: number,
	axis: 'y' | 'z',
	level: number
): number | null => shearStressOf(section, axis)(V, level);

/** The same for many cuts of one section along one axis. */
export function shearStressOf(
	section: PreparedSection,
	axis: 'y' | 'z'
): (V: number, level: number) => number | null {
	const { gross, contours, parts } = section;
	const frame = frameAt(gross.centroid, axis === 'z' ? 0 : Math.PI / 2);
	const profile = profileOf(
		parts.flatMap(({ region }) => region.loops),
		frame
	);
	const depth = profile.high - profile.low;
	const alike = mirrored(section, axis);
	const moments = new Float64Array(momentCount);
	return (V, level) => {
		const across = axis === 'z' ? level - gross.centroid.z : gross.centroid.y - level;
		if (across <= profile.low || across >= profile.high) return 0;
		const sides = [across - beside * depth, across + beside * depth];
		if (!alike && sides.some((side) => walls(contours, frame, side) > 1)) return null;
		const width = Math.min(...sides.map((side) => widthAt(profile, side)).filter((own) => own > 0));
		momentsBelow(profile, across, moments);
		return Math.abs(flowFactor(section, axis, moments[1]!, moments[2]!) * V * 1e3) / width;
	};
}

/** First moments over second moments, 1/mm, with the product moment taken in. */
function flowFactor(
	{ gross }: PreparedSection,
	axis: 'y' | 'z',
	own: number,
	other: number
): number {
	const [I, J] =
		axis === 'z'
			? [gross.secondMomentY, gross.secondMomentZ]
			: [gross.secondMomentZ, gross.secondMomentY];
	// turned a quarter with the frame, the product changes its sign
	const product = axis === 'z' ? gross.productYZ : -gross.productYZ;
	return (J * own - product * other) / (I * J - product ** 2);
}

/** Whether the halves on both sides of the force are alike, so that equal walls share it equally. */
function mirrored(section: PreparedSection, axis: 'y' | 'z'): boolean {
	const { leftRight, topBottom } = sectionSymmetry(section);
	return axis === 'z' ? leftRight : topBottom;
}

function walls(
	contours: PreparedSection['contours'],
	frame: ReturnType<typeof frameAt>,
	level: number
): number {
	const crossed = flanksOf(contours, frame).filter(({ low, high }) => low < level && level < high);
	return crossed.length / 2;
}
