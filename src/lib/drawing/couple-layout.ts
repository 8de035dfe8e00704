import type { Column } from './block-layout';
import { uprightDimension } from './dimension-line';

/** A resultant: force in kN (tension positive) at a height, px. */
export interface DrawnForce {
	readonly force: number;
	readonly y: number;
}

export interface ForceArrow {
	readonly sense: 'tension' | 'compression';
	readonly force: number;
	readonly path: string;
	readonly labelY: number;
}

export interface CoupleLayout {
	readonly arrows: readonly ForceArrow[];
	/** Dimension line of the lever arm, clear of the arrows. */
	readonly arm: {
		readonly path: string;
		readonly x: number;
		readonly y: number;
		readonly room: number;
	} | null;
}

const shaft = 2.5;
const head = { length: 11, half: 6 };
const n = (value: number) => value.toFixed(1);

/**
 * Arrows of the resultants, as long as their share of the greater force: compression pushes left,
 * tension pulls right; figures stand outside the pair, the lever arm between.
 */
export function coupleLayout(
	column: Column,
	steel: { top: number; bottom: number },
	forces: readonly (DrawnForce | null)[]
): CoupleLayout {
	const present = forces.filter((one): one is DrawnForce => one !== null && one.force !== 0);
	const most = Math.max(...present.map(({ force }) => Math.abs(force)), 1e-9);
	const reach = Math.min(86, column.width - 12);
	const upperFirst = [...present].sort((a, b) => a.y - b.y);
	const arrows = upperFirst.map((one, index) => {
		const length = Math.max(head.length + 3, (reach * Math.abs(one.force)) / most);
		const above = upperFirst.length === 2 ? index === 0 : one.y < (steel.top + steel.bottom) / 2;
		return {
			sense: one.force < 0 ? ('compression' as const) : ('tension' as const),
			force: one.force,
			path: arrowPath(column.middle, one.y, length, one.force < 0 ? -1 : 1),
			labelY: one.y + (above ? -10 : 19)
		};
	});
	return { arrows, arm: armOf(column, upperFirst) };
}

function armOf(column: Column, [upper, lower]: readonly DrawnForce[]): CoupleLayout['arm'] {
	if (!upper || !lower) return null;
	const { path, label } = uprightDimension(column.middle, upper.y, lower.y);
	return { path, x: label.x, y: label.y, room: lower.y - upper.y - 2 * head.half };
}

function arrowPath(x: number, y: number, length: number, sign: 1 | -1): string {
	const tail = x - (sign * length) / 2;
	const tip = x + (sign * length) / 2;
	const neck = tip - sign * head.length;
	const points: [number, number][] = [
		[tail, y - shaft],
		[neck, y - shaft],
		[neck, y - head.half],
		[tip, y],
		[neck, y + head.half],
		[neck, y + shaft],
		[tail, y + shaft]
	];
	return 'M' + points.map(([px, py]) => `${n(px)} ${n(py)}`).join('L') + 'Z';
}
