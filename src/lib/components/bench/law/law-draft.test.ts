import { describe, expect, it } from 'vitest';
import { draftOf, gradeOfDraft, lawPresets, opening, type LawDraft } from './law-draft';

const steel: LawDraft = { ...opening, type: 'bilinear', fy: 355, fu: 490, E: 210_000 };

describe('a law while it is put together', () => {
	it('makes a grade that opens as the same draft', () => {
		const made = gradeOfDraft(steel);
		if (!made.ok) throw new Error('makes no grade');
		expect(made.value.grade).toEqual({
			...{ fy: 355, fu: 490, E: 210_000 },
			law: { type: 'bilinear', Eh: 2100 }
		});
		expect(draftOf(made.value.grade, 20, 'product-standard')).toEqual(steel);
	});

	it('begins from a named grade with its strengths at the thickness', () => {
		// EN 10025-2: S355 above 16 mm, 345 N/mm².
		expect(draftOf('S355', 20, 'product-standard')).toMatchObject({
			fy: 345,
			type: 'elastic-plastic'
		});
	});

	it('names the wrong lines of a test curve', () => {
		const made = gradeOfDraft({ ...steel, type: 'curve', curve: '0.001 200\nx 300\n0.01 250' });
		expect(made).toEqual({ ok: false, error: [expect.stringMatching(/^Line 2:/)] });
	});

	it('says in words why numbers make no law', () => {
		const made = gradeOfDraft({ ...steel, type: 'quad-linear', fu: null });
		expect(made).toEqual({
			ok: false,
			error: ['The quad-linear law needs fu: give fu with the grade.']
		});
	});

	it.each(lawPresets)('opens $title ready to use, its source named', ({ values, source }) => {
		expect(gradeOfDraft({ ...steel, ...values }).ok).toBe(true);
		expect(source).toMatch(/From memory\.$/);
	});
});
