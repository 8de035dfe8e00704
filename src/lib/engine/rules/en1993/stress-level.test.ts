import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../../section/definition';
import type { CodeChoice } from '../result';
import { classifyDemand } from './demand-class';
import { pureCases } from './model';
import { stressLevelClass, stressLevelNote } from './stress-level';
import type { Effects } from './stress-case';
import { testModel } from './test-model';

/** Flange c/t = (300 − 8)/2/10 = 14.6 over 14ε of 355 (11.39); web class 1. */
const girder: SectionDefinition = {
	kind: 'i',
	fabrication: 'welded',
	h: 300,
	b: 300,
	tf: 10,
	tw: 8,
	grade: 355
};
const used: Partial<CodeChoice> = { useStressLevel: true };

function judged(effects: Effects, code: Partial<CodeChoice> = used, definition = girder) {
	const model = testModel(definition, code);
	const { classified } = classifyDemand(model, pureCases(model), effects, 'tested');
	return { model, classified, raised: stressLevelClass(model, classified, effects) };
}

const bent = (My: number): Effects => ({ N: 0, My, Mz: 0 });

describe('class 4 as class 3 at a low stress, 5.5.2(9)', () => {
	const { secondMomentY } = testModel(girder).section.gross;
	/** My at which the flange's outer fibre has 235·(14/14.6)² of γM0 1: c/t = 14√(235/σ). */
	const most = (235 * (14 / 14.6) ** 2 * secondMomentY) / 150 / 1e6;

	it('holds up to the stress at which c/t is 14√(235/σ), and not a step beyond', () => {
		const { classified, raised } = judged(bent(most * (1 - 1e-12)));
		expect(classified.overall).toBe(4);
		expect(raised?.overall).toBe(3);
		expect(raised?.governing).toBe('topFlange');
		const flange = raised?.elements.find(({ part }) => part === 'topFlange');
		expect(flange?.limits[2]).toBeCloseTo(14.6, 9);
		expect(judged(bent(most * (1 + 1e-9))).raised).toBeNull();
	});

	it('leaves the limits of classes 1 and 2 as they are, so that the row shows what it is over', () => {
		const { classified, raised } = judged(bent(most / 2));
		const limits = (rows: typeof classified) =>
			rows.elements.find(({ part }) => part === 'topFlange')?.limits.slice(0, 2);
		expect(raised && limits(raised)).toEqual(limits(classified));
		const web = raised?.elements.find(({ part }) => part === 'web');
		expect(web?.class).toBe(1);
	});

	it('counts γM0: the stress may be less by it', () => {
		const code = { ...used, gammaM0: 1.1 };
		expect(judged(bent((most / 1.1) * (1 - 1e-12)), code).raised?.overall).toBe(3);
		expect(judged(bent((most / 1.1) * (1 + 1e-9)), code).raised).toBeNull();
	});

	it('counts N with the moment: stresses add', () => {
		const { area } = testModel(girder).section.gross;
		const allowed = 235 * (14 / 14.6) ** 2;
		const N = (-0.25 * allowed * area) / 1e3;
		expect(judged({ N, My: 0.75 * most * (1 - 1e-9), Mz: 0 }).raised?.overall).toBe(3);
		expect(judged({ N, My: 0.751 * most, Mz: 0 }).raised).toBeNull();
	});

	it('is not used unless it is asked for, nor for a section of a better class', () => {
		expect(judged(bent(1), {}).raised).toBeNull();
		expect(judged(bent(1), used, { ...girder, tf: 20 }).raised).toBeNull();
	});

	it('raises ε squared for a round tube: 90·235/σ', () => {
		const tube: SectionDefinition = { kind: 'circular-hollow', d: 500, t: 5, grade: 355 };
		const { area } = testModel(tube).section.gross;
		const N = (share: number) => (-share * area * (90 / 100) * 235) / 1e3;
		expect(judged({ N: N(1 - 1e-12), My: 0, Mz: 0 }, used, tube).raised?.overall).toBe(3);
		expect(judged({ N: N(1 + 1e-9), My: 0, Mz: 0 }, used, tube).raised).toBeNull();
	});

	it('names itself and that it is not for member buckling', () => {
		const note = stressLevelNote(testModel(girder, used));
		expect(note).toMatchObject({
			code: 'stress-level-used',
			clause: 'EN 1993-1-1:2005 5.5.2(9)'
		});
		expect(note.message).toContain('not for member buckling');
	});
});
