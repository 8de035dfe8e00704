import { expect, it } from 'vitest';
import { demandBend } from './demand-bend';

const degrees = 180 / Math.PI;

it('bends about the axis of both moments, with the size of their vector', () => {
	const bent = demandBend({ My: 100, Mz: 20 });
	expect(bent?.moment).toBeCloseTo(Math.sqrt(100 ** 2 + 20 ** 2), 9);
	expect(bent?.axisAngle).toBeCloseTo(Math.atan(0.2) * degrees, 9);
	expect(bent?.biaxial).toBe(true);
});

it('keeps the drawing upright: a moment the other way is negative about the same line', () => {
	const bent = demandBend({ My: -100, Mz: -20 });
	expect(bent?.moment).toBeCloseTo(-Math.hypot(100, 20), 9);
	expect(bent?.axisAngle).toBeCloseTo(Math.atan(0.2) * degrees, 9);
	expect(demandBend({ My: -5 })).toEqual({ axisAngle: 0, moment: -5, biaxial: false });
	expect(demandBend({ Mz: -5 })).toEqual({ axisAngle: 90, moment: -5, biaxial: false });
});

it('has no axis without a moment', () => {
	expect(demandBend({ N: -100 })).toBeNull();
});
