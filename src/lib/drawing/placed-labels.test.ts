import { describe, expect, it } from 'vitest';
import { placedLabels } from './placed-labels';

const room = { left: 0, right: 300, top: 0, bottom: 200 };

describe('labels with a place of their own', () => {
	it('never overlap and stay within the room', () => {
		const wishes = Array.from({ length: 60 }, (_, i) => ({
			key: `${i}`,
			text: `plate ${i}`,
			x: 150 + (i % 7),
			y: 100 + (i % 5)
		}));
		const placed = placedLabels(wishes, room, 11);
		expect(placed.length).toBeGreaterThan(5);
		for (const [i, p] of placed.entries()) {
			expect(p.x - p.width / 2).toBeGreaterThanOrEqual(room.left);
			expect(p.y + p.height / 2).toBeLessThanOrEqual(room.bottom);
			for (const q of placed.slice(i + 1)) {
				const apart =
					Math.abs(p.x - q.x) >= (p.width + q.width) / 2 ||
					Math.abs(p.y - q.y) >= (p.height + q.height) / 2;
				expect(apart).toBe(true);
			}
		}
	});

	it('give the ones that must be seen their own point', () => {
		const wishes = ['a', 'b'].map((key) => ({ key, text: key, x: 50, y: 50, must: key === 'b' }));
		const b = placedLabels(wishes, room, 11).find(({ key }) => key === 'b');
		expect(b).toMatchObject({ x: 50, y: 50, moved: false });
	});
});
