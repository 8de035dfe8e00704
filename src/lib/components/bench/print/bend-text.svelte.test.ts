import { expect, it } from 'vitest';
import { defaultPreferences } from '$lib/units';
import { Bench } from '../bench.svelte';
import { openingAddressed } from '../opened-study';
import { bendText } from './bend-text';

it('says nothing of steel that is as usual and was never bent', () => {
	expect(bendText(new Bench(openingAddressed), defaultPreferences)).toEqual([]);
});

it('names residual stress, turns and law where they are on', () => {
	const { study, bend } = openingAddressed;
	const section = {
		...study.section,
		grade: { fy: 345, fu: 470, law: { type: 'bilinear', Eh: 2100 } }
	} as const;
	const bench = new Bench({
		study: { ...study, section, residual: 'welded' },
		bend: { ...bend, turns: [3, 'release'], atTurn: true }
	});
	const text = bendText(bench, defaultPreferences).join('\n');
	expect(text).toContain('Stress–strain law: bilinear.');
	expect(text).toContain('With welded residual stress.');
	expect(text).toMatch(/Bent before: to 3.* κy \(.*kNm\); let go, staying at .* κy\./);
});
