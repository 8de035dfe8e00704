import { describe, expect, it } from 'vitest';
import { solvedInteraction, type InteractionAsked } from './interaction-handler';

/** A flat of 20 × 200 in a steel of 250 N/mm²: squash load 1000 kN, full plastic moment 50 kNm. */
const asked: InteractionAsked = {
	...{ definition: { kind: 'flat', b: 20, h: 200, grade: 250 }, plane: 'N-My', N: 0 },
	...{ code: { standard: 'EN1993-1-1:2005' }, stiffeners: undefined },
	cases: [{ N: 0, My: 25, Mz: 0 }]
};

describe('an interaction in the worker', () => {
	it('gives both limits and how far a case may grow: W = bh²/6 and bh²/4', async () => {
		const solved = await solvedInteraction(asked, { goOn: () => Promise.resolve(true) });
		if (!solved?.ok || !solved.value.plastic.ok) throw new Error('not solved');
		const [factors] = solved.value.factors;
		expect(factors?.firstYield).toBeCloseTo(100 / 3 / 25, 9);
		expect(factors?.plastic).toBeCloseTo(2, 9);
		const most = Math.max(...solved.value.plastic.value.points.map(({ My }) => My));
		expect(most).toBeCloseTo(50, 6);
	});

	it('stops between its pieces when cancelled', async () => {
		expect(await solvedInteraction(asked, { goOn: () => Promise.resolve(false) })).toBeNull();
	});

	it('hands back what is wrong with a definition', async () => {
		const definition = { kind: 'flat', b: -1, h: 200, grade: 250 } as const;
		const solved = await solvedInteraction(
			{ ...asked, definition },
			{ goOn: () => Promise.resolve(true) }
		);
		expect(solved && !solved.ok && solved.error[0]?.path).toBe('b');
	});
});
