import { describe, expect, it } from 'vitest';
import { defaultPreferences } from '$lib/units';
import { interactionCsv, interactionSvg } from './interaction-files';
import { casePoint, type Series } from './interaction-model';

const series: Series[] = [
	{
		key: 'cases',
		title: 'Demand cases',
		points: [casePoint({ name: 'Wind, up', N: -100.5, My: 20 }, 'N-My', 0)]
	},
	{
		key: 'code',
		title: 'Counted by the code',
		points: [{ N: 1, My: 2, Mz: 0 }, null, { N: 3, My: 4, Mz: 0 }]
	}
];

describe('interaction as files', () => {
	it('is a CSV with a head, quoted names and no broken points', () => {
		expect(interactionCsv(series, { ...defaultPreferences, system: 'si', decimal: 'point' })).toBe(
			'curve,case,N (kN),My (kNm),Mz (kNm)\r\n' +
				'Demand cases,"Wind, up",-100.5,20,0\r\n' +
				'Counted by the code,,1,2,0\r\nCounted by the code,,3,4,0\r\n'
		);
	});

	it('parts by semicolons where the decimals take the comma', () => {
		const text = interactionCsv(series, { ...defaultPreferences, system: 'si', decimal: 'comma' });
		expect(text).toContain('Demand cases;Wind, up;-100,5;20;0');
	});

	it('is a picture that stands by itself, its names made safe', () => {
		const named = [{ ...series[0]!, points: [casePoint({ name: '<b>', N: 1, My: 2 }, 'N-My', 0)] }];
		const svg = interactionSvg(named, 'N-My', 'A & B', defaultPreferences);
		expect(svg).toMatch(/^<svg xmlns=/);
		expect(svg).toContain('&lt;b&gt;');
		expect(svg).toContain('A &amp; B');
	});

	it('tells a case that is not in the plane', () => {
		expect(casePoint({ name: 'a', My: 1, Mz: 1 }, 'N-My', 0).offPlane).toBe(true);
		expect(casePoint({ name: 'a', My: 1, N: -5 }, 'My-Mz', -5).offPlane).toBe(false);
	});
});
