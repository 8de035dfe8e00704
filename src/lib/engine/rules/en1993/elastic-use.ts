import { extentAcross } from '../../geometry/bounds';
import { frameAt } from '../../geometry/frame';
import type { Part } from '../../section/prepared';
import type { ElasticUse } from '../result';
import type { DemandCase } from './demand-case';
import { elasticField, type StressField } from './elastic-stress-check';
import { shearStressOf } from './shear-stress';

/**
 * Greatest √(σ² + 3τ²)/fyd of the gross section under a demand, 6.2.1(5): at the top and bottom edge
 * of every part and at the centroid. For information. Null with shear along y, and where the shear
 * stress has no formula.
 */
export function elasticUse({ context: { model }, demand, effects }: DemandCase): ElasticUse | null {
	const { section } = model;
	const { Vy = 0, Vz = 0 } = demand;
	if (Vy !== 0) return null;
	const field = elasticField(section.gross, effects);
	const extents = section.parts.map(partExtent);
	const levels = levelsOf(extents, section.gross.centroid.z);
	const sheared = Vz === 0 ? () => 0 : shearStressOf(section, 'z');
	let worst: ElasticUse | null = null;
	for (const level of levels) {
		const tau = sheared(Vz, level);
		if (tau === null) return null;
		for (const [i, part] of section.parts.entries()) {
			const { low, high } = extents[i]!;
			if (level < low || level > high) continue;
			const sigma = stressAt(field, part, section.gross.centroid, level);
			const use = useAt(model.code.gammaM0, part, sigma, tau);
			if (worst === null || use.value > worst.value) worst = use;
		}
	}
	return worst;
}

const upright = frameAt({ y: 0, z: 0 }, 0);
const level = frameAt({ y: 0, z: 0 }, Math.PI / 2);

const partExtent = ({ region }: Part) => extentAcross(region.loops, upright);

function levelsOf(extents: readonly ReturnType<typeof partExtent>[], centroid: number): number[] {
	return [...new Set([...extents.flatMap(({ low, high }) => [low, high]), centroid])];
}

/** The greater of both side edges of a part at a level, N/mm². */
function stressAt(
	{ s0, sy, sz }: StressField,
	{ region }: Part,
	centroid: { y: number; z: number },
	z: number
): number {
	const at = (y: number) => s0 + sy * (y - centroid.y) + sz * (z - centroid.z);
	if (sy === 0) return at(centroid.y);
	const { low, high } = extentAcross(region.loops, level);
	const [left, right] = [at(-high), at(-low)];
	return Math.abs(left) > Math.abs(right) ? left : right;
}

function useAt(gammaM0: number, { name, material }: Part, sigma: number, tau: number): ElasticUse {
	const strength = Math.min(material.fy, material.fyc) / gammaM0;
	const value = Math.hypot(sigma, Math.sqrt(3) * tau) / strength;
	return { value, part: name, sigma, tau };
}
