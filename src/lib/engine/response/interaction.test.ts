import { describe, expect, it } from 'vitest';
import { prepareSection } from '../section/prepare';
import type { LawDefinition } from '../material/material';
import type { SectionDefinition } from '../section/definition';
import { interactionCurve } from './interaction';
import { part, rectangle, sectionOf, steel } from './test-sections';

const prepared = (definition: SectionDefinition) => {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error[0]?.message);
	return section.value;
};
const bar = prepared({ kind: 'flat', b: 40, h: 120, grade: 250 });
const limits = ['first-yield', 'plastic'] as const;
const planes = ['N-My', 'N-Mz', 'My-Mz'] as const;

const pointsOf = (...asked: Parameters<typeof interactionCurve>) => {
	const curve = interactionCurve(...asked);
	if (!curve.ok) throw new Error(curve.error.message);
	return curve.value.points;
};

describe('interactionCurve', () => {
	it.each([12, 13, 72, 720])('gives a loop of %d entries that ends where it began', (points) => {
		for (const limit of limits)
			for (const plane of planes) {
				const loop = pointsOf(bar, { limit, plane, points });
				expect(loop).toHaveLength(points);
				expect(loop.at(-1)).toEqual(loop[0]);
			}
	});

	it('spreads its points: no gap is longer than a tenth of the loop', () => {
		for (const limit of limits)
			for (const plane of planes) {
				const loop = pointsOf(bar, { limit, plane });
				const most = (of: 'N' | 'My' | 'Mz') => Math.max(...loop.map((p) => Math.abs(p[of]))) || 1;
				const [n, y, z] = [most('N'), most('My'), most('Mz')];
				loop.slice(1).forEach((p, i) => {
					const q = loop[i]!;
					const gap = Math.hypot((p.N - q.N) / n, (p.My - q.My) / y, (p.Mz - q.Mz) / z);
					expect(gap).toBeLessThan(0.2);
				});
			}
	});

	it('holds the corners of the first-yield polygon among its points', () => {
		const loop = pointsOf(bar, { limit: 'first-yield', plane: 'N-My', points: 12 });
		const squash = (250 * 40 * 120) / 1e3;
		const yieldMoment = (250 * 40 * 120 ** 2) / 6e6;
		for (const [N, My] of [
			[squash, 0],
			[-squash, 0],
			[0, yieldMoment],
			[0, -yieldMoment]
		] as const) {
			const off = loop.map((p) => Math.hypot((p.N - N) / squash, (p.My - My) / yieldMoment));
			expect(Math.min(...off)).toBeLessThan(1e-12);
		}
	});

	it.each([1200.1, -1200.1, 1e6])('refuses N = %d kN beyond the section', (N) => {
		for (const limit of limits) {
			const curve = interactionCurve(bar, { limit, plane: 'My-Mz', N });
			expect(curve.ok ? null : curve.error.path).toBe('N');
		}
	});

	it('shrinks to nothing as N nears the squash load', () => {
		const loop = pointsOf(bar, { limit: 'plastic', plane: 'My-Mz', N: 1199.999 });
		expect(Math.max(...loop.map(({ My }) => Math.abs(My)))).toBeLessThan(1e-3);
	});

	it('finds forces that a hybrid section bears only together with a moment', () => {
		const soft = part('soft', rectangle(0, 0, 50, 25), steel(200));
		const hard = part('hard', rectangle(0, 25, 50, 75), steel(400));
		const section = sectionOf(soft, hard);
		// alone N yields the soft quarter at 200·5000 N; stresses of 200 at its edge and 400 on top bear a third more
		const loop = pointsOf(section, { limit: 'first-yield', plane: 'My-Mz', N: 1300 });
		expect(loop.every(({ My }) => My < 0)).toBe(true);
		expect(interactionCurve(section, { limit: 'first-yield', plane: 'My-Mz', N: 1334 }).ok).toBe(
			false
		);
	});

	it('has no straight first yield where a law is stiffer in one sense', () => {
		const law: LawDefinition = {
			type: 'curve',
			beyond: 'flat',
			tension: [[0.001, 200]],
			compression: [[0.002, 200]]
		};
		const section = sectionOf(part('bar', rectangle(0, 0, 20, 90), steel(200, { law })));
		const curve = interactionCurve(section, { limit: 'first-yield', plane: 'N-My' });
		expect(curve.ok ? null : curve.error.path).toBe('limit');
		expect(interactionCurve(section, { limit: 'plastic', plane: 'N-My' }).ok).toBe(true);
	});
});
