import { describe, expect, it } from 'vitest';
import { stepped, withinLimits } from './number-step';

describe('a press of an arrow', () => {
	it('steps by one shown unit when no step is given, by a sixteenth of an inch in US lengths', () => {
		expect(stepped(400, 1, undefined, 'length', 'si')).toBe(401);
		expect(stepped(25.4, -1, undefined, 'length', 'us')).toBeCloseTo(23.8125, 12);
		expect(stepped(50000, 1, undefined, 'modulus', 'si')).toBe(51000);
	});

	it('leaves no dust behind', () => {
		expect(stepped(0.1, 2, 0.1, 'length', 'si')).toBe(0.3);
	});

	it('asks a step function once a press', () => {
		const double = (value: number, direction: 1 | -1) => (direction > 0 ? value * 2 : value / 2);
		expect(stepped(3, 2, double, 'length', 'si')).toBe(12);
		expect(stepped(12, -2, double, 'length', 'si')).toBe(3);
	});

	it('stops at the limits given', () => {
		expect(withinLimits(5, 10, 20)).toBe(10);
		expect(withinLimits(25, 10, 20)).toBe(20);
		expect(withinLimits(-25)).toBe(-25);
	});
});
