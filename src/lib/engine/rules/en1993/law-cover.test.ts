import { describe, expect, it } from 'vitest';
import type { LawDefinition } from '../../material/material';
import { prepareSection } from '../../section/prepare';
import { analyse } from '../analyse';

/** IPE 300 by its sizes. */
function analysed(law: LawDefinition | undefined, fyc?: number) {
	const section = prepareSection({
		kind: 'i',
		h: 300,
		b: 150,
		tw: 7.1,
		tf: 10.7,
		r: 15,
		fabrication: 'rolled',
		grade: { fy: 355, fu: 490, ...(law && { law }), ...(fyc && { fyc }) }
	});
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	const analysis = analyse(section.value, { demands: [{ My: 50 }] });
	return { ...analysis, codes: analysis.notes.map(({ code }) => code) };
}

const plain = analysed(undefined);
const yieldStrain = 355 / 210_000;
const curve = (
	tension: [number, number][],
	beyond: 'flat' | 'zero' = 'flat',
	compression?: [number, number][]
): LawDefinition => ({ type: 'curve', tension, beyond, ...(compression && { compression }) });

describe('a law that the code does not cover', () => {
	it.each([
		['far below fy', curve([[0.001, 100]])],
		['softer than E', curve([[0.003, 355]])],
		[
			'bending away before fy',
			curve([
				[0.001, 210],
				[0.003, 355]
			])
		],
		[
			'falling below fy',
			curve([
				[yieldStrain, 355],
				[0.02, 300]
			])
		],
		[
			'ending at nothing',
			curve(
				[
					[yieldStrain, 355],
					[0.2, 355]
				],
				'zero'
			)
		],
		['weak in compression only', curve([[yieldStrain, 355]], 'flat', [[0.001, 100]])],
		['stiffer than E', curve([[0.001, 355]])]
	])('gives no class and no resistance: %s', (_what, law) => {
		const { classification, resistance, demands, codes, verdict } = analysed(law);
		expect([classification, resistance]).toEqual([null, null]);
		expect(demands).toEqual([]);
		expect(codes).toContain('law-not-covered');
		expect(verdict.countable.moment).toBeNull();
	});
});

describe('a law that never lies below the elastic–perfectly plastic one', () => {
	it.each<[string, LawDefinition]>([
		['bilinear', { type: 'bilinear', Eh: 2100 }],
		['quad-linear', { type: 'quad-linear' }],
		[
			'a hardening curve',
			curve([
				[yieldStrain, 355],
				[0.02, 355],
				[0.1, 490]
			])
		]
	])('keeps resistances on fy and says so: %s', (_what, law) => {
		const { resistance, classification, codes } = analysed(law);
		expect(resistance?.MyRd).toBeCloseTo(plain.resistance?.MyRd ?? NaN, 9);
		expect(classification?.overall).toBe(plain.classification?.overall);
		expect(codes).toContain('hardening-not-counted');
	});

	it('needs no word when it is that law', () => {
		const flat = analysed(curve([[yieldStrain, 355]]));
		expect(flat.resistance?.MyRd).toBeCloseTo(plain.resistance?.MyRd ?? NaN, 9);
		for (const { codes } of [plain, flat, analysed(undefined, 300)]) {
			expect(codes).not.toContain('law-not-covered');
			expect(codes).not.toContain('hardening-not-counted');
		}
	});
});
