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

/** Between labels in a row, and between a label and the line of another mark, px. */
const gap = 8;
const lineGap = 2;

/**
 * Lays a ruler from 0 to its greatest mark over `width` px. A label ends at its mark, or begins
 * there; each stands in a row where neither a label nor the line of another mark runs through it.
 */
export function rulerLayout(
	marks: readonly RulerMark[],
	width: number,
	measure: TextMeasure,
	size: number
): RulerLayout {
	const most = Math.max(...marks.map(({ value }) => value), 1e-9);
	const scale = scaleLinear([0, most * 1.01], [0, width]);
	const lines = marks.map((mark) => ({
		...mark,
		x: scale(mark.value),
		labelWidth: measure(mark.label, size)
	}));
	const placed = bestPlaces(lines, width);
	return {
		marks: placed,
		ticks: tickValues(scale, width).map((value) => ({ value, x: scale(value) })),
		rows: Math.max(0, ...placed.map(({ row }) => row + 1)),
		x: (value) => scale(value)
	};
}

type Line = Omit<PlacedMark, 'row' | 'labelX'>;
type Anchored = Omit<PlacedMark, 'row'>;

/** Of all ways to let labels end or begin at their marks, that with the fewest rows, most ending. */
function bestPlaces(lines: readonly Line[], width: number): PlacedMark[] {
	let best: { cost: number; placed: PlacedMark[] } | null = null;
	for (let choice = 0; choice < 2 ** lines.length; choice += 1) {
		const labels = lines.map((line, index) => anchored(line, (choice >> index) % 2 === 1, width));
		const { placed, cuts } = inRows(labels);
		const rows = Math.max(0, ...placed.map(({ row }) => row));
		const begins = labels.filter(({ x, labelX }) => labelX >= x).length;
		const cost = 1000 * cuts + 10 * rows + begins;
		if (!best || cost < best.cost) best = { cost, placed };
	}
	return best?.placed ?? [];
}

function anchored(line: Line, begins: boolean, width: number): Anchored {
	const { x, labelWidth } = line;
	const wanted = begins ? x + lineGap + 1 : x - labelWidth;
	return { ...line, labelX: Math.max(0, Math.min(wanted, width - labelWidth)) };
}

const covers = (label: Anchored, { x }: Line) =>
	x > label.labelX - lineGap && x < label.labelX + label.labelWidth + lineGap;

const meets = (a: Anchored, b: Anchored) =>
	a.labelX < b.labelX + b.labelWidth + gap && b.labelX < a.labelX + a.labelWidth + gap;

/** Each label above those whose lines it covers; `cuts` counts those that cover each other's. */
function inRows(labels: readonly Anchored[]): { placed: PlacedMark[]; cuts: number } {
	const placed: PlacedMark[] = [];
	const left = [...labels];
	let cuts = 0;
	while (left.length > 0) {
		const free = left.findIndex((label) =>
			left.every((other) => other === label || !covers(label, other))
		);
		if (free < 0) cuts += 1;
		const [label] = left.splice(Math.max(0, free), 1);
		if (label) placed.push({ ...label, row: freeRow(label, placed) });
	}
	return { placed, cuts };
}

/** First row above every line that would run through the label, and free of other labels. */
function freeRow(label: Anchored, placed: readonly PlacedMark[]): number {
	const crossing = placed.filter((one) => covers(label, one));
	const meeting = placed.filter((one) => meets(label, one));
	let row = Math.max(0, ...crossing.map((one) => one.row + 1));
	while (meeting.some((one) => one.row === row)) row += 1;
	return row;
}

const tickValues = (scale: { ticks: (count: number) => number[] }, width: number) =>
	scale.ticks(Math.max(2, Math.min(8, Math.round(width / 90))));
