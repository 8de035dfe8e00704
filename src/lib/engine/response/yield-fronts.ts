import type { Point } from '../geometry/boundary';
import { frameAt, pointIn } from '../geometry/frame';
import { profileOf, widthAt, type Profile } from '../geometry/profile';
import { segmentAt } from '../material/laws';
import type { Part, PreparedSection } from '../section/prepared';
import type { StrainPlane } from './state';

/** The line in one part at which its strain reaches the end of its elastic range. */
export interface YieldFront {
	part: string;
	sense: 'tension' | 'compression';
	/** Signed distance from the centroid along the normal of the neutral axis, mm. */
	distance: number;
	/** Width of steel that the front crosses, mm. */
	width: number;
	/** A point of the front (on the normal through the centroid) and its direction, degrees from y. */
	through: Point;
	angle: number;
}

/** Stress in one part along the normal of the neutral axis: straight between its points. */
export interface StressLine {
	part: string;
	points: { distance: number; strain: number; stress: number }[];
}

/** How the section is strained, seen along the normal of its neutral axis. */
export interface StressPicture {
	/** Direction of the neutral axis, degrees from y; the normal points to its left (up, for 0). */
	angle: number;
	fronts: YieldFront[];
	lines: StressLine[];
}

/** Yield fronts and the stress line of every part under a strain plane (curvatures in 1/m). */
export function stressPicture(
	{ parts, gross: { centroid } }: PreparedSection,
	{ e0, ky, kz }: StrainPlane
): StressPicture {
	const size = Math.hypot(ky, kz) * 1e-3;
	const turned = size === 0 ? 0 : Math.atan2(kz, ky);
	// bending about −y is drawn with its normal up all the same
	const flipped = turned > Math.PI / 2 + 1e-12 || turned <= -Math.PI / 2 - 1e-12;
	const angle = flipped ? turned - Math.sign(turned) * Math.PI : turned;
	const curvature = flipped ? -size : size;
	const frame = frameAt(centroid, angle);
	const seen = parts.map((part) => ({ part, profile: profileOf(part.region.loops, frame) }));
	return {
		angle: (angle * 180) / Math.PI,
		fronts: seen.flatMap(({ part, profile }) =>
			partFronts(part, profile, e0, curvature).map((front) => ({
				...front,
				through: pointIn(frame, 0, front.distance),
				angle: (angle * 180) / Math.PI
			}))
		),
		lines: seen.map(({ part, profile }) => stressLine(part, profile, e0, curvature))
	};
}

function partFronts(
	{ name, material: { law } }: Part,
	profile: Profile,
	e0: number,
	curvature: number
) {
	if (curvature === 0) return [];
	const ends = [
		{ sense: 'tension', strain: law.yieldTension },
		{ sense: 'compression', strain: -law.yieldCompression }
	] as const;
	return ends.flatMap(({ sense, strain }) => {
		const distance = (e0 - strain) / curvature;
		if (distance <= profile.low || distance >= profile.high) return [];
		return [{ part: name, sense, distance, width: widthAt(profile, distance) }];
	});
}

function stressLine(
	{ name, material: { law } }: Part,
	{ low, high }: Profile,
	e0: number,
	curvature: number
): StressLine {
	const inner = [0, ...law.kinks]
		.map((strain) => (e0 - strain) / curvature)
		.filter((distance) => distance > low && distance < high)
		.sort((a, b) => a - b);
	const points = [low, ...inner, high].map((distance) => {
		const strain = e0 - curvature * distance;
		const segment = segmentAt(law, strain);
		return { distance, strain, stress: law.offsets[segment]! + law.slopes[segment]! * strain };
	});
	return { part: name, points };
}
