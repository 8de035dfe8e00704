import { describe, expect, it } from 'vitest';
import { bending } from '../../src/lib/engine/response/respond';
import {
	circle,
	part,
	rectangle,
	sectionOf,
	steel
} from '../../src/lib/engine/response/test-sections';
import { closedFormCheck } from '../../src/lib/server/proof/closed-forms/closed-form';
import { closedForms } from '../../src/lib/server/proof/registry';

describe('closed forms', () => {
	it.each(closedForms)('$topic, $case: $quantity is $formula', (form) => {
		const { pass, published, ours } = closedFormCheck(form);
		expect(pass, `exactly ${published}, ours ${ours}`).toBe(true);
	});

	it('are 69', () => expect(closedForms).toHaveLength(69));
});

const fy = 250;
const relative = (value: number, expected: number) => Math.abs(value / expected - 1);
const bar = sectionOf(part('bar', rectangle(30, -70, 40, 120), steel(fy)));
const round = sectionOf(part('bar', { loops: [circle({ y: 5, z: 9 }, 40)] }, steel(fy)));

describe('rectangle bent beyond first yield', () => {
	it('has no state above the full plastic moment', () => {
		const bent = bending(bar, { axisAngle: 0, transverse: 'moment-zero', N: 0 });
		const state = bent.atMoment((1.5001 * fy * 40 * 120 ** 2) / 6e6);
		expect(state.converged).toBe(false);
		expect(state.curvature).toBeNull();
	});
});

describe('round bar', () => {
	it('bends alike about any axis', () => {
		const about = (axisAngle: number) =>
			bending(round, { axisAngle, transverse: 'moment-zero', N: 40 }).atCurvature(0.2).moment!;
		for (const angle of [13, 45, 90, 171.3]) {
			expect(relative(about(angle), about(0))).toBeLessThan(1e-11);
		}
	});
});
