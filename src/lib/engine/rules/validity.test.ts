import { describe, expect, it } from 'vitest';
import type { ISection, SectionDefinition } from '../section/definition';
import { prepareSection } from '../section/prepare';
import { analyse } from './analyse';
import type { CodeChoice } from './result';

function analysed(definition: SectionDefinition, code: Partial<CodeChoice> = {}) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	return analyse(section.value, { code, demands: [{ My: 10 }] });
}

const beam: ISection = {
	kind: 'i',
	fabrication: 'welded',
	h: 300,
	b: 200,
	tw: 10,
	tf: 20,
	grade: 'S355'
};

describe('outside the rules', () => {
	it.each(['AISC360-22', 'CSA-S16:19', 'AS4100', 'IS800'] as const)(
		'gives %s no class and no resistance while it is not built',
		(standard) => {
			const { classification, resistance, notes, verdict } = analysed(beam, { standard });
			expect([classification, resistance]).toEqual([null, null]);
			expect(notes.map(({ code }) => code)).toContain('code-not-built');
			expect(verdict.status).toBe('no-figure');
			expect(verdict.countable.moment).toBeNull();
		}
	);

	const others: SectionDefinition[] = [
		{ kind: 'flat', b: 200, h: 10, grade: 'S355' },
		{
			kind: 'outline',
			outer: [
				[0, 0],
				[100, 0],
				[100, 200],
				[0, 200]
			],
			grade: 'S355'
		}
	];
	it.each(others.map((definition) => [definition.kind, definition] as const))(
		'gives a %s moments as properties but no class, and no resistance except of a flat to tension',
		(kind, definition) => {
			const { classification, resistance, moment, notes, gross } = analysed(definition);
			expect(classification).toBeNull();
			if (kind === 'outline') expect(resistance).toBeNull();
			else {
				const { MyRd, MyRdNegative, MzRd, NRd, VyRd, VzRd, NtRd } = resistance!;
				expect([MyRd, MyRdNegative, MzRd, NRd, VyRd, VzRd]).toEqual(Array(6).fill(null));
				// 6.2.3: A fy of S355, thinner than 16 mm
				expect(NtRd).toBeCloseTo((gross.area * 355) / 1e3, 6);
			}
			expect(moment.firstYieldY).toBeGreaterThan(0);
			expect(moment.plasticY).toBeGreaterThan(moment.firstYieldY ?? 0);
			const none = kind === 'flat' ? 'flat-too-slender' : 'class-not-built';
			expect(notes.map(({ code }) => code)).toContain(none);
		}
	);

	it.each([
		['fy over 460', { ...beam, grade: 'S690Q' }, 'strength-out-of-range'],
		['aluminium', { ...beam, grade: { fy: 250, E: 70_000 } }, 'modulus-out-of-range'],
		[
			'a flange over twice as strong as the web',
			{ ...beam, grade: 460, partGrades: { web: 229 } },
			'hybrid-out-of-range'
		],
		['too little ductility', { ...beam, grade: { fy: 355, fu: 380 } }, 'ductility-out-of-range']
	] as const)('refuses %s with a reason', (_what, definition, code) => {
		const { classification, resistance, notes } = analysed(definition);
		expect([classification, resistance]).toEqual([null, null]);
		expect(notes.map((note) => note.code)).toContain(code);
	});

	it('takes fy 460 itself, and a web of just half the flange', () => {
		expect(analysed({ ...beam, grade: 460 }).classification).not.toBeNull();
		const half: ISection = { ...beam, grade: 460, partGrades: { web: 230 } };
		expect(analysed(half).classification).not.toBeNull();
	});

	it.each([
		['gammaM0', 1e-308],
		['gammaM0', 0.89],
		['gammaM0', 2.01],
		['gammaM0', Number.NaN],
		['gammaM1', 0],
		['gammaM2', -1],
		['eta', 1.1],
		['eta', 0]
	] as const)('refuses %s of %s, and names it', (factor, value) => {
		const { classification, resistance, notes, verdict } = analysed(beam, { [factor]: value });
		expect([classification, resistance]).toEqual([null, null]);
		expect(notes.find(({ code }) => code === 'factor-out-of-range')?.message).toMatch(
			factor === 'eta' ? 'η' : `γ${factor.slice(5)}`
		);
		expect(verdict.countable.moment).toBeNull();
	});

	it('takes factors on their limits', () => {
		for (const gamma of [0.9, 2])
			expect(
				analysed(beam, { gammaM0: gamma, gammaM1: gamma, gammaM2: gamma, eta: 1 }).resistance
			).not.toBeNull();
	});

	it('says when a class 3 web cannot be taken as an effective class 2 web', () => {
		// Flanges 200×12 over 200×30, web 400×8, fy 235: the tension flange outweighs the effective
		// web (3600 mm² over 2 · 160 · 8), so its plastic axis leaves the web.
		const sizes = { h: 442, tf: 12, tfBottom: 30, tw: 8, grade: 235 };
		const { resistance, classification, notes } = analysed({ ...beam, ...sizes });
		expect(classification).toMatchObject({ overall: 3, governing: 'web' });
		expect(resistance?.basis).toBe('elastic');
		expect(notes.map(({ code }) => code)).toContain('effective-class-2-not-used');
		const refused = analysed({ ...beam, ...sizes }, { allowEffectiveClass2: false });
		expect(refused.notes.map(({ code }) => code)).not.toContain('effective-class-2-not-used');
	});

	it('gives a round tube beyond 90ε² class 4 and nothing to count', () => {
		const tube = (t: number) => analysed({ kind: 'circular-hollow', d: 900, t, grade: 235 });
		expect(tube(10).classification?.overall).toBe(3);
		expect(tube(9.99).classification?.overall).toBe(4);
		expect(tube(9.99).resistance).toMatchObject({ MyRd: null, NRd: null, VzRd: null });
	});

	it('never answers with NaN or Infinity', () => {
		const sizes: ISection[] = [
			beam,
			{ ...beam, h: 40.02, tw: 0.01 },
			{ ...beam, tw: 199.9, grade: 345 }
		];
		for (const definition of sizes) {
			const text = JSON.stringify(analysed(definition), (_key, value: unknown) =>
				typeof value === 'number' && !Number.isFinite(value) ? 'not finite' : value
			);
			expect(text).not.toContain('not finite');
		}
	});

	it('does not change class when every size is a hundredth or tenfold, and moments go with the cube', () => {
		const uneven = { b: 180, bBottom: 220, tf: 14, tfBottom: 12, tw: 5, h: 400, grade: 355 };
		const at = (k: number) => {
			const { b, bBottom, tf, tfBottom, tw, h } = uneven;
			const sizes = { b: b * k, bBottom: bBottom * k, tf: tf * k, tfBottom: tfBottom * k };
			return analysed({ ...beam, ...sizes, tw: tw * k, h: h * k, grade: 355 });
		};
		const one = at(1);
		for (const k of [0.01, 10]) {
			const scaled = at(k);
			expect(scaled.classification?.byCase).toEqual(one.classification?.byCase);
			const ratio = (scaled.resistance?.MyRd ?? 0) / (one.resistance?.MyRd ?? 1);
			expect(ratio / k ** 3).toBeCloseTo(1, 10);
		}
	});
});
