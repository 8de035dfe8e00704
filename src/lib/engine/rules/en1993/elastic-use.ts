import { extentAcross } from '../../geometry/bounds';
import { frameAt, type Frame } from '../../geometry/frame';
import type { Part } from '../../section/prepared';
import type { ElasticUse } from '../result';
import type { DemandCase } from './demand-case';
import { elasticField, type StressField } from './elastic-stress-check';
import { shearStressOf } from './shear-stress';

/**
 * Greatest √(σ² + 3τ²)/fyd of the gross section under a demand, 6.2.1(5): at both edges of every part
 * along the shear and at the centroid. For information. Null with shear along both axes, and where the
 * shear stress has no formula.
 */
export function elasticUse({ context: { model }, demand, effects }: DemandCase): ElasticUse | null {
	const { section } = model;
	const { Vy = 0, Vz = 0 } = demand;
	if (Vy !== 0 && Vz !== 0) return null;
	const axis = Vy === 0 ? 'z' : 'y';
	const field = elasticField(section.gross, effects);
	const extents = section.parts.map((part) => partExtent(part, axis));
	const levels = levelsOf(extents, section.gross.centroid[axis]);
	const V = Vy === 0 ? Vz : Vy;
	const sheared = V === 0 ? () => 0 : shearStressOf(section, axis);
	let worst: ElasticUse | null = null;
	for (const level of levels) {
		const tau = sheared(V, level);
		if (tau === null) return null;
		for (const [i, part] of section.parts.entries()) {
			const { low, high } = extents[i]!;
			if (level < low || level > high) continue;
			const sigma = stressAt(field, part, section.gross.centroid, axis, level);
			const use = useAt(model.code.gammaM0, part, sigma, tau);
			if (worst === null || use.value > worst.value) worst = use;
		}
	}
	return worst;
}

type Axis = 'y' | 'z';

const across: Readonly<Record<Axis, Frame>> = {
	z: frameAt({ y: 0, z: 0 }, 0),
	y: frameAt({ y: 0, z: 0 }, Math.PI / 2)
};

/** From the lower to the higher coordinate of a part along an axis; the frame of y looks to the left. */
function partExtent({ region }: Part, axis: Axis) {
	const { low, high } = extentAcross(region.loops, across[axis]);
	return axis === 'z' ? { low, high } : { low: -high, high: -low };
}

function levelsOf(extents: readonly ReturnType<typeof partExtent>[], centroid: number): number[] {
	return [...new Set([...extents.flatMap(({ low, high }) => [low, high]), centroid])];
}

/** The greater of both side edges of a part at a level, N/mm². */
function stressAt(
	{ s0, sy, sz }: StressField,
	part: Part,
	centroid: { y: number; z: number },
	axis: Axis,
	level: number
): number {
	const [along, aside] = axis === 'z' ? [sz, sy] : [sy, sz];
	const other: Axis = axis === 'z' ? 'y' : 'z';
	const middle = s0 + along * (level - centroid[axis]);
	if (aside === 0) return middle;
	const { low, high } = partExtent(part, other);
	const [first, second] = [low, high].map((at) => middle + aside * (at - centroid[other])) as [
		number,
		number
	];
	return Math.abs(first) > Math.abs(second) ? first : second;
}

function useAt(gammaM0: number, { name, material }: Part, sigma: number, tau: number): ElasticUse {
	const strength = Math.min(material.fy, material.fyc) / gammaM0;
	const value = Math.hypot(sigma, Math.sqrt(3) * tau) / strength;
	return { value, part: name, sigma, tau };
}
