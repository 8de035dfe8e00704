import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { spreadLabels } from './label-places';

const label = fc.record({
	at: fc.double({ min: -50, max: 450, noNaN: true }),
	size: fc.integer({ min: 4, max: 30 })
});

describe('labels spread along a line', () => {
	it('stay where they want to be while none meets another', () => {
		const places = spreadLabels(
			[
				{ at: 100, size: 10 },
				{ at: 40, size: 10 }
			],
			0,
			400
		);
		expect(places).toEqual([100, 40]);
	});

	it('move apart by the same amount when two want one place', () => {
		const places = spreadLabels(
			[
				{ at: 100, size: 12 },
				{ at: 100, size: 12 }
			],
			0,
			400,
			0
		);
		expect(places).toEqual([94, 106]);
	});

	it('never overlap, keep their order and stay inside while they fit', () => {
		fc.assert(
			fc.property(fc.array(label, { maxLength: 12 }), (labels) => {
				const places = spreadLabels(labels, 0, 450);
				const boxes = labels
					.map(({ at, size }, index) => ({ at, size, middle: places[index] ?? NaN }))
					.sort((a, b) => a.middle - b.middle);
				const room = labels.reduce((sum, { size }) => sum + size + 2, 0) <= 450;
				boxes.forEach((box, index) => {
					const next = boxes[index + 1];
					if (next) {
						expect(box.middle + box.size / 2).toBeLessThanOrEqual(
							next.middle - next.size / 2 + 1e-6
						);
						expect(box.at).toBeLessThanOrEqual(next.at);
					}
					if (room) {
						expect(box.middle - box.size / 2).toBeGreaterThanOrEqual(-1e-6);
						expect(box.middle + box.size / 2).toBeLessThanOrEqual(450 + 1e-6);
					}
				});
			})
		);
	});
});
