import type { SectionDefinition } from '$lib/engine/section/definition';
import { inchesIn, numberIn, type SourceRow } from './row';

/** Turns one row of a catalogue file into a section definition. */
export type RowDefinition = (row: SourceRow) => SectionDefinition;

type Size = (column: string) => number;
const metric =
	(build: (size: Size, row: SourceRow) => SectionDefinition): RowDefinition =>
	(row) =>
		build((column) => numberIn(row, column), row);
const inches =
	(build: (size: Size, row: SourceRow) => SectionDefinition): RowDefinition =>
	(row) =>
		build((column) => inchesIn(row, column), row);

const en = { grade: 'S355' } as const;

/** IPE, HE, UB, UC: parallel flanges, root radius r. */
export const enI = metric((size) => ({
	kind: 'i',
	h: size('h'),
	b: size('b'),
	tw: size('tw'),
	tf: size('tf'),
	r: size('r'),
	fabrication: 'rolled',
	...en
}));

/** UPE, PFC (parallel) and UPN (tapered: slope and where tf is measured stand in the row). */
export const enChannel = metric((size, row) => {
	const parallel = { h: size('h'), b: size('b'), tw: size('tw'), tf: size('tf'), r: size('r1') };
	if (size('slope') === 0) return { kind: 'channel', ...parallel, ...en };
	return {
		kind: 'channel',
		...parallel,
		rToe: size('r2'),
		flangeSlopePercent: percent(size('slope')),
		tfAt: row.tf_at === 'b/2' ? 'half-flange' : 'half-outstand',
		...en
	};
});

/** A slope given as a ratio, in per cent without binary noise. */
const percent = (ratio: number): number => Math.round(ratio * 1e6) / 1e4;

export const enAngle = metric((size) => ({
	kind: 'angle',
	h: size('h'),
	b: size('b'),
	t: size('t'),
	r: size('r1'),
	rToe: size('r2'),
	...en
}));

export const enHollow = metric((size, row) =>
	row.group === 'CHS'
		? { kind: 'circular-hollow', d: size('h'), t: size('t'), ...en }
		: {
				kind: 'rectangular-hollow',
				h: size('h'),
				b: size('b'),
				t: size('t'),
				ro: size('ro'),
				ri: size('ri'),
				fabrication: 'hot-finished',
				...en
			}
);

export const astmW = inches((size) => ({
	kind: 'i',
	h: size('d'),
	b: size('bf'),
	tw: size('tw'),
	tf: size('tf'),
	r: size('r'),
	fabrication: 'rolled',
	grade: 'A992'
}));

export const astmWT = inches((size) => ({
	kind: 'tee',
	h: size('d'),
	b: size('bf'),
	tw: size('tw'),
	tf: size('tf'),
	r: size('r'),
	fabrication: 'rolled',
	grade: 'A992'
}));

/** American channels: slope 1 in 6, tf at half the outstand (which gives the published properties). */
export const astmC = inches((size, row) => ({
	kind: 'channel',
	h: size('d'),
	b: size('bf'),
	tw: size('tw'),
	tf: size('tf'),
	r: size('r1'),
	rToe: size('r2'),
	flangeSlopePercent: percent(numberIn(row, 'slope')),
	tfAt: 'half-outstand',
	grade: 'A36'
}));

export const astmL = inches((size) => ({
	kind: 'angle',
	h: size('h'),
	b: size('b'),
	t: size('t'),
	r: size('r1'),
	rToe: size('r2'),
	grade: 'A36'
}));

/** Rectangular HSS at the design wall thickness. */
export const astmRectangularHss = inches((size) => ({
	kind: 'rectangular-hollow',
	h: size('h'),
	b: size('b'),
	t: size('tdes'),
	ro: size('ro'),
	ri: size('ri'),
	fabrication: 'cold-formed',
	grade: 'A500 Gr C shaped'
}));

/** Round HSS at the design wall thickness. */
export const astmRoundHss = inches((size) => ({
	kind: 'circular-hollow',
	d: size('d'),
	t: size('tdes'),
	grade: 'A500 Gr C round'
}));
