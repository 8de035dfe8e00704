import { describe, expect, it } from 'vitest';
import type { SectionConflict, SectionRecord } from '$lib/api/sections';
import { openingStudy, type Study } from '../study';
import { conflictRows } from './conflict-rows';
import { saveAct, saveReason } from './save-act';
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
	const all = { create: true, change: true };

	it('asks for a sign-in, then for a name, then saves over what is open', () => {
		expect([
			saveAct(false, false, all),
			saveAct(true, false, all),
			saveAct(true, true, all)
		]).toEqual(['sign-in', 'name', 'over']);
	});

	it('of a designer makes a new section of an approved one, and says why', () => {
		const act = saveAct(true, true, { create: true, change: false });
		expect(act).toBe('copy');
		expect(saveReason(act, 'designer', 'approved')).toMatch(/^This section is approved: .* as new/);
	});

	it('is not offered to a reader, who is told why', () => {
		const none = { create: false, change: false };
		expect([saveAct(true, false, none), saveAct(true, true, none)]).toEqual(['none', 'none']);
		expect(saveReason('none', 'reader', null)).toMatch(/^As reader you may look/);
		expect(saveReason('none', null, null)).toMatch(/no firm/);
	});
});

describe('two versions of one section', () => {
	const si = { system: 'si', decimal: 'point' } as const;
	const settings = (My: number) => ({
		demands: [{ name: 'Dead load' }, { name: 'Hoist at mid-span', My }]
	});
	const conflict = {
		yours: {
			version: 1,
			definition: { ...study.section, tw: 15.5 },
			settings: settings(111)
		},
		theirs: { name: 'Girder', version: 2, definition: study.section, settings: settings(222) }
	} as unknown as SectionConflict;

	it('are told apart in the words of the form, with units', () => {
		expect(conflictRows(conflict, si)).toEqual([
			{ name: 'Web thickness', theirs: '14\u00a0mm', yours: '15.5\u00a0mm' },
			{ name: 'Hoist at mid-span, My', theirs: '222\u00a0kNm', yours: '111\u00a0kNm' }
		]);
	});

	it('are told apart in the units and with the decimal mark of the reader', () => {
		const [thickness] = conflictRows(conflict, { system: 'us', decimal: 'comma' });
		// 14 / 25.4 and 15.5 / 25.4
		expect(thickness).toEqual({
			name: 'Web thickness',
			theirs: '0,551181\u00a0in',
			yours: '0,610236\u00a0in'
		});
	});
});
