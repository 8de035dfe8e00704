import { render, screen, within } from '@testing-library/svelte';
import { describe, expect, it } from 'vitest';
import type { ProofCheck } from '$lib/api/proof';
import CheckTable from './CheckTable.svelte';
import { allowedText, differenceText, oursText, printedText } from './proof-figures';

const check: ProofCheck = {
	...{ id: 'a', family: 'catalogue', source: 'AISC Shapes Database', standard: 'ASTM A6' },
	...{ clause: null, fromMemory: true, memoryConfidence: 'medium', case: 'W14X90', remark: null },
	...{ quantity: 'J', unit: 'in⁴', published: 4.06, printed: '4.06', ours: 4.049 },
	...{ difference: -0.011, relativeDifference: -0.011 / 4.06, allowed: 0.0812, use: 0.135 },
	...{ tolerance: 'relative-or-half-digit', why: 'rounded: 2 %', pass: true }
};
const point = { decimal: 'point' } as const;

describe('the table of published values', () => {
	it('names the case, both values, the difference, what is allowed and the result', () => {
		render(CheckTable, { items: [check] });
		const row = screen.getByRole('row', { name: /W14X90/ });
		expect(within(row).getByRole('rowheader').textContent).toContain('from memory, medium');
		const cells = within(row).getAllByRole('cell');
		expect(cells[1]?.textContent).toBe('4.06');
		expect(cells[2]?.textContent).toBe('4.049');
		expect(cells[3]?.textContent).toBe('−0.27 %');
		expect(cells[4]?.textContent).toContain('± 2 %');
		expect(cells[5]?.textContent).toContain('met');
	});

	it('shows a value that is not met, and one that we do not give', () => {
		const none = { ours: null, difference: null, relativeDifference: null, use: null, pass: false };
		render(CheckTable, { items: [{ ...check, ...none }] });
		const row = screen.getByRole('row', { name: /W14X90/ });
		expect(row.textContent).toContain('not met');
		expect(row.textContent).toContain('no figure');
	});
});

describe('figures of a check', () => {
	it('keep the printed digits and take the reader’s decimal mark', () => {
		expect(printedText({ ...check, printed: '0.70' }, { decimal: 'comma' })).toBe('0,70');
		expect(oursText(check, { decimal: 'comma' })).toBe('4,049');
	});

	it('are in the unit where the tolerance is, and words where they are the same', () => {
		const absolute = { ...check, tolerance: 'absolute', allowed: 0.05 } as const;
		expect(differenceText(absolute, point)).toBe('−0.011');
		expect(allowedText(absolute, point)).toBe('± 0.05');
		const exact = { ...check, tolerance: 'exact', difference: 0, relativeDifference: 0 } as const;
		expect(differenceText(exact, point)).toBe('same');
		expect(allowedText(exact, point)).toBe('none');
	});
});
