import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { blockLayout, depthToPx, sideToPx } from './block-layout';

const extent = (width: number, depth: number) => ({
	left: -width / 2,
	right: width / 2,
	bottom: -depth / 2,
	top: depth / 2
});
const size = fc.double({ min: 5, max: 5000, noNaN: true });

describe('the layout of the drawing', () => {
	it('keeps every section within its column and the sheet, whatever its proportions', () => {
		fc.assert(
			fc.property(size, size, fc.constantFrom(366, 480, 720, 1100), (width, depth, sheet) => {
				const layout = blockLayout(sheet, 430, extent(width, depth));
				expect(layout.top).toBeGreaterThan(40);
				expect(layout.bottom).toBeLessThan(430 - 30);
				expect(layout.steel.left).toBeGreaterThanOrEqual(layout.gutterX);
				expect(layout.steel.right).toBeLessThanOrEqual(layout.strain.x + 1e-6);
			})
		);
	});

	it('has one scale for depth and width', () => {
		const layout = blockLayout(720, 600, extent(400, 940));
		const wide = (sideToPx(layout, 200) ?? 0) - (sideToPx(layout, -200) ?? 0);
		const deep = depthToPx(layout, -470) - depthToPx(layout, 470);
		expect(wide / deep).toBeCloseTo(400 / 940, 9);
	});

	it('breaks a flat bar off so that its depth can be read', () => {
		const layout = blockLayout(720, 600, extent(200, 10));
		expect(layout.windows).toHaveLength(3);
		expect(layout.bottom - layout.top).toBeGreaterThan(100);
		expect(sideToPx(layout, -100)).toBeCloseTo(layout.steel.left, 6);
		expect(sideToPx(layout, 100)).toBeCloseTo(layout.steel.right, 6);
		expect(sideToPx(layout, -60)).toBeNull();
	});
});
