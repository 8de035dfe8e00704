import { describe, expect, it } from 'vitest';
import { blockPath, knotsBetween, signedKnots } from './block-path';
import { breakLine } from './break-line';
import { coupleLayout } from './couple-layout';
import { levelDimension, uprightDimension } from './dimension-line';
import { edgeStresses } from './edge-labels';
import { strainSpan } from './span-steps';
import { tintStops } from './tint-stops';

const same = (value: number) => value;
const knots = [
	{ depth: 10, stress: -100 },
	{ depth: -10, stress: 100 }
];

describe('dimension lines', () => {
	it('have a tick at each end and their figure in the middle', () => {
		const line = uprightDimension(20, 100, 300);
		expect(line.path.match(/M/g)).toHaveLength(3);
		expect(line.label).toEqual({ x: 20, y: 200 });
	});

	it('reach outside where their ends are near each other', () => {
		expect(levelDimension(5, 100, 104).outside).toBe(true);
		expect(levelDimension(5, 100, 104).path).toContain('M91.0 5.0L113.0 5.0');
	});
});

describe('the path of a stress block', () => {
	it('closes on the zero line', () => {
		expect(blockPath(knots, same, same)).toBe(
			'M0.00 10.00L-100.00 10.00L100.00 -10.00L0.00 -10.00Z'
		);
	});

	it('keeps one side of zero', () => {
		expect(signedKnots(knots, 1).map(({ stress }) => stress)).toEqual([0, 100]);
	});

	it('is cut at a depth with the stress that stands there', () => {
		expect(knotsBetween(knots, 5, -10)).toEqual([
			{ depth: 5, stress: -50 },
			{ depth: -10, stress: 100 }
		]);
	});
});

describe('stresses at plate edges', () => {
	const block = { top: 10, bottom: -10, knots, yielded: [], beside: false };

	it('are read at edges inside a block too', () => {
		expect(edgeStresses([block], [10, 4, -10], 0)).toEqual([
			{ depth: 10, stress: -100, side: 'left' },
			{ depth: 4, stress: -40, side: 'left' },
			{ depth: -10, stress: 100, side: 'right' }
		]);
	});

	it('are written once where the same figure would stand twice at one place', () => {
		expect(edgeStresses([block, block], [10, -10], 0.5)).toHaveLength(2);
	});
});

describe('the couple', () => {
	const column = { x: 0, width: 100, middle: 50 };

	it('draws compression to the left and tension to the right, with the arm between', () => {
		const { arrows, arm } = coupleLayout(column, { top: 0, bottom: 400 }, [
			{ force: -500, y: 50 },
			{ force: 500, y: 350 }
		]);
		expect(arrows.map(({ sense }) => sense)).toEqual(['compression', 'tension']);
		expect(arm?.y).toBe(200);
	});

	it('has no arm when all is in tension', () => {
		expect(
			coupleLayout(column, { top: 0, bottom: 400 }, [null, { force: 9, y: 5 }]).arm
		).toBeNull();
	});
});

describe('the tint of elastic steel', () => {
	it('deepens with stress and changes colour at zero', () => {
		const law = { kinks: [], offsets: [], slopes: [], yieldTension: 1, yieldCompression: 1 };
		const part = { name: 'web', top: 10, bottom: -10, law, fy: 200, fyc: 200 };
		const stops = tintStops({
			part,
			yielded: [],
			knots: [
				{ depth: 10, stress: -200 },
				{ depth: 0, stress: 0 },
				{ depth: -10, stress: 100 }
			]
		});
		expect(stops.map(({ at, sense }) => [at, sense])).toEqual([
			[0, 'compression'],
			[0.5, 'compression'],
			[0.5, 'tension'],
			[1, 'tension']
		]);
		expect(stops[0]?.opacity).toBeGreaterThan(stops[3]?.opacity ?? 1);
	});
});

describe('small parts of the drawing', () => {
	it('breaks off with one zigzag', () => {
		expect(breakLine(50, 0, 60).match(/L/g)).toHaveLength(5);
	});

	it('scales strain in steps, so that it does not creep while bending', () => {
		expect([0.5, 2.1, 2.4, 4, 9, 11].map(strainSpan)).toEqual([1.25, 2.5, 2.5, 5, 12, 12]);
	});
});
