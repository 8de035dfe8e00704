import { describe, expect, it } from 'vitest';
import { proofCheck, type ProofSource, type ProofValue } from './check';

const source: ProofSource = {
	...{ family: 'catalogue', source: 'a table', standard: 'a standard', clause: null },
	...{ fromMemory: false, memoryConfidence: null }
};
const value = (change: Partial<ProofValue>): ProofValue => ({
	...{ id: 'a', case: 'IPE 300', quantity: 'A', unit: 'cm²', published: 50, ours: 50 },
	tolerance: { kind: 'relative', value: 0.01, why: 'rounded' },
	...change
});

describe('a published value and ours', () => {
	it('passes on the limit and fails beyond it', () => {
		expect(proofCheck(source, value({ ours: 50.5 })).pass).toBe(true);
		const beyond = proofCheck(source, value({ ours: 50.51 }));
		expect(beyond.pass).toBe(false);
		expect(beyond.use).toBeCloseTo(1.02, 9);
		expect(beyond.relativeDifference).toBeCloseTo(0.0102, 9);
	});

	it('never passes without a figure of ours, or with one that is no number', () => {
		expect(proofCheck(source, value({ ours: null })).pass).toBe(false);
		expect(proofCheck(source, value({ ours: Number.NaN })).pass).toBe(false);
	});

	it('takes half the last digit where that is more than the share', () => {
		const tolerance = {
			kind: 'relative-or-half-digit',
			value: 0.01,
			halfDigit: 0.05,
			why: ''
		} as const;
		expect(proofCheck(source, value({ published: 0.7, ours: 0.749, tolerance })).pass).toBe(true);
		expect(proofCheck(source, value({ published: 50, ours: 50.4, tolerance })).pass).toBe(true);
	});

	it('holds words and exact numbers to be the same', () => {
		const exact = { kind: 'exact' } as const;
		expect(proofCheck(source, value({ published: 'yes', ours: 'no', tolerance: exact })).pass).toBe(
			false
		);
		expect(
			proofCheck(source, value({ published: 'yes', ours: 'yes', tolerance: exact })).pass
		).toBe(true);
		expect(proofCheck(source, value({ published: 2, ours: 3, tolerance: exact })).pass).toBe(false);
	});
});
