import { fullPlastic } from '../../../engine/response/plastic';
import { firstYieldMoment } from '../../../engine/response/first-yield';
import type { SectionDefinition } from '../../../engine/section/definition';
import { built } from '../examples/sections';
import { rounding, type ClosedForm } from './closed-form';

const fy = 250;

function shapeFactor(definition: SectionDefinition): number {
	const section = built(definition);
	return fullPlastic(section).plasticY / firstYieldMoment(section, 0);
}

const form = (
	id: string,
	formula: string,
	value: number,
	definition: SectionDefinition
): ClosedForm => ({
	...{ id: `shape-factor/${id}`, topic: 'Shape factors', case: id, quantity: 'shape factor' },
	formula,
	value,
	ours: () => shapeFactor(definition),
	...{ tolerance: 1e-12, why: rounding }
});

const k = 0.6;

/** Full plastic over first-yield moment of simple shapes (any text on plastic bending). */
export const shapeFactors: readonly ClosedForm[] = [
	form('rectangle', '3/2', 1.5, { kind: 'flat', b: 40, h: 120, grade: fy }),
	form('solid circle', '16/3π', 16 / (3 * Math.PI), { kind: 'round', d: 80, grade: fy }),
	form(
		'tube with bore 0.6 of the diameter',
		'(16/3π)·(1 − k³)/(1 − k⁴)',
		((16 / (3 * Math.PI)) * (1 - k ** 3)) / (1 - k ** 4),
		{ kind: 'circular-hollow', d: 200, t: 40, grade: fy }
	),
	{
		...form('thin tube', '4/π in the limit', 4 / Math.PI, {
			...{ kind: 'circular-hollow', d: 2000, t: 0.01, grade: fy }
		}),
		...{ tolerance: 2e-5, why: 'the wall is not infinitely thin' }
	},
	form('diamond', '2', 2, {
		kind: 'outline',
		outer: [
			[0, -50],
			[50, 0],
			[0, 50],
			[-50, 0]
		],
		grade: fy
	}),
	form('triangle', '8 − 4√2 = 2.343', 8 - 4 * Math.SQRT2, {
		kind: 'outline',
		outer: [
			[0, 0],
			[60, 0],
			[30, 90]
		],
		grade: fy
	})
];
