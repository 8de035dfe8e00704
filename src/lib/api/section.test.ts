import { describe, expect, expectTypeOf, it } from 'vitest';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { issuesOf } from './issues';
import { limits } from './limits';
import { sectionKinds, sectionSchema, type SectionInput } from './section';
import { z } from './zod';

type Frozen<T> = T extends readonly (infer U)[]
	? readonly Frozen<U>[]
	: T extends object
		? { readonly [K in keyof T]: Frozen<T[K]> }
		: T;
type Fields<T> = T extends { kind: infer K } ? [K, keyof T] : never;

const welded = { kind: 'i', h: 900, b: 300, tw: 12, tf: 25, fabrication: 'welded', grade: 'S355' };
const request = z.object({ section: sectionSchema });
const issues = (section: unknown) => {
	const parsed = request.safeParse({ section });
	return parsed.success ? [] : issuesOf(parsed.error);
};

describe('sectionSchema', () => {
	it('has the fields of the engine’s definitions, kind by kind', () => {
		expectTypeOf<SectionInput>().toExtend<SectionDefinition>();
		expectTypeOf<Fields<SectionInput>>().toEqualTypeOf<Fields<SectionDefinition>>();
		expectTypeOf<Frozen<SectionDefinition>>().toExtend<Frozen<SectionInput>>();
		expect(sectionKinds).toHaveLength(11);
	});

	it('accepts grades by name, by number and in full', () => {
		expect(issues(welded)).toEqual([]);
		expect(issues({ ...welded, grade: 355 })).toEqual([]);
		const grade = { fy: 345, fu: 450, law: { type: 'bilinear', Eh: 2100 } };
		expect(issues({ ...welded, grade, partGrades: { web: 'S235' } })).toEqual([]);
	});

	it('names a misspelt dimension and the one that was meant', () => {
		const [first] = issues({ ...welded, twf: 12 });
		expect(first?.path).toBe('section.twf');
		expect(first?.message).toContain('"twf" is not known (did you mean "tw"?)');
	});

	it('says what a dimension must be, and what came', () => {
		expect(issues({ ...welded, tw: '12' })).toEqual([
			{ path: 'section.tw', message: 'Web thickness (tw) must be a number in mm, not "12".' }
		]);
		expect(issues({ ...welded, tw: undefined })).toEqual([
			{ path: 'section.tw', message: 'Web thickness (tw) is missing: it must be a number in mm.' }
		]);
	});

	it('refuses numbers that are not finite', () => {
		expect(issues({ ...welded, h: Infinity })[0]?.path).toBe('section.h');
		expect(issues({ ...welded, h: NaN })[0]?.path).toBe('section.h');
	});

	it('lists the kinds when the kind is not known', () => {
		const [first] = issues({ ...welded, kind: 'beam' });
		expect(first?.path).toBe('section.kind');
		expect(first?.message).toContain('not "beam"');
		expect(first?.message).toContain('rectangular-hollow');
	});

	it('says so when there is no section', () => {
		expect(issues(undefined)[0]?.message).toMatch(/^Section is missing/);
	});

	it('finds the fault inside a grade given in full', () => {
		const [first] = issues({ ...welded, grade: { fy: 355, fuu: 490 } });
		expect(first?.path).toBe('section.grade.fuu');
		expect(issues({ ...welded, grade: { fu: 490 } })[0]?.path).toBe('section.grade.fy');
		expect(issues({ ...welded, grade: true })[0]?.path).toBe('section.grade');
		const law = { type: 'linear' };
		expect(issues({ ...welded, grade: { fy: 355, law } })[0]?.path).toBe('section.grade.law.type');
	});

	it('takes an outline as regions or as one ring, not both and not neither', () => {
		const outer = [
			[0, 0],
			[10, 0],
			[0, 10]
		];
		expect(issues({ kind: 'outline', outer, grade: 355 })).toEqual([]);
		expect(issues({ kind: 'outline', regions: [{ outer }], grade: 355 })).toEqual([]);
		expect(issues({ kind: 'outline', outer, regions: [{ outer }], grade: 355 })).toHaveLength(1);
		expect(issues({ kind: 'outline', grade: 355 })).toHaveLength(1);
	});

	it('states the limit that a large outline or list of plates passes', () => {
		const outer = Array.from({ length: limits.points - 1 }, (_, i) => [i, i * i]);
		const holes = [
			[
				[0, 0],
				[1, 0]
			]
		];
		expect(issues({ kind: 'outline', outer, holes, grade: 355 })[0]?.message).toContain(
			'2000 points'
		);
		const plate = { name: 'a', width: 10, thickness: 1, y: 0, z: 0, angle: 0 };
		const plates = Array.from({ length: limits.plates + 1 }, () => plate);
		expect(issues({ kind: 'plates', plates, grade: 355 })[0]?.message).toContain('at most 200');
	});
});
