import { describe, expect, it } from 'vitest';
import { pointLabelPlaces } from './point-labels';

describe('names beside points', () => {
	const frame = { width: 300, height: 200 };

	it('stand to the right where there is room', () => {
		expect(pointLabelPlaces([{ x: 100, y: 100, width: 50 }], frame)).toEqual([{ x: 109, y: 100 }]);
	});

	it('never overlap each other, even of points at one place', () => {
		const points = Array.from({ length: 5 }, () => ({ x: 150, y: 100, width: 60 }));
		const boxes = pointLabelPlaces(points, frame).filter((place) => place !== null);
		expect(boxes.length).toBeGreaterThan(3);
		boxes.forEach((a, i) =>
			boxes
				.slice(i + 1)
				.forEach((b) => expect(Math.abs(a.x - b.x) >= 60 || Math.abs(a.y - b.y) >= 14).toBe(true))
		);
	});

	it('stay within the frame', () => {
		const [place] = pointLabelPlaces([{ x: 290, y: 100, width: 80 }], frame);
		expect((place?.x ?? 300) + 80).toBeLessThanOrEqual(300);
	});
});
