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

	it('takes the same work for an outline as thin as can be: 1 km by 0.01 mm, straight or askew', () => {
		const started = performance.now();
		for (const angle of [0, 37]) {
			const [c, s] = [Math.cos((angle * Math.PI) / 180), Math.sin((angle * Math.PI) / 180)];
			const turned = ring([0, 0], [1e5, 0], [1e5, 0.01], [0, 0.01]).map(({ y, z }) => ({
				y: c * y - s * z,
				z: s * y + c * z
			}));
			expect(inscribedDiameter([turned])).toBeCloseTo(0.01, 8);
		}
		expect(performance.now() - started).toBeLessThan(200);
	});

	it('touches the four inward corners of a cross', () => {
		const cross = ring(
			...([
				[-1, -9],
				[1, -9],
				[1, -1],
				[9, -1],
				[9, 1],
				[1, 1]
			] as [number, number][]),
			...([
				[1, 9],
				[-1, 9],
				[-1, 1],
				[-9, 1],
				[-9, -1],
				[-1, -1]
			] as [number, number][])
		);
		expect(inscribedDiameter([cross])).toBeCloseTo(2 * Math.SQRT2, 9);
	});

	it('fits the wall of a thin tube of many sides', () => {
		const sides = 90;
		const round = (radius: number, sense: number) =>
			Array.from({ length: sides }, (_, k) => {
				const angle = (sense * 2 * Math.PI * k) / sides;
				return { y: radius * Math.cos(angle), z: radius * Math.sin(angle) };
			});
		// between a corner of the hole and the outline's corner beyond it: both sides meet the hole's corner
		const half = Math.PI / sides;
		const corner = ((100 - 99) * Math.cos(half)) / (1 + Math.cos(half));
		expect(inscribedDiameter([round(100, 1), round(99, -1)])).toBeCloseTo(2 * corner, 9);
	});

	it('touches the roots of a gear of a thousand teeth, in time', () => {
		const gear = Array.from({ length: 2000 }, (_, k) => {
			const [radius, angle] = [k % 2 ? 98 : 100, (Math.PI * k) / 1000];
			return { y: radius * Math.cos(angle), z: radius * Math.sin(angle) };
		});
		const started = performance.now();
		expect(inscribedDiameter([gear])).toBeCloseTo(196, 6);
		expect(performance.now() - started).toBeLessThan(5000);
	});
});
