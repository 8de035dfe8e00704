/** Upright break line of the trade: straight, with one zigzag in the middle, px. */
export function breakLine(x: number, top: number, bottom: number, throwWidth = 5): string {
	const middle = (top + bottom) / 2;
	const step = Math.min(6, (bottom - top) / 6);
	const points: [number, number][] = [
		[x, top],
		[x, middle - step],
		[x - throwWidth, middle - step / 2],
		[x + throwWidth, middle + step / 2],
		[x, middle + step],
		[x, bottom]
	];
	return 'M' + points.map(([px, py]) => `${px.toFixed(1)} ${py.toFixed(1)}`).join('L');
}
