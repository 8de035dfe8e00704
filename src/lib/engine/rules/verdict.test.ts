import { describe, expect, it } from 'vitest';
import type { ISection, SectionDefinition } from '../section/definition';
import { prepareSection } from '../section/prepare';
import { analyse, type AnalyseRequest } from './analyse';
import { verdict } from './verdict';
import { plainSentence, ratioPair } from './verdict-tokens';

function prepared(definition: SectionDefinition) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	return section.value;
}

const verdictOn = (definition: SectionDefinition, request?: AnalyseRequest) =>
	analyse(prepared(definition), request).verdict;

/** Class 1: Mpl = 235·(200·20·280 + 10·260²/4) = 302.9 kNm. */
const stocky: ISection = {
	kind: 'i',
	fabrication: 'welded',
	h: 300,
	b: 200,
	tw: 10,
	tf: 20,
	grade: 235
};

describe('what may be counted, in a sentence', () => {
	it('counts the full block of a class 1 section', () => {
		const said = verdictOn(stocky);
		expect(said.sentence).toBe('Class 1. Count 303 kNm, the full plastic block.');
		expect(said.detail).toContain('comes closest');
		expect(said.detail).toContain('beyond first yield may be counted.');
		expect(said.countable.basis).toBe('plastic');
	});

	it('says when a class 3 web is counted as class 2', () => {
		const said = verdictOn({ ...stocky, h: 600, tw: 6, weldLeg: 6, grade: 275 });
		expect(said.sentence).toBe(
			'Class 3, web as Class 2. Count 744 kNm, the plastic block of the effective section.'
		);
		expect(said.governing).toBe('web');
	});

	it('counts the effective section in class 4', () => {
		// Trahair, Bradford, Nethercot & Gardner, example 4.9.4: 4996 kNm.
		const girder: ISection = { ...stocky, h: 1540, b: 400, weldLeg: 6, grade: 345 };
		const said = verdictOn(girder, { demands: [{ My: 10 }] });
		expect(said.sentence).toBe('Class 4. Count 4996 kNm, on the effective section.');
		expect(said.detail).toContain('is over the Class 3 limit');
		expect(said.detail).toMatch(/The last .* kNm of the full block are not to be counted\.$/);
		expect(said.status).toBe('passes');
	});

	it('counts between first yield and the full block by the 2022 edition', () => {
		const slender: ISection = { ...stocky, b: 460, tf: 18 };
		const code = { standard: 'EN1993-1-1:2022' } as const;
		expect(verdictOn(slender, { code }).sentence).toMatch(
			/^Class 3\. Count .* kNm, between first yield and the full block\.$/
		);
	});

	it('says why a section without a class counts nothing', () => {
		const outer = [
			[0, 0],
			[100, 0],
			[100, 20],
			[0, 20]
		] as const;
		const said = verdictOn({ kind: 'outline', outer, grade: 'S355' });
		expect(said.sentence).toBe('No class. Nothing may be counted yet.');
		expect(said.detail).toContain('no class and no resistance');
		expect(said.ruler.firstYield).toBeGreaterThan(0);
		expect(said.ruler.countable).toBeNull();
	});

	it('keeps the numbers apart from the words', () => {
		const { sentence, sentenceTokens } = verdictOn(stocky);
		expect(sentenceTokens).toHaveLength(3);
		expect(sentenceTokens[1]).toMatchObject({ quantity: 'moment' });
		expect(plainSentence(sentenceTokens)).toBe(sentence);
	});

	it('counts what N leaves of the plastic moment', () => {
		// n = 0.5, a = 2600/10600: MN = Mpl (1 − n)/(1 − 0.5 a), 6.2.9.1(5).
		const half = (10600 * 0.235) / 2;
		const said = verdictOn(stocky, { demands: [{ N: -half, My: 50 }] });
		const expected = (302.915 * 0.5) / (1 - 0.5 * (2600 / 10600));
		expect(said.countable.moment).toBeCloseTo(expected, 6);
		expect(said.sentence).toContain('beside −1246 kN, by the plastic interaction.');
	});
});

describe('status', () => {
	const status = (request: AnalyseRequest) => verdictOn(stocky, request).status;

	it('passes, fails or stays open with the demand', () => {
		expect(status({ demands: [{ My: 100 }] })).toBe('passes');
		expect(status({ demands: [{ My: 400 }] })).toBe('fails');
		expect(status({ demands: [{ My: 100, unbracedLength: 5000 }] })).toBe('passes');
		expect(status({ demands: [{ My: 100, N: -1, unbracedLength: 5000 }] })).toBe('incomplete');
		expect(status({ demands: [] })).toBe('no-figure');
		expect(status({ demands: [{ name: 'empty' }] })).toBe('no-figure');
	});

	it('says when N leaves nothing, and names no limit that is far off', () => {
		const said = verdictOn(stocky, { demands: [{ N: 5000, My: 1 }] });
		expect(said.sentence).toBe('Class 1. N leaves no moment to count.');
		expect(said.status).toBe('fails');
	});

	it('speaks of the demand that fails before one that misses a check', () => {
		const open = { name: 'open', My: 10, N: -1, unbracedLength: 5000 };
		const over = { name: 'over', My: 400 };
		expect(verdictOn(stocky, { demands: [open, over, { name: 'none' }] }).demand).toBe('over');
		expect(verdictOn(stocky, { demands: [{ My: 10 }, open] }).demand).toBe('open');
	});

	it('fails rather than stays open when a check that was made is exceeded', () => {
		expect(status({ demands: [{ My: 400, N: -1, unbracedLength: 5000 }] })).toBe('fails');
	});

	it('is of the demand that is asked for, else of the worst', () => {
		const section = prepared(stocky);
		const demands = [
			{ name: 'A', My: 100 },
			{ name: 'B', My: -400 }
		];
		const analysis = analyse(section, { demands });
		expect(analysis.verdict).toMatchObject({ demand: 'B', status: 'fails' });
		expect(analysis.verdict.ruler).toMatchObject({ axisAngle: 180, demand: 400 });
		expect(verdict(analysis, 'A')).toMatchObject({ demand: 'A', status: 'passes' });
	});
});

describe('ratios side by side', () => {
	it('take as many decimals as it needs to tell them apart', () => {
		const written = (a: number, b: number) =>
			ratioPair(a, b)
				.map((token) => plainSentence([token]))
				.join(' / ');
		expect(written(9.25, 8.2532)).toBe('9.25 / 8.25');
		expect(written(26.861, 26.859)).toBe('26.861 / 26.859');
		expect(written(9.163, 9.1516)).toBe('9.16 / 9.15');
	});
});

describe('a clear verdict', () => {
	it('is not given while buckling of the member may apply and is unchecked', () => {
		const bent = verdictOn(stocky, { demands: [{ My: 100 }] });
		expect(bent).toMatchObject({ status: 'passes', clear: false });
		expect(bent.notChecked).toContain('lateral–torsional buckling');
		expect(verdictOn(stocky, { demands: [{ N: -100 }] }).clear).toBe(false);
	});

	it('is given to tension, and to a round tube in bending', () => {
		expect(verdictOn(stocky, { demands: [{ N: 100 }] }).clear).toBe(true);
		const tube: SectionDefinition = { kind: 'circular-hollow', d: 200, t: 10, grade: 'S355' };
		expect(verdictOn(tube, { demands: [{ My: 20 }] }).clear).toBe(true);
		expect(verdictOn(tube, { demands: [{ My: 20 }, { My: 2000 }] }).clear).toBe(false);
	});
});

describe('a partial factor above one', () => {
	it('is named in the sentence, and what it takes is not counted', () => {
		const plastic = verdictOn(stocky, { code: { gammaM0: 1.1 }, demands: [{ My: 100 }] });
		expect(plastic.sentence).toMatch(/, the full plastic block over γM0 1\.10\.$/);
		expect(plastic.detail).toMatch(/The last .* kNm of the full block are not to be counted\.$/);
		const slenderer: ISection = { ...stocky, b: 460, tf: 18, grade: 235 };
		const elastic = verdictOn(slenderer, { code: { gammaM0: 1.1 }, demands: [{ My: 100 }] });
		expect(elastic.sentence).toMatch(/^Class 3\. Count .*, first yield over γM0 1\.10\.$/);
	});
});
