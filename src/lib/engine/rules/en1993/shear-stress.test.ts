import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../../section/definition';
import { prepareSection } from '../../section/prepare';
import { shearStressAt } from './shear-stress';

function stress(definition: SectionDefinition, axis: 'y' | 'z', level: number, V = 100) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	return shearStressAt(section.value, V, axis, level);
}

const grade = 355;
const i = { kind: 'i', fabrication: 'welded', h: 540, b: 200, tw: 10, tf: 20, grade } as const;

describe('elastic shear stress VS/(It)', () => {
	it('is 3V/(2A) in the middle of a rectangle, 4V/(3A) of a circle, 0 at the edges', () => {
		const flat = { kind: 'flat', b: 50, h: 200, grade } as const;
		expect(stress(flat, 'z', 100)).toBeCloseTo((1.5 * 100e3) / 10_000, 9);
		expect(stress(flat, 'y', 25)).toBeCloseTo((1.5 * 100e3) / 10_000, 9);
		expect(stress(flat, 'z', 0)).toBe(0);
		expect(stress(flat, 'z', 200)).toBe(0);
		const round = { kind: 'round', d: 100, grade } as const;
		expect(stress(round, 'z', 50)! / ((4 * 100e3) / (3 * Math.PI * 2500))).toBeCloseTo(1, 9);
	});

	it('is that of an I at mid-depth and at the web’s edge, where the width steps', () => {
		const I = (200 * 540 ** 3 - 190 * 500 ** 3) / 12;
		const flange = 200 * 20 * 260;
		expect(stress(i, 'z', 270)).toBeCloseTo((100e3 * (flange + (10 * 250 ** 2) / 2)) / (I * 10), 9);
		expect(stress(i, 'z', 520)).toBeCloseTo((100e3 * flange) / (I * 10), 6);
	});

	it('adds up to V over the depth', () => {
		let sum = 0;
		const steps = 500;
		for (let k = 0; k < steps; k++) {
			const level = (540 * (k + 0.5)) / steps;
			const width = level > 20 && level < 520 ? 10 : 200;
			sum += stress(i, 'z', level)! * width * (540 / steps);
		}
		expect(sum / 100e3).toBeCloseTo(1, 3);
	});

	it('takes the product moment of an angle: as the flow summed by hand from its legs', () => {
		const angle = { kind: 'angle', h: 100, b: 100, t: 10, grade } as const;
		let sum = 0;
		const steps = 500;
		for (let k = 0; k < steps; k++) {
			const level = (100 * (k + 0.5)) / steps;
			sum += stress(angle, 'z', level)! * (level < 10 ? 100 : 10) * (100 / steps);
		}
		const rectangles = [
			{ y0: 0, y1: 10, z0: 0, z1: 100 },
			{ y0: 10, y1: 100, z0: 0, z1: 10 }
		];
		const area = 1900;
		const c = (1000 * 50 + 900 * 5) / area;
		const Iy = (10 * 100 ** 3) / 12 + 1000 * (50 - c) ** 2 + (90 * 1000) / 12 + 900 * (5 - c) ** 2;
		const Iyz = 1000 * (5 - c) * (50 - c) + 900 * (55 - c) * (5 - c);
		let expected = 0;
		for (let k = 0; k < steps; k++) {
			const level = (100 * (k + 0.5)) / steps;
			let [Sy, Sz] = [0, 0];
			for (const { y0, y1, z0, z1 } of rectangles) {
				const top = Math.min(level, z1);
				if (top <= z0) continue;
				const own = (y1 - y0) * (top - z0);
				Sy += own * ((top + z0) / 2 - c);
				Sz += own * ((y0 + y1) / 2 - c);
			}
			expected += Math.abs(Iy * Sy - Iyz * Sz) * (100 / steps);
		}
		expect(sum / ((100e3 * expected) / (Iy ** 2 - Iyz ** 2))).toBeCloseTo(1, 6);
	});

	it('shares V between mirrored walls, and says nothing of walls that are not', () => {
		const box = {
			kind: 'box',
			h: 540,
			b: 320,
			tw: 10,
			tfTop: 20,
			tfBottom: 20,
			webGap: 300,
			grade
		} as const;
		expect(stress(box, 'z', 270)).toBeGreaterThan(0);
		expect(stress({ ...box, tfBottom: 30 }, 'z', 270)).toBeGreaterThan(0);
		expect(stress({ ...box, tfBottom: 30 }, 'y', 160)).toBeNull();
		expect(
			stress({ kind: 'channel', h: 200, b: 75, tw: 8, tf: 12, grade }, 'z', 100)
		).toBeGreaterThan(0);
	});

	it('grows with V alone and falls with the square of the size', () => {
		const large = { ...i, h: 5400, b: 2000, tw: 100, tf: 200 };
		expect(stress(i, 'z', 270, 200)! / stress(i, 'z', 270)!).toBeCloseTo(2, 12);
		expect(stress(i, 'z', 270)! / stress(large, 'z', 2700)!).toBeCloseTo(100, 8);
	});
});
