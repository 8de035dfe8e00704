import { describe, expect, it } from 'vitest';
import { blockLayout } from './block-layout';
import { polygonPath } from './loop-path';
import { removedLabelPlace } from './removed-label';
import { turnedFrame } from './turned-frame';

const frame = turnedFrame({ y: 0, z: 0 }, 0);
const layout = blockLayout(700, 600, { left: -200, right: 200, bottom: -500, top: 500 });
const rectangle = (y: number, z: number, width: number, height: number) => [
	{ y: y - width / 2, z: z - height / 2 },
	{ y: y + width / 2, z: z - height / 2 },
	{ y: y + width / 2, z: z + height / 2 },
	{ y: y - width / 2, z: z + height / 2 }
];
const middle = (layout.steel.left + layout.steel.right) / 2;

describe('the words at what is not counted', () => {
	it('stand to the right of a strip of web, level with its middle', () => {
		const place = removedLabelPlace([rectangle(0, 250, 10, 200)], frame, layout, 66);
		expect(place?.anchor).toBe('start');
		expect(place?.x).toBeGreaterThan(middle);
		expect(place?.lead.y).toBeCloseTo(layout.top + 250 * layout.pxPerMm, 6);
	});

	it('keep away from the figure of the web’s thickness', () => {
		const strip = [rectangle(0, 250, 10, 400)];
		const y = removedLabelPlace(strip, frame, layout, 66)!.lead.y;
		const moved = removedLabelPlace(strip, frame, layout, 66, [y + 5])!.lead.y;
		expect(Math.abs(moved - (y + 5))).toBeGreaterThanOrEqual(18);
	});

	it('stand under a strip of the top flange and over one of the bottom flange', () => {
		const top = removedLabelPlace([rectangle(150, 490, 100, 20)], frame, layout, 66)!;
		expect(top.y).toBeGreaterThan(layout.top + 20 * layout.pxPerMm);
		const bottom = removedLabelPlace([rectangle(150, -490, 100, 20)], frame, layout, 66)!;
		expect(bottom.y).toBeLessThan(layout.bottom - 20 * layout.pxPerMm);
	});

	it('stay within the column of the section', () => {
		const tip = removedLabelPlace([rectangle(190, 490, 20, 20)], frame, layout, 66)!;
		expect(tip.x + 33).toBeLessThanOrEqual(layout.section.x + layout.section.width);
	});

	it('name the largest strip, and are left out where there is none', () => {
		const strips = [rectangle(150, 490, 40, 20), rectangle(0, 250, 10, 400)];
		expect(removedLabelPlace(strips, frame, layout, 66)?.anchor).toBe('start');
		expect(removedLabelPlace([], frame, layout, 66)).toBeNull();
	});
});

it('draws a polygon with z upward', () => {
	expect(
		polygonPath(
			[
				{ y: 0, z: 0 },
				{ y: 2, z: 0 },
				{ y: 2, z: 3 }
			],
			{ y: 1, z: 1 }
		)
	).toBe('M-1 1L1 1L1 -2Z');
});
