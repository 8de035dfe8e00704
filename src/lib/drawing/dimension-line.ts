/** A dimension line with a slanted tick at each end, px; `label` is where its figure goes. */
export interface DimensionLine {
	readonly path: string;
	readonly label: { readonly x: number; readonly y: number };
	/** True when the ends are too near each other for ticks inside: the line then reaches outside. */
	readonly outside: boolean;
}

const tick = 4;
const reach = 9;
const n = (value: number) => value.toFixed(1);

const slash = (x: number, y: number) =>
	`M${n(x - tick)} ${n(y + tick)}L${n(x + tick)} ${n(y - tick)}`;

/** Upright dimension line at `x` from `top` to `bottom`. */
export function uprightDimension(x: number, top: number, bottom: number): DimensionLine {
	const outside = bottom - top < 3 * tick;
	const extra = outside ? reach : 0;
	const line = `M${n(x)} ${n(top - extra)}L${n(x)} ${n(bottom + extra)}`;
	return {
		path: line + slash(x, top) + slash(x, bottom),
		label: { x, y: (top + bottom) / 2 },
		outside
	};
}

/** Level dimension line at `y` from `left` to `right`. */
export function levelDimension(y: number, left: number, right: number): DimensionLine {
	const outside = right - left < 3 * tick;
	const extra = outside ? reach : 0;
	const line = `M${n(left - extra)} ${n(y)}L${n(right + extra)} ${n(y)}`;
	return {
		path: line + slash(left, y) + slash(right, y),
		label: { x: (left + right) / 2, y },
		outside
	};
}
