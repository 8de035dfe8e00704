import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bending } from '../response/respond';
import type { OutlineSection, Ring } from './definition';
import { prepareSection } from './prepare';

const size = fc.double({ min: 20, max: 300, noNaN: true });

/** A lopsided polygon with a hole: star-shaped about its middle, so that it never crosses itself. */
const outline = fc
	.record({
		radii: fc.array(fc.double({ min: 60, max: 300, noNaN: true }), { minLength: 5, maxLength: 12 }),
		hole: fc.double({ min: 4, max: 20, noNaN: true }),
		at: fc.tuple(size, size)
	})
	.map(({ radii, hole, at: [y, z] }): { outer: Ring; hole: Ring } => {
		const ring = (radius: (i: number) => number, n: number): Ring =>
			Array.from({ length: n }, (_, i) => {
				const t = (2 * Math.PI * i) / n;
				return [y + radius(i) * Math.cos(t), z + radius(i) * Math.sin(t)] as const;
			});
		return { outer: ring((i) => radii[i]!, radii.length), hole: ring(() => hole, 4) };
	});

function figures(definition: Omit<OutlineSection, 'kind' | 'grade'>) {
	const prepared = prepareSection({ kind: 'outline', grade: 300, ...definition });
	if (!prepared.ok) throw new Error(prepared.error.map(({ message }) => message).join(' '));
	const { gross } = prepared.value;
	const bent = bending(prepared.value, { axisAngle: 25, transverse: 'moment-zero', N: 10 });
	return [
		gross.area,
		gross.secondMomentU,
		gross.secondMomentV,
		gross.plasticModulusY,
		gross.plasticModulusZ,
		gross.perimeter,
		bent.plasticMoment!,
		bent.firstYield.moment!
	];
}

function expectSame(a: number[], b: number[]) {
	a.forEach((value, i) => expect(Math.abs(b[i]! / value - 1)).toBeLessThan(1e-9));
}

describe('an outline', () => {
	it('does not mind which way round, or from which corner, its rings are given', () => {
		fc.assert(
			fc.property(outline, fc.nat(11), ({ outer, hole }, start) => {
				const k = start % outer.length;
				const turned = [...outer.slice(k), ...outer.slice(0, k)];
				const given = figures({ outer, holes: [hole] });
				expectSame(given, figures({ outer: [...turned].reverse(), holes: [hole] }));
				expectSame(given, figures({ outer: turned, holes: [[...hole].reverse()] }));
			}),
			{ numRuns: 60 }
		);
	});

	it('does not mind repeated points', () => {
		fc.assert(
			fc.property(outline, ({ outer, hole }) => {
				const twice = outer.flatMap((point) => [point, point]);
				expectSame(figures({ outer, holes: [hole] }), figures({ outer: twice, holes: [hole] }));
			}),
			{ numRuns: 30 }
		);
	});
});
