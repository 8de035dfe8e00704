import { describe, expect, it } from 'vitest';
import { curveOfText } from './curve-text';

const read = (...asked: Parameters<typeof curveOfText>) => {
	const curve = curveOfText(...asked);
	if (!curve.ok) throw new Error(curve.error[0]?.message);
	return curve.value;
};
const issues = (...asked: Parameters<typeof curveOfText>) => {
	const curve = curveOfText(...asked);
	return curve.ok ? [] : curve.error;
};

describe('curveOfText', () => {
	it.each([
		['commas', '0.001,200\n0.02,300'],
		['semicolons and decimal commas', '0,001;200,0\r\n0,02;300'],
		['tabs', '0.001\t200\n\n# a remark\n0.02\t300'],
		['spaces', '  1e-3   200\n.02 300'],
		['a header and the origin', 'strain,stress (MPa)\n0,0\n0.001,200\n0.02,300']
	])('reads %s', (_, text) => {
		expect(read(text)).toEqual([
			[0, 0],
			[0.001, 200],
			[0.02, 300]
		]);
	});

	it('takes units from the header, and the choice before the header', () => {
		expect(read('strain %;stress ksi\n0,1;10')[1]![0]).toBeCloseTo(0.001, 15);
		expect(read('strain %;stress ksi\n0,1;10')[1]![1]).toBeCloseTo(68.94757, 5);
		expect(read('ε ‰;σ\n1;200')[1]).toEqual([0.001, 200]);
		expect(read('strain %;stress\n1;200', { strain: 'per-mille' })[1]![0]).toBe(0.001);
	});

	it('names the line of everything that is wrong', () => {
		expect(issues('0.001,200\nabc\n0.0005,210').map(({ path }) => path)).toEqual(['2', '3']);
		expect(issues('')).toHaveLength(1);
		expect(issues('-0.001,-200')[0]?.message).toContain('positive');
	});

	it('refuses a falling curve unless softening is allowed', () => {
		const text = '0.001,200\n0.01,190\n0.02,300';
		expect(issues(text)[0]?.message).toContain('Line 2: the stress falls');
		expect(read(text, { softening: true })).toHaveLength(4);
	});
});
