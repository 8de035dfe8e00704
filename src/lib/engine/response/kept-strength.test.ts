import { describe, expect, it } from 'vitest';
import type { LawDefinition } from '../material/material';
import { prepareSection } from '../section/prepare';
import { interactionCurve } from './interaction';
import { interactionWith } from './interaction-factors';
import { bending } from './respond';

function bar(law?: LawDefinition) {
	const grade = { fy: 300, E: 200_000, ...(law && { law }) };
	const section = prepareSection({ kind: 'flat', b: 100, h: 200, grade });
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	return section.value;
}

const curve = (tension: [number, number][], beyond: 'flat' | 'zero'): LawDefinition => ({
	...{ type: 'curve', tension, beyond }
});
const path = { axisAngle: 0, transverse: 'moment-zero', N: 0 } as const;
const moment = (law?: LawDefinition) => bending(bar(law), path).plasticMoment;

describe('the full plastic block of a law that does not keep its strength', () => {
	const softening: [string, LawDefinition][] = [
		[
			'falls below fy and to zero',
			curve(
				[
					[0.0015, 300],
					[0.01, 200],
					[0.05, 100]
				],
				'zero'
			)
		],
		[
			'falls below fy and stays',
			curve(
				[
					[0.0015, 300],
					[0.02, 250]
				],
				'flat'
			)
		],
		[
			'ends at zero',
			curve(
				[
					[0.0015, 300],
					[0.05, 300]
				],
				'zero'
			)
		]
	];

	it.each(softening)('is not given where the law %s', (_, law) => {
		const section = bar(law);
		expect(moment(law)).toBeNull();
		expect(interactionCurve(section, { limit: 'plastic', plane: 'N-My' })).toMatchObject({
			...{ ok: false, error: { path: 'limit' } }
		});
		expect(interactionWith(section, { N: 0, My: 100, Mz: 0 }).plastic).toBeNull();
	});

	it('leaves states and first yield: half of it yields at fy bh²/6', () => {
		const bent = bending(bar(softening[0]![1]), path);
		expect(bent.firstYield.moment).toBeCloseTo((300 * 100 * 200 ** 2) / 6e6, 9);
		expect(bent.atCurvature(0.03).converged).toBe(true);
	});

	it.each<[string, LawDefinition | undefined]>([
		['is flat', undefined],
		['hardens', { type: 'bilinear', Eh: 2000 }],
		[
			'hardens, then falls no lower than fy',
			curve(
				[
					[0.0015, 300],
					[0.05, 400],
					[0.1, 300]
				],
				'flat'
			)
		]
	])('is fy bh²/4 where the law %s', (_, law) => {
		expect(moment(law)).toBeCloseTo((300 * 100 * 200 ** 2) / 4e6, 9);
	});
});
