import { scaleLinear } from 'd3';
import type { TextMeasure } from './text-width';

/** A value marked on the ruler. */
export interface RulerMark {
	readonly key: string;
	readonly value: number;
	readonly label: string;
}

export interface PlacedMark extends RulerMark {
	readonly x: number;
	/** Left edge of its label and its row, 0 next to the bar. */
	readonly labelX: number;
	readonly labelWidth: number;
	readonly row: number;
}

export interface RulerLayout {
	readonly marks: readonly PlacedMark[];
	readonly ticks: readonly { readonly x: number; readonly value: number }[];
	readonly rows: number;
	readonly x: (value: number) => number;
}

const gap = 8;

/**
 * Lays a ruler from 0 to its greatest mark over `width` px. A label ends at its mark, or begins
 * there near the left end; each stands in a row where neither a label nor the line of another mark
 * runs through it.
 */
export function rulerLayout(
	marks: readonly RulerMark[],
	width: number,
	measure: TextMeasure,
	size: number
): RulerLayout {
	const most = Math.max(...marks.map(({ value }) => value), 1e-9);
	const scale = scaleLinear([0, most * 1.01], [0, width]);
	const wanted = clearOfStart(
		marks.map((mark) => anchored(mark, scale(mark.value), measure(mark.label, size))),
		width
	);
	const placed: PlacedMark[] = [];
	for (const label of placingOrder(wanted)) placed.push({ ...label, row: freeRow(label, placed) });
	return {
		marks: placed,
		ticks: tickValues(scale, width).map((value) => ({ value, x: scale(value) })),
		rows: Math.max(0, ...placed.map(({ row }) => row + 1)),
		x: (value) => scale(value)
	};
}

type Anchored = Omit<PlacedMark, 'row'>;

const anchored = (mark: RulerMark, x: number, labelWidth: number): Anchored => ({
	...mark,
	x,
	labelWidth,
	labelX: x >= labelWidth ? x - labelWidth : Math.max(0, x - 2)
});

const beginsAt = ({ x, labelX }: Anchored) => labelX + 2 >= x;

/** A label that would cover the line of one that begins near the left end begins at its mark too. */
function clearOfStart(labels: readonly Anchored[], width: number): Anchored[] {
	const starts = labels.filter(beginsAt).map(({ x }) => x);
	return labels.map((label) => {
		const covers = starts.some((x) => x >= label.labelX - gap && x < label.x);
		const fits = label.x + label.labelWidth <= width;
		return covers && fits && !beginsAt(label) ? { ...label, labelX: label.x - 2 } : label;
	});
}

/** Labels that end at their mark from left to right, then those that begin there from right to left. */
function placingOrder(labels: readonly Anchored[]): Anchored[] {
	const ends = labels.filter((label) => !beginsAt(label));
	const begins = labels.filter(beginsAt);
	return [...ends.sort((a, b) => a.x - b.x), ...begins.sort((a, b) => b.x - a.x)];
}

/** First row above every line that would run through the label, and free of other labels. */
function freeRow(label: Anchored, placed: readonly PlacedMark[]): number {
	const [from, to] = [label.labelX - gap, label.labelX + label.labelWidth + gap];
	const crossing = placed.filter(({ x }) => x > from && x < to);
	const meeting = placed.filter((one) => one.labelX < to && one.labelX + one.labelWidth > from);
	let row = Math.max(0, ...crossing.map((one) => one.row + 1));
	while (meeting.some((one) => one.row === row)) row += 1;
	return row;
}

const tickValues = (scale: { ticks: (count: number) => number[] }, width: number) =>
	scale.ticks(Math.max(2, Math.min(8, Math.round(width / 90))));
