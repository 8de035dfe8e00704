import { describe, expect, it } from 'vitest';
import { lateralTorsional } from '../../src/lib/engine/rules/en1993/lateral-torsional';
import { shearResistances } from '../../src/lib/engine/rules/en1993/shear-resistance';
import { testModel } from '../../src/lib/engine/rules/en1993/test-model';
import { figure, workedExample } from './en1993-example';

describe('what follows from the figures of published examples', () => {
	const sh01 = workedExample('SH01');
	it('SH01: flanges give nothing where no moment says how far they are used', () => {
		const sizes = { h: figure(sh01.inputs, 'hw') + 40, b: 400, tf: 20 };
		const tw = figure(sh01.inputs, 'tw');
		const grade = figure(sh01.inputs, 'fyw');
		const girder = testModel({ kind: 'i', fabrication: 'welded', ...sizes, tw, grade });
		expect(shearResistances(girder, true).z!.buckling!.Vbf).toBe(0);
	});

	it('762×267×173 UB over 3.2 m (Gardner & Nethercot, Example 6.8, from memory) follows curve b', () => {
		const sizes = { h: 762.2, b: 266.7, tw: 14.3, tf: 21.6, r: 16.5 };
		const model = testModel({ kind: 'i', fabrication: 'rolled', ...sizes, grade: 275 });
		const demand = { My: 1362, unbracedLength: 3200, C1: 1.052 };
		const { value } = lateralTorsional(model, demand, 'BC', model.moments.plusMy.plastic.moment!);
		expect(value!.curve).toBe('b');
	});
});
