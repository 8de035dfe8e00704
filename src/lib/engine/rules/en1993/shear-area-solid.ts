import type { FlatSection, Plate } from '../../section/definition';
import type { ShearArea, ShearAreas } from './shear-area';
import { lengths } from './shear-area-open';

/*
 * Solid bars and plates: the whole area, as ENV 1993-1-1:1992 5.4.6(2)(h) had it (from memory).
 * EN 1993-1-1:2005 names no area for them, which the letter null tells.
 */

/** b h in both directions; a thin bar on edge is a plate with free edges. */
export function barAreas({ b, h }: FlatSection): ShearAreas {
	const along = (depth: number, thickness: number): ShearArea => ({
		area: b * h,
		shares: { bar: 1 },
		letter: null,
		formula: 'A_v = b·h',
		inputs: lengths({ b, h }),
		panels: [{ part: 'bar', depth, thickness, support: 'one-edge' }],
		plate: 'bar'
	});
	return { y: along(b, h), z: along(h, b) };
}

export function roundAreas(gross: number): ShearAreas {
	const bar: ShearArea = {
		area: gross,
		shares: { bar: 1 },
		letter: null,
		formula: 'A_v = A',
		inputs: [{ symbol: 'A', value: gross, unit: 'mm²', from: 'gross.area' }],
		panels: [],
		plate: 'bar'
	};
	return { y: bar, z: bar };
}

/** Sine of the angle up to which a plate counts as parallel to the force: rounding of degrees. */
export const parallel = 1e-9;

/** Free plates: only those whose width runs along the force. */
export function parallelPlates(plates: readonly Plate[]): ShearAreas {
	return { y: platesAlong(plates, 0), z: platesAlong(plates, 90) };
}

function platesAlong(plates: readonly Plate[], direction: number): ShearArea | null {
	const along = plates.filter(({ angle }) => isParallel(angle, direction));
	if (along.length === 0) return null;
	return {
		area: along.reduce((sum, { width, thickness }) => sum + width * thickness, 0),
		shares: Object.fromEntries(along.map(({ name }) => [name, 1])),
		letter: null,
		formula: `A_v = ${along.map((_, i) => `b${i + 1}·t${i + 1}`).join(' + ')}`,
		inputs: along.flatMap(({ width, thickness }, i) =>
			lengths({ [`b${i + 1}`]: width, [`t${i + 1}`]: thickness })
		),
		panels: along.map(({ name, width, thickness }) => ({
			part: name,
			depth: width,
			thickness,
			support: 'one-edge'
		})),
		plate: 'plates along the force'
	};
}

const isParallel = (angle: number, direction: number): boolean =>
	Math.abs(Math.sin(((angle - direction) * Math.PI) / 180)) <= parallel;
