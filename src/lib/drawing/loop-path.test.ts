import { describe, expect, it } from 'vitest';
import type { Loop } from '$lib/engine/geometry/boundary';
import { loopsPath } from './loop-path';

const square: Loop = [
	{ kind: 'line', from: { y: 0, z: 0 }, to: { y: 2, z: 0 } },
	{ kind: 'line', from: { y: 2, z: 0 }, to: { y: 2, z: 2 } },
	{ kind: 'line', from: { y: 2, z: 2 }, to: { y: 0, z: 0 } }
];

describe('the path of a loop', () => {
	it('turns z upward and measures from the origin given', () => {
		expect(loopsPath([square], { y: 1, z: 1 })).toBe('M-1 1L1 1L1 -1L-1 1Z');
	});

	it('keeps an arc an arc, anticlockwise as it is seen', () => {
		const quarter: Loop = [
			{ kind: 'arc', centre: { y: 0, z: 0 }, radius: 3, start: 0, sweep: Math.PI / 2 }
		];
		expect(loopsPath([quarter])).toBe('M3 0A3 3 0 0 0 0 -3Z');
	});

	it('turns the other way for a clockwise arc', () => {
		const quarter: Loop = [
			{ kind: 'arc', centre: { y: 0, z: 0 }, radius: 3, start: Math.PI / 2, sweep: -Math.PI / 2 }
		];
		expect(loopsPath([quarter])).toBe('M0 -3A3 3 0 0 1 3 0Z');
	});

	it('divides a full circle, which one arc could not draw', () => {
		const circle: Loop = [
			{ kind: 'arc', centre: { y: 0, z: 0 }, radius: 1, start: 0, sweep: 2 * Math.PI }
		];
		expect(loopsPath([circle]).match(/A/g)).toHaveLength(3);
	});
});
