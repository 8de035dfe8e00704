import { describe, expect, it } from 'vitest';
import type { Loop } from '$lib/engine/geometry/boundary';
import { depthOf, extentOf, sideOf, turnedFrame } from './turned-frame';

const circle: Loop = [
	{ kind: 'arc', centre: { y: 10, z: 20 }, radius: 5, start: 0.3, sweep: 2 * Math.PI }
];

describe('the section seen turned', () => {
	it('stands as it is about y', () => {
		const frame = turnedFrame({ y: 1, z: 2 }, 0);
		expect([sideOf(frame, { y: 4, z: 9 }), depthOf(frame, { y: 4, z: 9 })]).toEqual([3, 7]);
	});

	it('has its right side at the bottom about z, where a positive Mz gives tension', () => {
		const frame = turnedFrame({ y: 0, z: 0 }, 90);
		expect(depthOf(frame, { y: 50, z: 0 })).toBe(-50);
		expect(sideOf(frame, { y: 0, z: 30 })).toBe(30);
	});

	it('reaches the sides of a circle however it is turned', () => {
		for (const angle of [0, 17, 45, 90, -63]) {
			const frame = turnedFrame({ y: 10, z: 20 }, angle);
			const { left, right, bottom, top } = extentOf(frame, [circle]);
			for (const [reached, wished] of [
				[left, -5],
				[right, 5],
				[bottom, -5],
				[top, 5]
			] as const)
				expect(reached).toBeCloseTo(wished, 12);
		}
	});

	it('leaves out the side that an arc does not reach', () => {
		const half: Loop = [
			{ kind: 'arc', centre: { y: 0, z: 0 }, radius: 5, start: 0, sweep: Math.PI },
			{ kind: 'line', from: { y: -5, z: 0 }, to: { y: 5, z: 0 } }
		];
		expect(extentOf(turnedFrame({ y: 0, z: 0 }, 0), [half]).bottom).toBeCloseTo(0, 12);
	});
});
