import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../../section/definition';
import { prepareSection } from '../../section/prepare';
import type { CodeChoice } from '../result';
import { classNotes } from './class-notes';
import { elementsOf } from './elements/elements-of';
import { pureCases, type PureCases } from './model';
import { strengthsOf } from './strengths';
import { classUnder, testModel } from './test-model';

const later = { standard: 'EN1993-1-1:2022' } as const;

/** One row of a pure case. Expected figures are worked by hand beside each check. */
function row(
	definition: SectionDefinition,
	name: keyof PureCases,
	part: string,
	code: Partial<CodeChoice> = {}
) {
	const { elements } = pureCases(testModel(definition, code))[name];
	const found = elements.find((each) => each.part === part);
	if (!found) throw new Error(`no ${part}`);
	return found;
}

const classes = (definition: SectionDefinition, code: Partial<CodeChoice> = {}) => {
	const { plusMy, minusMy, plusMz, minusMz, compression } = pureCases(testModel(definition, code));
	return [plusMy, minusMy, plusMz, minusMz, compression].map(({ overall }) => overall);
};

const noteCodes = (definition: SectionDefinition, code: Partial<CodeChoice> = {}) =>
	classNotes(testModel(definition, code), [{ N: -10, My: 5, Mz: 0 }]).map((note) => note.code);

describe('channel', () => {
	const channel: SectionDefinition = {
		kind: 'channel',
		h: 200,
		b: 75,
		tw: 8.5,
		tf: 11.5,
		grade: 235
	};

	it('has flanges as outstands and the web as an internal part, from the roots', () => {
		const rounded = { ...channel, r: 11.5 };
		expect(row(rounded, 'compression', 'topFlange')).toMatchObject({ type: 'outstand', c: 55 });
		expect(row(rounded, 'compression', 'web')).toMatchObject({ type: 'internal', c: 154 });
	});

	it.each([
		// EN 10365 UPN, inner slope 8 %: depth d between the roots as the tables print it.
		[100, 50, 6, 8.5, 64],
		[200, 75, 8.5, 11.5, 151],
		[300, 100, 10, 16, 232]
	])('with tapered flanges, UPN %i: the clear web of the tables', (h, b, tw, tf, d) => {
		const upn: SectionDefinition = { ...channel, h, b, tw, tf, r: tf, flangeSlopePercent: 8 };
		expect(Math.abs(row(upn, 'compression', 'web').c - d)).toBeLessThan(0.5);
		expect(row(upn, 'compression', 'topFlange').t).toBe(tf);
		expect(noteCodes(upn)).toContain('tapered-flange-mean');
	});

	it('has its flanges bent about z with the tip or the root in compression', () => {
		// Areas 1700 of web and 2·66.5·11.5: the equal-area axis lies in the web, at 1614.75/200.
		// Centroid (1700·4.25 + 1529.5·41.75)/3229.5 from the back.
		const centre = (1700 * 4.25 + 1529.5 * 41.75) / 3229.5;
		const tip = row(channel, 'minusMz', 'topFlange');
		expect(tip.alpha).toBe(1);
		expect(tip.psi).toBeCloseTo((8.5 - centre) / (75 - centre), 10);
		const psi = tip.psi ?? 0;
		expect(tip.limits[2]).toBeCloseTo(21 * Math.sqrt(0.57 - 0.21 * psi + 0.07 * psi ** 2), 10);
		// bent the other way the block leaves them in tension: α 0 is class 1
		expect(row(channel, 'plusMz', 'topFlange')).toMatchObject({ stress: 'tension', class: 1 });
	});
});

describe('tee', () => {
	const tee: SectionDefinition = {
		kind: 'tee',
		fabrication: 'welded',
		h: 150,
		b: 150,
		tw: 10,
		tf: 15,
		weldLeg: 8,
		grade: 235
	};

	it('has its stem as an outstand from weld toe to tip, 150 − 15 − 8 = 127', () => {
		expect(row(tee, 'compression', 'web')).toMatchObject({ type: 'outstand', c: 127, class: 3 });
		expect(row(tee, 'compression', 'flange')).toMatchObject({ type: 'outstand', c: 62 });
	});

	// Centroid (2250·142.5 + 1350·67.5)/3600 = 114.375; the equal-area axis lies in the flange.
	it('with the stem compressed has its tip the most compressed', () => {
		const stem = row(tee, 'minusMy', 'web');
		const psi = (114.375 - 127) / 114.375;
		expect(stem).toMatchObject({ alpha: 1, class: 3 });
		expect(stem.psi).toBeCloseTo(psi, 10);
		expect(stem.limits[1]).toBe(10);
		expect(stem.limits[2]).toBeCloseTo(21 * Math.sqrt(0.57 - 0.21 * psi + 0.07 * psi ** 2), 10);
	});

	it('with the stem in tension in the block is class 1, though its root is compressed at first yield', () => {
		const stem = row(tee, 'plusMy', 'web');
		expect(stem).toMatchObject({ stress: 'tension', class: 1, limits: [] });
		expect(classes(tee).slice(0, 2)).toEqual([1, 3]);
	});
});

describe('angle', () => {
	const angle = (h: number, b: number, t: number, r = 12): SectionDefinition => ({
		kind: 'angle',
		h,
		b,
		t,
		r,
		grade: 235
	});

	it.each([
		['on (b + h)/(2t) = 11.5ε', angle(115, 115, 10), 2],
		['a step beyond', angle(115 * (1 + 1e-12), 115, 10), 4],
		['on h/t = 15ε', angle(150, 75, 10), 3],
		['a step beyond', angle(150 * (1 + 1e-12), 75, 10), 4]
	])('in compression is held to its own row %s', (_name, definition, expected) => {
		// Legs from their roots: 115 − 22 = 93, 9.3 of 10ε; 150 − 22 = 128, 12.8 of 14ε.
		expect(classes(definition)[4]).toBe(expected);
	});

	it('measures that row by the full legs and the outstands from the root', () => {
		// 125/8 = 15.6 is further over 11.5 than 150/8 = 18.75 over 15; the other leg is 100 − 8 − 12.
		const { elements, governing } = pureCases(testModel(angle(150, 100, 8))).compression;
		expect(elements.find(({ type }) => type === 'angle')).toMatchObject({ c: 125, class: 4 });
		expect(elements.find(({ part }) => part === 'horizontalLeg')).toMatchObject({ c: 80 });
		expect(governing).toBe('verticalLeg');
	});

	it('has no such row in bending or tension', () => {
		for (const effects of [{ My: 1 }, { N: 10 }, { N: 10, My: 1 }]) {
			const { elements } = classUnder(angle(150, 100, 8), effects);
			expect(elements.every(({ type }) => type === 'outstand')).toBe(true);
		}
		expect(classUnder(angle(150, 100, 8), { N: -10, My: 1 }).overall).toBe(4);
	});

	it('says that it must stand alone, and in 2022 that its row is from memory', () => {
		expect(noteCodes(angle(100, 100, 10))).toContain('angle-alone');
		const found = noteCodes(angle(100, 100, 10), later);
		expect(found).toEqual(expect.arrayContaining(['edition-from-memory', 'rule-from-memory']));
	});

	it('is bent by a moment that leaves none across it, in the block and elastically', () => {
		const { moments } = testModel(angle(150, 100, 10));
		for (const sense of ['plusMy', 'minusMy'] as const) {
			const { My, Mz } = moments[sense].plastic;
			expect(Math.abs((Mz ?? 1) / (My ?? 1))).toBeLessThan(1e-9);
		}
		expect(row(angle(150, 100, 10), 'plusMy', 'horizontalLeg').psi).not.toBeCloseTo(1, 3);
	});
});

describe('round tube', () => {
	const tube = (slenderness: number, fy = 235): SectionDefinition => ({
		kind: 'circular-hollow',
		d: 10 * slenderness,
		t: 10,
		grade: fy
	});

	it.each([50, 70, 90])('2005: on d/t %i and a step beyond', (limit) => {
		const own = [50, 70, 90].indexOf(limit) + 1;
		expect(classes(tube(limit))).toEqual([own, own, own, own, own]);
		const next = own + 1;
		expect(classes(tube(limit * (1 + 1e-12)))).toEqual([next, next, next, next, next]);
	});

	it('uses ε squared: 90·235/355 = 59.6', () => {
		expect(classes(tube(59.5, 355))[0]).toBe(3);
		expect(classes(tube(59.6, 355))[0]).toBe(4);
	});

	it('2022: up to 140 in bending, 90 in compression, between by ψ', () => {
		expect(classes(tube(140), later)).toEqual([3, 3, 3, 3, 4]);
		expect(classes(tube(140.001), later)).toEqual([4, 4, 4, 4, 4]);
		expect(noteCodes(tube(100), later)).toContain('rule-from-memory');
		// N/A = M/W gives ψ 0 (proportional: the stresses of the demand itself): 2520/23 = 109.6.
		const at = (slenderness: number) => {
			const { gross } = testModel(tube(slenderness)).section;
			const My = gross.elasticModulusYTop * 1e-6;
			const N = -gross.area * 1e-3;
			return classUnder(tube(slenderness), { N, My }, { ...later, classAlpha: 'proportional' })
				.overall;
		};
		expect([at(109.5), at(109.6)]).toEqual([3, 4]);
	});
});

describe('solid bar', () => {
	const elements = (definition: SectionDefinition) => {
		const section = prepareSection(definition);
		if (!section.ok) throw new Error('not a section');
		return elementsOf(section.value, strengthsOf(section.value));
	};

	it('if round is class 1 under everything, with a note', () => {
		const round: SectionDefinition = { kind: 'round', d: 40, grade: 355 };
		expect(classes(round)).toEqual([1, 1, 1, 1, 1]);
		expect(classUnder(round, { N: -5, My: 1, Mz: 1 })).toMatchObject({
			overall: 1,
			governing: 'bar'
		});
		expect(noteCodes(round)).toContain('solid-class-1');
	});

	it('if flat is class 1 up to b/t = 18ε, and has no class a step beyond, either way up', () => {
		for (const [b, h] of [
			[180, 10],
			[10, 180]
		] as const) {
			const flat: SectionDefinition = { kind: 'flat', b, h, grade: 235 };
			expect(classes(flat)).toEqual([1, 1, 1, 1, 1]);
			expect(noteCodes(flat)).toContain('solid-class-1');
			const step = 1 + 1e-12;
			const beyond = elements({ ...flat, b: b > h ? b * step : b, h: h > b ? h * step : h });
			expect(beyond.elements).toBeNull();
			expect(beyond.notes.map(({ code }) => code)).toEqual(['flat-too-slender']);
		}
	});
});

describe('edition', () => {
	const beam: SectionDefinition = {
		kind: 'i',
		fabrication: 'rolled',
		h: 400,
		b: 180,
		tw: 8.6,
		tf: 13.5,
		r: 21,
		grade: 235
	};

	it('2022 puts IPE 400 S235 (c/t 38.49) in class 4 in compression, 2005 in class 3', () => {
		expect([classes(beam)[4], classes(beam, later)[4]]).toEqual([3, 4]);
	});

	it('is named in every clause, and 2022 is noted as from memory', () => {
		const clauses = (code: Partial<CodeChoice>) =>
			pureCases(testModel(beam, code)).plusMy.elements.map(({ clause }) => clause);
		expect(clauses({}).every((clause) => clause.startsWith('EN 1993-1-1:2005 '))).toBe(true);
		expect(clauses(later).every((clause) => clause.startsWith('EN 1993-1-1:2022 '))).toBe(true);
		expect(noteCodes(beam)).toEqual(['class-alpha']);
		expect(noteCodes(beam, later)).toContain('edition-from-memory');
	});

	it('names the convention for N in α', () => {
		const message = (classAlpha: CodeChoice['classAlpha']) =>
			classNotes(testModel(beam, { classAlpha }), [{ N: -10, My: 5, Mz: 0 }])[0]?.message;
		expect(message('actual-N')).toContain('the moment filling the rest');
		expect(message('proportional')).toContain('in proportion');
		expect(classNotes(testModel(beam), [{ N: -10, My: 0, Mz: 0 }])).toEqual([]);
	});
});
