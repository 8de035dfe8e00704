import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bending } from '../../response/respond';
import { historyOf } from '../../response/history/history';
import { bendingFrom } from '../../response/history/history-bending';
import type { Plate, SectionDefinition } from '../../section/definition';
import { prepareSection } from '../../section/prepare';

const straight = { axisAngle: 0, transverse: 'moment-zero', N: 0 } as const;

const prepared = (definition: SectionDefinition) => {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error[0]?.message);
	return section.value;
};

const noteOf = (definition: SectionDefinition, pattern: 'rolled' | 'welded') => {
	const history = historyOf(prepared(definition), pattern);
	return history.ok ? null : history.error.code;
};

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** A welded I, flanges of any two sizes and grades, or a box. */
const welded: fc.Arbitrary<SectionDefinition> = fc.oneof(
	fc.record({
		...{ kind: fc.constant('i' as const), fabrication: fc.constant('welded' as const) },
		...{ h: between(200, 2000), b: between(80, 600), tf: between(8, 60) },
		...{ bBottom: between(80, 600), tfBottom: between(8, 60), tw: between(5, 30) },
		...{ grade: between(235, 460), partGrades: fc.record({ topFlange: between(235, 690) }) }
	}),
	fc.record({
		...{ kind: fc.constant('box' as const), h: between(300, 1500), b: between(350, 900) },
		...{ tw: between(6, 20), tfTop: between(8, 40), tfBottom: between(8, 40) },
		...{ webGap: between(50, 300), grade: between(235, 460) }
	})
);

/** Stress, area and place of every cell at rest. */
function residualSums(definition: SectionDefinition) {
	const section = prepared(definition);
	const history = historyOf(section, 'welded');
	if (!history.ok) throw new Error(history.error.message);
	const state = bendingFrom(history.value, straight).atPlane({ e0: 0, ky: 0, kz: 0 });
	const squash = history.value.mechanics.squash / 1e3;
	const lever = (squash * history.value.mechanics.reach) / 1e3;
	return { section, history: history.value, state, squash, lever };
}

describe('residual stresses of welding', () => {
	it('are in equilibrium, at fy over a fifth of each plate and −0.25 fy over the rest', () => {
		fc.assert(
			fc.property(welded, (definition) => {
				const { section, history, state, squash, lever } = residualSums(definition);
				expect(Math.abs(state.N!)).toBeLessThan(1e-9 * squash);
				expect(Math.abs(state.My!)).toBeLessThan(1e-9 * lever);
				expect(Math.abs(state.Mz!)).toBeLessThan(1e-9 * lever);
				section.parts.forEach(({ material }, part) => {
					const cells = history.cells.filter((cell) => cell.part === part);
					const area = cells.reduce((sum, { moments }) => sum + moments[0]!, 0);
					const stressed = cells.filter(({ plastic }) => plastic[0]!.c < 0);
					const tension = stressed.reduce((sum, { moments }) => sum + moments[0]!, 0);
					expect(tension / area).toBeCloseTo(0.2, 9);
					for (const { plastic } of cells) {
						const stress = -plastic[0]!.c * material.E;
						expect(stress / material.fy).toBeCloseTo(stress > 0 ? 1 : -0.25, 9);
					}
				});
			}),
			{ numRuns: 100 }
		);
	});

	it('leave the full plastic moment, and bend on from no moment at all', () => {
		fc.assert(
			fc.property(welded, (definition) => {
				const { section, history } = residualSums(definition);
				const [plain, own] = [bending(section, straight), bending(section, straight, history)];
				expect(own.firstYield).toEqual({ curvature: 0, moment: 0 });
				expect(own.plasticMoment).toBe(plain.plasticMoment);
				const far = 8000 * plain.firstYield.curvature!;
				expect(own.momentAt(far)! / plain.momentAt(far)!).toBeCloseTo(1, 4);
				const near = plain.firstYield.curvature!;
				expect(own.momentAt(near)!).toBeLessThan(plain.momentAt(near)!);
			}),
			{ numRuns: 40 }
		);
	});

	const plate = (
		name: string,
		width: number,
		thickness: number,
		y: number,
		z: number,
		angle = 0
	): Plate => ({
		...{ name, width, thickness, y, z, angle }
	});

	it('are the same for an I and for its three plates', () => {
		const asI = residualSums({
			...{ kind: 'i', fabrication: 'welded', h: 430, b: 200, tf: 15, tw: 8, grade: 355 }
		});
		const asPlates = residualSums({
			...{ kind: 'plates', grade: 355 },
			plates: [
				plate('top', 200, 15, 0, 207.5),
				plate('web', 400, 8, 0, 0, 90),
				plate('bottom', 200, 15, 0, -207.5)
			]
		});
		for (const curvature of [0.002, 0.01, 0.05]) {
			const [a, c] = [asI, asPlates].map(({ history }) =>
				bendingFrom(history, straight).momentAt(curvature)!
			);
			expect(a! / c!).toBeCloseTo(1, 12);
		}
	});

	it('are not given where no published pattern balances a plate', () => {
		const lapped = [plate('a', 200, 10, 0, 0), plate('b', 150, 10, 0, 10)];
		const cornered = [plate('a', 200, 10, 0, 0), plate('b', 100, 10, 95, 55, 90)];
		expect(noteOf({ kind: 'plates', plates: lapped, grade: 355 }, 'welded')).toBe(
			'residual-not-covered'
		);
		expect(noteOf({ kind: 'plates', plates: cornered, grade: 355 }, 'welded')).toBe(
			'residual-not-covered'
		);
		expect(noteOf({ kind: 'flat', b: 10, h: 100, grade: 355 }, 'welded')).toBe(
			'residual-not-covered'
		);
	});
});

describe('residual stresses of rolling', () => {
	it('are not given for shapes without a published pattern, nor for steel weaker than their peak', () => {
		const channel: SectionDefinition = {
			kind: 'channel',
			h: 200,
			b: 75,
			tw: 8.5,
			tf: 11.5,
			r: 11.5,
			grade: 355
		};
		expect(noteOf(channel, 'rolled')).toBe('residual-not-covered');
		const column: SectionDefinition = {
			...{ kind: 'i', fabrication: 'rolled', h: 200, b: 200, tw: 9, tf: 15, r: 18, grade: 100 }
		};
		expect(noteOf(column, 'rolled')).toBe('residual-not-covered');
		expect(noteOf({ ...column, grade: 235 }, 'rolled')).toBeNull();
	});
});
