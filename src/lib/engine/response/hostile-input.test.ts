import { describe, expect, it } from 'vitest';
import { bending, respond } from './respond';
import { firstYield } from './first-yield';
import { part, rectangle, sectionOf, steel } from './test-sections';

const bar = sectionOf(part('bar', rectangle(0, 0, 10, 100), steel(200)));
const free = { axisAngle: 0, transverse: 'moment-zero', N: 0 } as const;

describe('what no section can carry', () => {
	it.each([1e308, -1e308, 1e12, Infinity, NaN])(
		'has no state and is told at once (N = %d)',
		(N) => {
			const {
				states,
				firstYield: first,
				plasticMoment
			} = respond(bar, { ...free, N }, { curvature: [0, 1] });
			expect(states.map(({ converged }) => converged)).toEqual([false, false]);
			expect(first.moment).toBeNull();
			expect(plasticMoment).toBeNull();
		}
	);

	it.each([1e308, -1e308, 5.0000001, -5.0000001, NaN])('has no state at M = %d', (moment) => {
		// full plastic: 200·10·100²/4 = 5 kNm
		expect(respond(bar, free, { moment: [moment] }).states[0]!.converged).toBe(false);
	});

	it('answers thousands of moments out of reach about a turned axis without a search', () => {
		const lopsided = sectionOf(
			part('a', rectangle(0, 0, 10, 100), steel(200)),
			part('b', rectangle(10, 0, 60, 12), steel(355))
		);
		const bent = bending(lopsided, { ...free, axisAngle: 20 });
		const limit = bent.plasticMoment!;
		let evaluated = 0;
		for (let i = 1; i <= 2000; i++) {
			if (!bent.atMoment(limit * (1 + i * 1e-6)).converged) evaluated++;
		}
		expect(evaluated).toBe(2000);
		expect(bent.atMoment(limit * (1 - 1e-6)).converged).toBe(true);
	});

	it('gives no figure for a strain plane beyond all numbers', () => {
		const at = { strainPlanes: [{ e0: 0, ky: 1e308, kz: 0 }] };
		expect(respond(bar, free, at).states[0]!.converged).toBe(false);
	});
});

describe('a curvature beyond all steel', () => {
	it('has no state, and one just short of it is balanced', () => {
		const lopsided = sectionOf(
			part('a', rectangle(0, 0, 10, 100), steel(200)),
			part('b', rectangle(10, 0, 60, 12), steel(355))
		);
		const bent = bending(lopsided, { ...free, axisAngle: 20 });
		expect(bent.atCurvature(1e6).converged).toBe(false);
		const far = bent.atCurvature(500);
		expect(far.converged).toBe(true);
		expect(far.moment! / bent.plasticMoment!).toBeCloseTo(1, 6);
		expect(far.moment!).toBeLessThan(bent.plasticMoment! * (1 + 1e-9));
	});
});

describe('steel stiffer in tension than in compression', () => {
	it('first yields where the balanced plane does, not where one modulus says', () => {
		const twofold = sectionOf(
			part(
				'bar',
				rectangle(0, 0, 10, 100),
				steel(200, {
					law: {
						type: 'curve',
						tension: [[0.001, 200]],
						compression: [[0.002, 200]],
						beyond: 'flat'
					}
				})
			)
		);
		// two moduli (textbook bending): compressed depth c = h/(1 + √(Ec/Et)), Et = 2 Ec
		const c = 100 / (1 + Math.sqrt(0.5));
		const t = 100 - c;
		// tension edge at 0.001 gives κ = 0.001/t; compression edge then 0.001·c/t < 0.002
		const curvature = 0.001 / t;
		const moment = (10 * (100_000 * c ** 3 + 200_000 * t ** 3) * curvature) / 3 / 1e6;
		const found = firstYield(twofold, free);
		expect(found.curvature! / 1e3 / curvature).toBeCloseTo(1, 10);
		expect(found.moment! / moment).toBeCloseTo(1, 10);
	});
});

describe('a law that never reaches the strength of its grade', () => {
	it('gives its own plateau to the full plastic moment', () => {
		const weak = sectionOf(
			part(
				'bar',
				rectangle(0, 0, 10, 100),
				steel(200, { law: { type: 'curve', tension: [[0.001, 100]], beyond: 'flat' } })
			)
		);
		expect(bending(weak, free).plasticMoment).toBeCloseTo(2.5, 12);
	});
});
