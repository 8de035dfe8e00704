import type { TorsionFigures } from '../shape';

/**
 * Torsion constant of a solid rectangle, mm⁴, by the exact series of Saint-Venant
 * (Timoshenko & Goodier, Theory of Elasticity, art. 109).
 */
export function rectangleTorsion(width: number, depth: number): number {
	const [long, short] = width > depth ? [width, depth] : [depth, width];
	let sum = 0;
	for (let n = 1; n < 40; n += 2) sum += Math.tanh((n * Math.PI * long) / (2 * short)) / n ** 5;
	return ((long * short ** 3) / 3) * (1 - (192 / Math.PI ** 5) * (short / long) * sum);
}

/** Flat bar: exact torsion constant, shear centre at the centroid; no published warping constant. */
export const flatTorsion = (b: number, h: number): TorsionFigures => ({
	torsionConstant: rectangleTorsion(b, h),
	warpingConstant: null,
	shearCentre: { y: b / 2, z: h / 2 }
});

/** Round bar: πd⁴/32; a circle does not warp (Timoshenko & Goodier, art. 101). */
export const roundTorsion = (d: number): TorsionFigures => ({
	torsionConstant: (Math.PI * d ** 4) / 32,
	warpingConstant: 0,
	shearCentre: { y: d / 2, z: d / 2 }
});
