import { describe, expect, it } from 'vitest';
import { proofQuerySchema } from '../../api/proof';
import { proofCheck, type ProofSource } from './check';
import type { Proof } from './proof';
import { csvLines } from './proof-csv';
import { checksAsked } from './proof-list';

const source: ProofSource = {
	...{ family: 'catalogue', source: 'a table', standard: 'EN 10365:2017', clause: null },
	...{ fromMemory: false, memoryConfidence: null }
};
const check = (id: string, ours: number | null, change: Partial<ProofSource> = {}) =>
	proofCheck(
		{ ...source, ...change },
		{
			...{ id, case: `Bar ${id} 40×120`, quantity: 'A', unit: '', published: 100, ours },
			tolerance: { kind: 'relative', value: 0.01, why: 'rounded' }
		}
	);
const checks = [
	check('close', 100.1),
	check('far', 100.9),
	check('wrong', 110, { fromMemory: true }),
	check('none', null, { family: 'shear' })
];
const all: Proof = { engineVersion: '1', checks, families: [] };
const asked = (query: Record<string, string>) =>
	checksAsked(all, proofQuerySchema.parse(query)).map(({ id }) => id);

describe('the checks asked for', () => {
	it('stand in the order of the registry', () =>
		expect(asked({})).toEqual(['close', 'far', 'wrong', 'none']));

	it('are narrowed by family, memory and result', () => {
		expect(asked({ family: 'shear' })).toEqual(['none']);
		expect(asked({ memory: 'only' })).toEqual(['wrong']);
		expect(asked({ memory: 'without' })).toEqual(['close', 'far', 'none']);
		expect(asked({ result: 'failed' })).toEqual(['wrong', 'none']);
	});

	it('have every word looked for, a typed x standing for ×', () => {
		expect(asked({ q: '40x120 FAR' })).toEqual(['far']);
		expect(asked({ q: 'far close' })).toEqual([]);
	});

	it('come with failures first when sorted by difference', () =>
		expect(asked({ sort: 'difference' })).toEqual(['none', 'wrong', 'far', 'close']));

	it('refuse a parameter that is not known', () =>
		expect(proofQuerySchema.safeParse({ famly: 'shear' }).success).toBe(false));
});

describe('the CSV file', () => {
	it('lets no text be taken for a formula, and keeps negative numbers numbers', () => {
		const lines = csvLines([{ ...check('=1+1', 99.5), case: '@sum', remark: '-2' }]);
		expect(lines).toContain("'=1+1");
		expect(lines).toContain("'@sum");
		expect(lines).toContain("'-2");
		expect(lines).toContain(',-0.5,');
	});
});
