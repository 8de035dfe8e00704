import { describe, expect, it } from 'vitest';
import { shapeId } from './shape-id';
import { searchableShape, searchShapes } from './shape-search';
import { foldedName } from './shape-names';

const shape = (standard: string, family: string, designation: string) =>
	searchableShape([shapeId(standard, designation), designation, family, standard, 1, 1, 1]);

const shapes = [
	...['IPE 80', 'IPE 360', 'IPE 300', 'IPE 330', 'IPE 100'].map((name) =>
		shape('EN 10365', 'IPE', name)
	),
	...['IPE A 300', 'IPE A 330'].map((name) => shape('EN 10365', 'IPE A', name)),
	...['HE 300 A', 'HE 1000 A'].map((name) => shape('EN 10365', 'HE A', name)),
	...['HE 300 B', 'HE 300 M'].map((name) => shape('EN 10365', 'HE', name)),
	...['UB 457x191x67', 'UB 457x191x161', 'UB 457x152x67', 'UB 610x229x101'].map((name) =>
		shape('EN 10365', 'UB', name)
	),
	...['W14X730', 'W14X22', 'W4X13'].map((name) => shape('ASTM A6', 'W', name)),
	...['WT7X365', 'WT22X167.5'].map((name) => shape('ASTM A6', 'WT', name)),
	...['HSS20.000X0.500', 'HSS24X12X3/4'].map((name) => shape('ASTM A500', 'HSS', name)),
	...['RHS 50x30x2.9', 'RHS 50x30x3'].map((name) => shape('EN 10210-2', 'RHS', name)),
	...['L 20x20x3', 'L 200x200x20'].map((name) => shape('EN 10056-1', 'L equal', name))
];
const found = (query: string, most?: number) =>
	searchShapes(shapes, query, most).map((row) => row[1]);

describe('searchShapes', () => {
	it('completes a number that is half typed, in the order of the tables', () => {
		expect(found('ipe 3').slice(0, 3)).toEqual(['IPE 300', 'IPE 330', 'IPE 360']);
		expect(found('IPE3').slice(0, 3)).toEqual(['IPE 300', 'IPE 330', 'IPE 360']);
	});

	it('puts the whole name before those that only begin with it', () => {
		expect(found('ipe 300')[0]).toBe('IPE 300');
		expect(found('rhs 50x30x2,9')[0]).toBe('RHS 50x30x2.9');
		expect(found('l 20x20x3')[0]).toBe('L 20x20x3');
	});

	it('finds American shapes by depth, and no tees among them', () => {
		expect(found('w14x')).toEqual(['W14X22', 'W14X730']);
		expect(found('w14')).toEqual(['W14X22', 'W14X730']);
	});

	it('puts a finished number before one that goes on', () => {
		expect(found('l 20')).toEqual(['L 20x20x3', 'L 200x200x20']);
	});

	it('knows the other ways of writing a name', () => {
		expect(found('hea300')[0]).toBe('HE 300 A');
		expect(found('HEA 300')[0]).toBe('HE 300 A');
		expect(found('he a').slice(0, 2)).toEqual(['HE 300 A', 'HE 1000 A']);
		expect(found('457x191x67 ub')).toEqual(['UB 457x191x67']);
		expect(found('UB 457×191×67')).toEqual(['UB 457x191x67']);
	});

	it('finds a shape by its numbers alone', () => {
		expect(found('457x191x67')).toEqual(['UB 457x191x67']);
		expect(found('ub 457')).toEqual(['UB 457x152x67', 'UB 457x191x67', 'UB 457x191x161']);
		expect(found('57x191')).toEqual([]);
	});

	it('takes words in any order', () => {
		expect(found('300 ipe')[0]).toBe('IPE 300');
		expect(found('67 ub')).toEqual(['UB 457x152x67', 'UB 457x191x67']);
	});

	it('forgives idle zeros and a missing nought', () => {
		expect(found('hss20x.5')).toEqual(['HSS20.000X0.500']);
		expect(found('hss 24x12x3/4')).toEqual(['HSS24X12X3/4']);
		expect(found('wt22x167.5')).toEqual(['WT22X167.5']);
	});

	it('answers nothing with nothing, and holds to the number asked', () => {
		expect(found('  ')).toEqual([]);
		expect(found('zzz')).toEqual([]);
		expect(found('ipe', 2)).toEqual(['IPE 80', 'IPE 100']);
	});
});

describe('foldedName', () => {
	it('leaves whole numbers alone', () => {
		expect(foldedName('IPE 300')).toBe('ipe300');
		expect(foldedName('HSS20.000X0.500')).toBe('hss20x0.5');
		expect(foldedName('20.')).toBe('20');
	});
});
