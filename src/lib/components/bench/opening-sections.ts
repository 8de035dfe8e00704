import type { SectionDefinition } from '$lib/engine/section/definition';

/** A kind of section as it is offered for building: its name and the sizes it opens with. */
export interface BuildKind {
	readonly key: string;
	readonly title: string;
	readonly opening: SectionDefinition;
}

const grade = 'S355';

export const buildKinds: readonly BuildKind[] = [
	{
		key: 'i-welded',
		title: 'Welded I',
		opening: {
			kind: 'i',
			h: 940,
			b: 400,
			tf: 20,
			bBottom: 400,
			tfBottom: 20,
			tw: 14,
			fabrication: 'welded',
			weldLeg: 8,
			grade
		}
	},
	{
		key: 'i-rolled',
		title: 'Rolled I',
		opening: { kind: 'i', h: 300, b: 150, tf: 10.7, tw: 7.1, r: 15, fabrication: 'rolled', grade }
	},
	{
		key: 'box',
		title: 'Box girder',
		opening: {
			kind: 'box',
			h: 1240,
			b: 600,
			bBottom: 600,
			tfTop: 20,
			tfBottom: 20,
			tw: 12,
			webGap: 500,
			weldLeg: 6,
			grade
		}
	},
	{
		key: 'rectangular-hollow',
		title: 'Rectangular hollow',
		opening: {
			kind: 'rectangular-hollow',
			h: 200,
			b: 100,
			t: 8,
			ro: 12,
			ri: 8,
			fabrication: 'hot-finished',
			grade
		}
	},
	{
		key: 'circular-hollow',
		title: 'Circular hollow',
		opening: { kind: 'circular-hollow', d: 219.1, t: 8, grade }
	},
	{
		key: 'channel',
		title: 'Channel',
		opening: { kind: 'channel', h: 200, b: 75, tw: 8.5, tf: 11.5, r: 11.5, rToe: 0, grade }
	},
	{
		key: 'tee',
		title: 'Tee',
		opening: {
			kind: 'tee',
			h: 200,
			b: 200,
			tw: 12,
			tf: 15,
			fabrication: 'welded',
			weldLeg: 6,
			grade
		}
	},
	{
		key: 'angle',
		title: 'Angle',
		opening: { kind: 'angle', h: 150, b: 100, t: 12, r: 12, rToe: 6, grade }
	},
	{ key: 'flat', title: 'Flat bar', opening: { kind: 'flat', b: 20, h: 200, grade } },
	{ key: 'round', title: 'Round bar', opening: { kind: 'round', d: 60, grade } }
];

/** Key of the kind a definition belongs to; plates and outlines have none. */
export function buildKindOf(section: SectionDefinition): string | null {
	const key = section.kind === 'i' ? `i-${section.fabrication}` : section.kind;
	return buildKinds.some((kind) => kind.key === key) ? key : null;
}
