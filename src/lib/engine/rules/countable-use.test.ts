import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../section/definition';
import { prepareSection } from '../section/prepare';
import { analyse } from './analyse';
import type { CodeChoice, Demand, Stiffeners } from './result';

interface Given {
	readonly definition: SectionDefinition;
	readonly code: Partial<CodeChoice>;
	readonly stiffeners?: Stiffeners | undefined;
}

function stateOf({ definition, code, stiffeners }: Given, demand: Demand) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	const { demands, resistance } = analyse(section.value, { code, stiffeners, demands: [demand] });
	return { state: demands[0]!, NtRd: resistance!.NtRd!, MyRd: resistance!.MyRd };
}

/** Use of the demand with its moment grown to a size. */
function useAt(given: Given, demand: Demand, moment: number): number {
	const { My = 0, Mz = 0 } = demand;
	const grown = moment / Math.hypot(My, Mz);
	const { state } = stateOf(given, { ...demand, My: My * grown, Mz: Mz * grown });
	expect(state.missing).toEqual([]);
	return state.utilisation!;
}

/** A moment just over the one that counts fails, one just under it passes, however the class jumps. */
function expectSharp(given: Given, demand: Demand) {
	const { countable } = stateOf(given, demand).state;
	if (countable === null) return;
	const said = JSON.stringify({ ...given, demand, countable });
	if (countable > 0)
		expect(useAt(given, demand, countable * (1 - 1e-7)), said).toBeLessThan(1 + 1e-9);
	const above = Math.max(countable, 1e-6) * (1 + 1e-7);
	expect(useAt(given, demand, above), said).toBeGreaterThan(1);
}

const tee: SectionDefinition = {
	kind: 'tee',
	fabrication: 'welded',
	h: 370,
	b: 500,
	tw: 10,
	tf: 13,
	grade: 460
};

describe('the countable moment where N and moment grow in proportion', () => {
	const code = { classAlpha: 'proportional' as const };

	it('of a tee under +1600 kN is the same for −30 and −100 kNm, and not the plastic 404 kNm', () => {
		const given = { definition: tee, code };
		const [less, more] = [-30, -100].map((My) => stateOf(given, { N: 1600, My }).state);
		expect(more!.utilisation).toBeGreaterThan(1);
		expect(less!.countable).toBeLessThan(100);
		expect(less!.countable! / more!.countable!).toBeCloseTo(1, 9);
		expectSharp(given, { N: 1600, My: -30 });
		// −30 fails only if what counts is less
		expect(less!.utilisation! <= 1).toBe(less!.countable! >= 30);
	});

	it('of an angle under +600.4 kN about both axes is not above its use', () => {
		const angle: SectionDefinition = { kind: 'angle', h: 184.06, b: 182.5, t: 14.64, grade: 460 };
		expectSharp({ definition: angle, code }, { N: 600.4, My: 37.3, Mz: 21.5 });
	});

	it('of an I under −577.7 kN may be more than the class of its demand gives', () => {
		const definition: SectionDefinition = {
			kind: 'i',
			fabrication: 'welded',
			h: 582.87,
			b: 126.89,
			tw: 8.464,
			tf: 8.464,
			grade: 275
		};
		const given = { definition, code: { ...code, gammaM0: 1.1, eta: 1 } };
		expectSharp(given, { N: -577.7, My: 100 });
	});
});

/** Repeatable numbers from 0 to 1 (Park and Miller 1988). */
function numbers(seed: number) {
	let at = seed;
	return () => (at = (at * 48_271) % 2_147_483_647) / 2_147_483_647;
}

const kinds: readonly ((next: () => number) => SectionDefinition)[] = [
	(next) => ({
		kind: 'i',
		fabrication: 'welded',
		h: 300 + 900 * next(),
		b: 150 + 250 * next(),
		tw: 5 + 10 * next(),
		tf: 8 + 20 * next(),
		bBottom: 150 + 250 * next(),
		tfBottom: 8 + 20 * next(),
		grade: 355
	}),
	(next) => ({
		kind: 'tee',
		fabrication: 'welded',
		h: 150 + 250 * next(),
		b: 150 + 250 * next(),
		tw: 8 + 8 * next(),
		tf: 8 + 12 * next(),
		grade: 355
	}),
	(next) => ({ kind: 'angle', h: 150 + 60 * next(), b: 120, t: 10 + 8 * next(), grade: 355 }),
	(next) => ({
		kind: 'channel',
		h: 200 + 200 * next(),
		b: 80 + 30 * next(),
		tw: 6 + 4 * next(),
		tf: 8 + 6 * next(),
		r: 8,
		grade: 355
	}),
	(next) => ({
		kind: 'rectangular-hollow',
		h: 200 + 200 * next(),
		b: 150,
		t: 4 + 6 * next(),
		fabrication: 'hot-finished',
		grade: 355
	}),
	(next): SectionDefinition => {
		const [h, b, t] = [300 + 600 * next(), 200 + 150 * next(), 10 + 10 * next()];
		const plate = (name: string, y: number, z: number, width: number, angle: number) => ({
			name,
			y,
			z,
			width,
			angle,
			thickness: t
		});
		return {
			kind: 'plates',
			grade: 355,
			plates: [
				plate('low', 0, 0, b, 0),
				plate('middle', 0, h / 2, h - t, 90),
				plate('high', 0, h, b, 0)
			]
		};
	}
];

describe('a demand uses all of the section just where its moment is the countable one', () => {
	it.each(['actual-N', 'proportional'] as const)('α with %s', (classAlpha) => {
		const rounds = classAlpha === 'actual-N' ? 60 : 8;
		const next = numbers(classAlpha === 'actual-N' ? 7 : 11);
		const among = <T>(values: readonly T[]) => values[Math.floor(next() * values.length)]!;
		for (let i = 0; i < rounds; i++) {
			const definition = kinds[i % kinds.length]!(next);
			const code: Partial<CodeChoice> = {
				classAlpha,
				standard: among(['EN1993-1-1:2005', 'EN1993-1-1:2022']),
				useStressLevel: next() < 0.2,
				gammaM0: among([1, 1.1])
			};
			const stiffeners: Stiffeners | undefined =
				next() < 0.3 ? { spacing: 800, endPost: 'rigid' } : undefined;
			const given = { definition, code, stiffeners };
			const { NtRd } = stateOf(given, { My: 1 });
			const N = among([0, 0.1, -0.1, 0.4, -0.4, 0.7]) * NtRd;
			const direction = among([0, 180, 90, -90, 30, 200]) * (Math.PI / 180);
			const shear = among([0, 0, 0.1, 0.25]) * NtRd;
			expectSharp(given, {
				N,
				My: Math.cos(direction) * (1 + 100 * next()),
				Mz: Math.abs(Math.sin(direction)) < 1e-9 ? 0 : 20 * Math.sin(direction),
				Vz: shear,
				...(N >= 0 && definition.kind === 'i' && next() < 0.5 ? { unbracedLength: 3000 } : {})
			});
		}
	});
});
