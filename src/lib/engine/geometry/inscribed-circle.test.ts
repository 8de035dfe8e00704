import { describe, expect, it } from 'vitest';
import { inscribedDiameter } from './inscribed-circle';

const ring = (...points: [number, number][]) => points.map(([y, z]) => ({ y, z }));

describe('the largest circle within rings', () => {
	it('is as wide as a strip, however long', () => {
		expect(inscribedDiameter([ring([0, 0], [5000, 0], [5000, 12], [0, 12])])).toBeCloseTo(12, 9);
	});

	it('touches the three sides of a 3-4-5 triangle at radius 1', () => {
		expect(inscribedDiameter([ring([0, 0], [3, 0], [0, 4])])).toBeCloseTo(2, 8);
	});

	it('is no wider than the wall between an outline and its hole', () => {
		const outer = ring([0, 0], [100, 0], [100, 100], [0, 100]);
		const hole = ring([10, 10], [10, 90], [90, 90], [90, 10]);
		// at the corner, between the outer sides and the hole's corner: d = 2·10√2/(1 + √2)
		const corner = (2 * 10 * Math.SQRT2) / (1 + Math.SQRT2);
		expect(inscribedDiameter([outer, hole])).toBeCloseTo(corner, 6);
	});

	it('comes to an end on a ridge that runs askew', () => {
		const askew = ring([1, 0], [0, 3], [2, 3], [3, 2], [2, 1], [1, 2], [0, 3]);
		expect(inscribedDiameter([askew])).toBeGreaterThan(0);
	});

	it('scales with the rings', () => {
		const at = (s: number) =>
			inscribedDiameter([ring([0, 0], [3 * s, 0], [2 * s, 3 * s], [0, 4 * s])]);
		expect(at(1e-4) / at(1)).toBeCloseTo(1e-4, 10);
		expect(at(1e5) / at(1)).toBeCloseTo(1e5, 2);
	});
});
