import { describe, expect, it } from 'vitest';
import { allowedCode, changesTold } from './allowed-code';
import { openedStudy } from './opened-study';
import { openingBend, openingStudy } from './study';
import { addressText } from './study-address';
import { savedStudy } from './save/saved-study';

const old = { ...openingStudy.code, gammaM0: 0.5, eta: 1.1 };

describe('code values that are no longer allowed', () => {
	it('are moved to the nearest that are, and each is named', () => {
		const { code, changes } = allowedCode(old);
		expect(code).toMatchObject({ gammaM0: 0.9, eta: 1 });
		expect(changes).toEqual(['γM0 from 0.5 to 0.9', 'η from 1.1 to 1']);
		expect(changesTold(changes)).toMatch(/nearest allowed values are used/);
	});

	it('leave allowed ones alone', () => {
		expect(allowedCode(openingStudy.code)).toEqual({ code: openingStudy.code, changes: [] });
		expect(changesTold([])).toBe('');
	});

	it('in a link open the study of the link with a notice', () => {
		const text = addressText({ study: { ...openingStudy, code: old }, bend: openingBend });
		const opened = openedStudy(new URLSearchParams({ study: text }));
		expect(opened.notice).toBe('');
		expect(opened.adjusted).toMatch(/γM0 from 0\.5 to 0\.9/);
		expect(opened.addressed.study.code).toMatchObject({ gammaM0: 0.9, eta: 1 });
	});

	it('of a saved section open as the nearest allowed', () => {
		const { code } = savedStudy({
			definition: openingStudy.section,
			settings: { code: old }
		} as never);
		expect(code).toMatchObject({ gammaM0: 0.9, eta: 1 });
	});
});
