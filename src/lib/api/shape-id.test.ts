import { describe, expect, it } from 'vitest';
import { shapeId } from './shape-id';

describe('shapeId', () => {
	it('joins standard and designation in lower case', () => {
		expect(shapeId('EN 10365', 'IPE 300')).toBe('en10365-ipe-300');
		expect(shapeId('EN 10056-1', 'L 20x20x3')).toBe('en10056-1-l-20x20x3');
	});

	it('reads the sign of multiplication as the letter', () => {
		expect(shapeId('EN 10365', 'UB 457×191×67')).toBe(shapeId('EN 10365', 'UB 457x191x67'));
	});

	it('keeps decimal points, and makes a fraction safe in an address', () => {
		expect(shapeId('EN 10210-2', 'RHS 50x30x2.9')).toBe('en10210-2-rhs-50x30x2.9');
		expect(shapeId('ASTM A6', 'L12X12X1-3/8')).toBe('astma6-l12x12x1-3-8');
	});
});
