import { describe, expect, it } from 'vitest';
import type { PlateElement } from '../elements/element';
import { elementWidth } from './element-width';

const plate = (type: PlateElement['type']): PlateElement => ({
	id: 'plate',
	part: 'plate',
	type,
	c: 1000,
	t: 5,
	fy: 235,
	epsilon: 1,
	from: { y: 0, z: 0 },
	to: { y: 1000, z: 0 }
});
const width = (type: PlateElement['type'], atFrom: number, atTo: number) =>
	elementWidth(plate(type), atFrom, atTo, 1e-9)!;

describe('effective widths of internal parts, EN 1993-1-5 Table 4.1', () => {
	it('keeps half of beff at each edge in uniform compression', () => {
		const { effective, edges, removed, rho } = width('internal', 1, 1);
		expect(effective).toBeCloseTo(rho * 1000, 9);
		expect(edges[0]).toBeCloseTo(effective / 2, 9);
		expect(removed![0]).toBeCloseTo(edges[0], 9);
		expect(removed![1]).toBeCloseTo(1000 - edges[1], 9);
	});

	it('keeps 2 beff/(5 − ψ) at the more compressed edge while both are compressed', () => {
		const { effective, edges, removed, psi } = width('internal', 1, 0.4);
		expect(psi).toBeCloseTo(0.4, 12);
		expect(edges[0]).toBeCloseTo((2 * effective) / 4.6, 9);
		expect(edges[0] + edges[1]).toBeCloseTo(effective, 9);
		expect(removed).toEqual([edges[0], 1000 - edges[1]].map((at) => expect.closeTo(at, 9)));
	});

	it('reduces the compressed width alone when the other edge is pulled: 0.4 and 0.6 of ρ bc', () => {
		const { compressedWidth, effective, edges, removed, rho } = width('internal', 1, -1);
		expect(compressedWidth).toBeCloseTo(500, 12);
		expect(effective).toBeCloseTo(rho * 500, 9);
		expect(edges[0]).toBeCloseTo(0.4 * effective, 9);
		expect(removed).toEqual(
			[0.4 * effective, 500 - 0.6 * effective].map((at) => expect.closeTo(at, 9))
		);
	});

	it('takes the slenderness from the full width, not from bc', () => {
		expect(width('internal', 1, -1).slenderness).toBeCloseTo(200 / (28.4 * Math.sqrt(23.88)), 9);
	});

	it('runs on without a step from one range of ψ to the next but for the printed rounding of kσ', () => {
		for (const psi of [0, -1]) {
			const [above, below] = [width('internal', 1, psi + 1e-7), width('internal', 1, psi - 1e-7)];
			expect(Math.abs(above.effective / below.effective - 1)).toBeLessThan(0.001);
			if (psi === -1) expect(Math.abs(above.edges[0] / below.edges[0] - 1)).toBeLessThan(0.001);
		}
		const [even, near] = [width('internal', 1, 1), width('internal', 1, 1 - 1e-6)];
		expect(near.edges[0]).toBeCloseTo(even.edges[0], 3);
	});

	it('turns round with its stresses', () => {
		const [a, b] = [width('internal', 1, -0.3), width('internal', -0.3, 1)];
		expect(b.removed).toEqual(
			[1000 - a.removed![1], 1000 - a.removed![0]].map((at) => expect.closeTo(at, 9))
		);
	});
});

describe('effective widths of outstands, Table 4.2', () => {
	it('are measured from the supported edge when all of it is compressed', () => {
		for (const [root, tip] of [
			[1, 1],
			[0.5, 1],
			[1, 0.5]
		] as const) {
			const { removed, rho } = width('outstand', root, tip);
			expect(removed).toEqual([rho * 1000, 1000].map((at) => expect.closeTo(at, 9)));
		}
	});

	it('lose the outer part of bc when the tip is compressed and the root pulled', () => {
		const { removed, rho, kSigma } = width('outstand', -1, 1);
		expect(kSigma).toBeCloseTo(0.85, 12);
		expect(removed).toEqual([500 + rho * 500, 1000].map((at) => expect.closeTo(at, 9)));
	});

	it('keep ρ bc beside the root and all of the pulled tip when the root is compressed', () => {
		const { removed, rho, kSigma } = width('outstand', 1, -1);
		expect(kSigma).toBeCloseTo(23.8, 12);
		expect(removed).toEqual([rho * 500, 500].map((at) => expect.closeTo(at, 9)));
	});
});

it('has no effective width where nothing is compressed', () => {
	expect(elementWidth(plate('internal'), -1, 0, 1e-9)).toBeNull();
});
