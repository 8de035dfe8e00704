import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { initialModulus, lawOf, stressAt } from './laws';
import { rambergOsgood, roundedStrain } from './ramberg-osgood';
import { roundedError, roundedPoints } from './rounded-lines';

const curveOf = (...asked: Parameters<typeof rambergOsgood>) => {
	const curve = rambergOsgood(...asked);
	if (!curve.ok) throw new Error(curve.error);
	return curve.value;
};

describe('rambergOsgood', () => {
	it('passes the proof strength at 0.2 % plastic strain and fu at the end (EN 1993-1-4:2006 Annex C)', () => {
		const curve = curveOf({ n: 7 }, 200_000, 220, 520);
		expect(roundedStrain(curve, 220)).toBeCloseTo(0.002 + 220 / 200_000, 14);
		// Ey = E/(1 + 0.002 n E/f0.2); at fu: 0.002 + f0.2/E + (fu − f0.2)/Ey + εu
		const tangent = 200_000 / (1 + (0.002 * 7 * 200_000) / 220);
		const last = 0.002 + 220 / 200_000 + 300 / tangent + (1 - 220 / 520);
		expect(roundedStrain(curve, 520)).toBeCloseTo(last, 14);
		expect(curve.second?.m).toBeCloseTo(1 + (3.5 * 220) / 520, 14);
	});

	it('takes 2.8 and the ferritic strain in the later variant', () => {
		const asked = { n: 14, variant: 'later', family: 'ferritic' } as const;
		const { second } = curveOf(asked, 200_000, 280, 450);
		expect(second?.m).toBeCloseTo(1 + (2.8 * 280) / 450, 14);
		expect(second?.epsilonU).toBeCloseTo(0.6 * (1 - 280 / 450), 14);
	});

	it('runs in one stage without fu, no further than 10 % strain', () => {
		const curve = curveOf({ n: 25 }, 70_000, 250, null);
		expect(roundedStrain(curve, curve.end)).toBeCloseTo(0.1, 12);
		expect(rambergOsgood({ n: 25, stages: 2 }, 70_000, 250, null).ok).toBe(false);
	});
});

describe('roundedPoints', () => {
	const curves = fc
		.record({
			n: fc.double({ min: 1.2, max: 60, noNaN: true }),
			E: fc.constantFrom(70_000, 200_000),
			proof: fc.double({ min: 100, max: 700, noNaN: true }),
			ratio: fc.option(fc.double({ min: 1.02, max: 2.6, noNaN: true }))
		})
		.map(({ n, E, proof, ratio }) =>
			curveOf({ n }, E, proof, ratio === null ? null : proof * ratio)
		);

	it('stay within 1e-4 of f0.2 at every strain, and begin with E', () => {
		fc.assert(
			fc.property(curves, (curve) => {
				const points = [[0, 0] as const, ...roundedPoints(curve)];
				expect(points[1]![1] / points[1]![0] / curve.E).toBeCloseTo(1, 9);
				expect(points.length).toBeLessThan(150);
				for (let i = 1; i < points.length; i++) {
					const [from, to] = [points[i - 1]!, points[i]!];
					expect(to[0]).toBeGreaterThan(from[0]);
					expect(to[1]).toBeGreaterThan(from[1]);
					const slope = (to[1] - from[1]) / (to[0] - from[0]);
					for (let k = 0; k <= 10; k++) {
						// compared at a stress of the curve between both ends
						const low = Math.max(0, from[1] - roundedError * curve.proof);
						const stress = low + (k / 10) * (Math.min(to[1], curve.end) - low);
						const strain = roundedStrain(curve, stress);
						if (strain < from[0] || strain > to[0]) continue;
						const line = from[1] + slope * (strain - from[0]);
						expect(Math.abs(line - stress) / curve.proof).toBeLessThan(roundedError * 1.0001);
					}
				}
			}),
			{ numRuns: 60, interruptAfterTimeLimit: 2000 }
		);
	});

	it('give a law whose yield strain is f0.2/E and which ends at its last strain', () => {
		const law = lawOf({ type: 'ramberg-osgood', n: 8 }, { E: 2e5, fy: 300, fyc: 300, fu: 600 });
		if (!law.ok) throw new Error(law.error);
		expect(law.value.yieldTension).toBe(300 / 2e5);
		expect(law.value.kinks.some((kink) => Math.abs(kink / 0.0015 - 1) < 1e-12)).toBe(true);
		expect(initialModulus(law.value)).toBeCloseTo(2e5, 6);
		expect(law.value.limit?.tension).toBeGreaterThan(0.5);
		expect(stressAt(law.value, 0.002 + 300 / 2e5)).toBeCloseTo(300, 1);
	});
});
