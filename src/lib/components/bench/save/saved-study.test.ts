import { describe, expect, it } from 'vitest';
import type { SectionConflict, SectionRecord } from '$lib/api/sections';
import { openingStudy, type Study } from '../study';
import { conflictRows } from './conflict-rows';
import { saveAct } from './save-act';
import { savedStudy, sectionToSave } from './saved-study';

const study: Study = {
	...openingStudy,
	shape: 'IPE 300',
	strengthBasis: 'code-table',
	demands: [{ name: 'Wind', My: 12 }, { name: 'Snow' }]
};

describe('a study on the Rack', () => {
	it('comes back as it was saved', () => {
		const { definition, settings } = sectionToSave(study);
		expect(savedStudy({ definition, settings } as SectionRecord)).toEqual(study);
	});

	it('opens with the usual choices where none were saved', () => {
		const opened = savedStudy({ definition: study.section, settings: {} } as SectionRecord);
		expect(opened.demands).toEqual([{ name: 'Case 1' }]);
		expect(opened.strengthBasis).toBe('product-standard');
	});
});

describe('pressing Save', () => {
	it('asks for a sign-in, then for a name, then saves over what is open', () => {
		expect([saveAct(false, false), saveAct(true, false), saveAct(true, true)]).toEqual([
			'sign-in',
			'name',
			'over'
		]);
	});
});

describe('two versions of one section', () => {
	it('are told apart field by field', () => {
		const conflict = {
			yours: { version: 1, definition: { ...study.section, tw: 16 }, settings: {} },
			theirs: { name: 'Girder', version: 2, definition: study.section, settings: {} }
		} as unknown as SectionConflict;
		expect(conflictRows(conflict)).toEqual([{ name: 'tw', theirs: '14', yours: '16' }]);
	});
});
