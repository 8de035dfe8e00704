import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { ISection } from '../../../section/definition';
import { testModel } from '../test-model';
import { effectiveMoment } from './effective-moment';
import { hybridMoment } from './hybrid-moment';
import { reducedSection } from './effective-section';
import { wholeOf } from './reduce';

const hybrid = (sizes: Partial<ISection>, fyf: number, fyw: number): ISection => ({
	kind: 'i',
	fabrication: 'welded',
	h: 1000,
	b: 300,
	tf: 20,
	tw: 10,
	grade: fyf,
	partGrades: { web: fyw },
	...sizes
});

describe('hybridMoment of the whole section', () => {
	// closed form for flange areas at the edges of the web: Rh = [12 + β(3r − r³)]/(12 + 2β),
	// β = D tw/Af, r = fyw/fyf, times My = fyf (Af D + tw D²/6); common practice, as in girder codes
	it.each([
		[460, 355, 10],
		[460, 235, 10],
		[420, 235, 6]
	])('follows the closed form of thin flanges: fyf %d, fyw %d, tw %d', (fyf, fyw, tw) => {
		const [D, b, tf] = [1000, 1e5, 0.02];
		const model = testModel(hybrid({ h: D + 2 * tf, b, tf, tw }, fyf, fyw));
		const [beta, r] = [(D * tw) / (b * tf), fyw / fyf];
		const Rh = (12 + beta * (3 * r - r ** 3)) / (12 + 2 * beta);
		const My = fyf * (b * tf * D + (tw * D * D) / 6);
		const { moment } = hybridMoment(model, 'plusMy', wholeOf(model.section.gross));
		expect(Math.abs(moment / (Rh * My) - 1)).toBeLessThan(2e-4);
	});
});

/** Strains plane, flanges elastic, web up to its strength: added up in thin slices, the axis by halving. */
function bySlices(
	{ h, b, tf, bBottom = b, tfBottom = tf, tw }: ISection,
	fyf: number,
	fyw: number,
	removed: readonly { from: number; to: number; part: string }[]
): number {
	const lost = removed.reduce(
		(sum, { part, from, to }) => sum + (part === 'topFlange' ? to - from : 0),
		0
	);
	const gap = removed.find(({ part }) => part === 'web') ?? { from: 0, to: 0 };
	const pieces = [
		[b - lost, h - tf, h, Infinity],
		[bBottom, 0, tfBottom, Infinity],
		[tw, tfBottom, gap.from || h - tf, fyw],
		[tw, gap.to || h - tf, h - tf, fyw]
	] as const;
	const forces = (axis: number) => {
		const slope = Math.min(fyf / (h - axis), fyf / axis);
		let [N, M] = [0, 0];
		for (const [width, low, high, most] of pieces)
			for (let i = 0; i < 4000; i++) {
				const z = low + ((i + 0.5) * (high - low)) / 4000;
				const stress = Math.max(-most, Math.min(most, slope * (z - axis)));
				const force = (stress * width * (high - low)) / 4000;
				N += force;
				M += force * z;
			}
		return { N, M };
	};
	let [low, high] = [tfBottom, h - tf];
	for (let i = 0; i < 50; i++) {
		const middle = (low + high) / 2;
		if (forces(middle).N > 0) low = middle;
		else high = middle;
	}
	return forces(low).M;
}

describe('hybridMoment of a girder with a slender web', () => {
	const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
	it('is the sum of thin slices of what remains', () => {
		fc.assert(
			fc.property(
				fc.record({
					h: between(1000, 2000),
					b: between(250, 500),
					tf: between(12, 30),
					bBottom: between(250, 500),
					tfBottom: between(12, 30),
					tw: between(6, 10)
				}),
				between(235, 440),
				(sizes, fyw) => {
					const definition = hybrid(sizes, 460, fyw);
					const model = testModel(definition);
					const moment = effectiveMoment(model, 'plusMy')!;
					const { once } = reducedSection(model, '+My')!;
					const own = hybridMoment(model, 'plusMy', once).moment;
					const slices = bySlices(definition, 460, fyw, moment.effective.removed);
					expect(Math.abs(own / slices - 1)).toBeLessThan(1e-5);
					expect(moment.value).toBeLessThanOrEqual(own * 1e-6 * (1 + 1e-12));
				}
			),
			{ numRuns: 8 }
		);
	});

	it('takes ε of the web from the flange’s strength', () => {
		const model = testModel(hybrid({ h: 1500, tw: 8 }, 460, 235));
		const web = effectiveMoment(model, 'plusMy')!.effective.elements.find(
			({ element }) => element === 'web'
		)!;
		const epsilon = Math.sqrt(235 / 460);
		expect(web.slenderness).toBeCloseTo(1460 / 8 / (28.4 * epsilon * Math.sqrt(23.88)), 4);
	});

	it('counts more than the first yield of the web, less than the web at the flange’s strength', () => {
		const sizes = { h: 1500, tw: 8 };
		const moment = (fyw: number) =>
			effectiveMoment(testModel(hybrid(sizes, 460, fyw)), 'plusMy')!.value;
		expect(moment(355)).toBeLessThan(moment(460));
		expect(moment(235)).toBeLessThan(moment(355));
		expect(moment(235)).toBeGreaterThan(0.8 * moment(460));
	});

	it('turns over with the section', () => {
		const up = hybrid({ h: 1500, tw: 8, b: 400, tf: 25, bBottom: 250, tfBottom: 15 }, 460, 300);
		const over = hybrid({ h: 1500, tw: 8, b: 250, tf: 15, bBottom: 400, tfBottom: 25 }, 460, 300);
		const [a, b] = [
			effectiveMoment(testModel(up), 'plusMy')!,
			effectiveMoment(testModel(over), 'minusMy')!
		];
		expect(a.value / b.value).toBeCloseTo(1, 10);
		expect(a.governing).toBe(b.governing);
	});
});
