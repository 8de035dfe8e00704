import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../../section/definition';
import { lateralTorsional } from './lateral-torsional';
import { canBuckleSideways, stabilityGaps, stabilityNotes } from './member-stability';
import { shearLagNotes } from './shear-lag';
import { testModel } from './test-model';

const grade = 235;
const i = { kind: 'i', fabrication: 'welded', h: 300, b: 150, tw: 8, tf: 12, grade } as const;
const can = (definition: SectionDefinition, moments: { My?: number; Mz?: number }) =>
	canBuckleSideways(testModel(definition).section, moments);

describe('what can buckle sideways', () => {
	it('an I about y, and about z only where z is the stronger axis', () => {
		expect(can(i, { My: 1 })).toBe(true);
		expect(can(i, { Mz: 1 })).toBe(false);
		expect(can({ ...i, h: 120, b: 300, tf: 20 }, { Mz: 1 })).toBe(true);
	});

	it('bars and tubes about their stronger axis; round and square ones never; angles always', () => {
		expect(can({ kind: 'flat', b: 20, h: 60, grade }, { My: 1 })).toBe(true);
		expect(can({ kind: 'flat', b: 20, h: 60, grade }, { Mz: 1 })).toBe(false);
		expect(can({ kind: 'flat', b: 60, h: 20, grade }, { Mz: 1 })).toBe(true);
		expect(can({ kind: 'flat', b: 40, h: 40, grade }, { My: 1, Mz: 1 })).toBe(false);
		expect(can({ kind: 'round', d: 40, grade }, { My: 1 })).toBe(false);
		expect(can({ kind: 'circular-hollow', d: 100, t: 5, grade }, { My: 1 })).toBe(false);
		expect(can({ kind: 'angle', h: 80, b: 80, t: 8, grade }, { Mz: 1 })).toBe(true);
	});
});

describe('what is left unchecked of the member', () => {
	const model = testModel(i);
	const codes = (demand: { My?: number; Mz?: number; N?: number; unbracedLength?: number }) => {
		const outcome = lateralTorsional(model, demand, 'one', 100);
		return stabilityGaps(model, demand, 'one', outcome).map(({ code }) => code);
	};

	it('lateral–torsional buckling once it is checked is no gap, beside a second moment it stays one', () => {
		expect(codes({ My: 10, unbracedLength: 4000 })).toEqual([]);
		expect(codes({ My: 10, Mz: 1, unbracedLength: 4000 })).toEqual(['ltb-not-checked']);
		expect(stabilityGaps(model, { My: 10, unbracedLength: 4000 }, 'one')).toHaveLength(1);
	});

	it('member buckling stays unchecked under compression', () => {
		expect(codes({ N: -10, unbracedLength: 4000 })).toEqual(['member-buckling-not-checked']);
		expect(codes({ N: -10, My: 10, unbracedLength: 4000 })).toEqual([
			'member-buckling-not-checked'
		]);
		expect(codes({ N: 10, unbracedLength: 4000 })).toEqual([]);
	});

	it('demands that are checked need no word of lateral–torsional buckling', () => {
		const demands = [{ My: 10, unbracedLength: 4000 }];
		expect(stabilityNotes(model, demands)).toHaveLength(1);
		expect(stabilityNotes(model, demands, () => true)).toHaveLength(0);
		expect(stabilityNotes(model, [])).toHaveLength(1);
	});

	it('is cited by the edition that was asked for', () => {
		const later = testModel(i, { standard: 'EN1993-1-1:2022' });
		const cited = stabilityGaps(later, { N: -1, My: 1, unbracedLength: 1 }, 'one');
		expect(cited.map(({ clause }) => clause)).toEqual([
			'EN 1993-1-1:2022 8.3.2',
			'EN 1993-1-1:2022 8.3.1'
		]);
		expect(stabilityNotes(later, [{ N: -1, My: 1 }]).map(({ clause }) => clause)).toEqual([
			'EN 1993-1-1:2022 8.3.2',
			'EN 1993-1-1:2022 8.3.1'
		]);
	});
});

describe('shear lag, EN 1993-1-5 3.1', () => {
	it('is mentioned for flanges whose 50 b0 is over 15 depths, with the length', () => {
		// b0 = (b − 8)/2; 15·300/50 = 90: b = 188
		expect(shearLagNotes(testModel({ ...i, b: 188 }))).toEqual([]);
		const [note] = shearLagNotes(testModel({ ...i, b: 188.1 }));
		expect(note).toMatchObject({ code: 'shear-lag' });
		expect(note!.message).toContain('4.5 m');
	});

	it('is not mentioned for rolled sections', () => {
		const wide = { ...i, fabrication: 'rolled', b: 300 } as const;
		expect(shearLagNotes(testModel(wide))).toEqual([]);
	});
});
