import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../section/definition';
import { prepareSection } from '../section/prepare';
import type { PreparedSection } from '../section/prepared';
import { countableCurve } from './countable-curve';

function prepared(definition: SectionDefinition): PreparedSection {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error('The section of this test cannot be built.');
	return section.value;
}

/** HE 200 B, class 1 in S235 under any N (printed in producers' tables). */
const column = prepared({
	...{ kind: 'i', fabrication: 'rolled', grade: 'S235' },
	...{ h: 200, b: 200, tw: 9, tf: 15, r: 18 }
});

describe('the code’s own curve', () => {
	it('is the rectangle’s MN = Mpl (1 − n²) for a solid bar', () => {
		const bar = prepared({ kind: 'flat', b: 60, h: 120, grade: 235 });
		const [Npl, Mpl] = [235 * 60 * 120 * 1e-3, (235 * 60 * 120 ** 2 * 1e-6) / 4];
		const curve = countableCurve(bar, { plane: 'N-My', points: 24 });
		for (const point of curve)
			expect(Math.abs(point!.My)).toBeCloseTo(Mpl * (1 - (point!.N / Npl) ** 2), 6);
	});

	it('follows 6.2.9.1(4) and (5) for an I, whole up to both thresholds', () => {
		const { area, plasticModulusY } = column.gross;
		const [Npl, Mpl] = [area * 235e-3, plasticModulusY * 235e-6];
		const a = Math.min((area - 2 * 200 * 15) / area, 0.5);
		for (const point of countableCurve(column, { plane: 'N-My', points: 72 })) {
			const N = Math.abs(point!.N);
			const isWhole = N <= 0.25 * Npl && N <= 0.5 * 170 * 9 * 235e-3;
			const share = isWhole ? 1 : Math.min(1, (1 - N / Npl) / (1 - 0.5 * a));
			expect(Math.abs(point!.My)).toBeCloseTo(Mpl * share, 6);
		}
	});

	it('in My–Mz without N is (My/Mpl,y)² + Mz/Mpl,z = 1 for an I', () => {
		const curve = countableCurve(column, { plane: 'My-Mz', points: 36 });
		const [y, z] = [curve[0]!.My, curve[9]!.Mz];
		for (const point of curve)
			expect((point!.My / y) ** 2 + Math.abs(point!.Mz) / z).toBeCloseTo(1, 8);
	});

	it('is empty where the code gives nothing', () => {
		const shape = prepared({
			...{ kind: 'outline', grade: 'S235' },
			outer: [
				[0, 0],
				[100, 0],
				[0, 100]
			]
		});
		expect(countableCurve(shape, { plane: 'N-My' })).toEqual([]);
	});
});
