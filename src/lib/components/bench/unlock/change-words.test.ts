import { describe, expect, it } from 'vitest';
import { changeWords } from './change-words';

const si = { system: 'si', decimal: 'comma' } as const;
const us = { system: 'us', decimal: 'point' } as const;

describe('a change in words', () => {
	it('names plate, both sizes and what they measure', () => {
		const change = { part: 'flanges', field: 'b', from: 400, to: 350 };
		expect(changeWords(change, si)).toBe('Flanges 400 → 350\u00a0mm wide');
		// 400/25.4 and 350/25.4
		expect(changeWords(change, us)).toBe('Flanges 15.748 → 13.78\u00a0in wide');
	});

	it('says so where stiffeners are put in', () => {
		const change = { part: 'stiffeners', field: 'spacing', from: 0, to: 1500 };
		expect(changeWords(change, si)).toBe('Stiffeners put in, 1500\u00a0mm apart');
	});

	it('takes thickness for every other field, and a free plate by its own name', () => {
		const change = { part: 'Top cover', field: 'thickness', from: 12, to: 15 };
		expect(changeWords(change, si)).toBe('Top cover 12 → 15\u00a0mm thick');
	});
});
