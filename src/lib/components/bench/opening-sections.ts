import type { Ring, SectionDefinition } from '$lib/engine/section/definition';
import { platePresets } from '$lib/engine/section/plates/presets';

/** A kind of section as it is offered for building: its name and the sizes it opens with. */
export interface BuildKind {
	readonly key: string;
	readonly title: string;
	readonly opening: SectionDefinition;
}

const grade = 'S355';

/** An I with a cover plate on each flange. */
const coveredI = preparedPreset('i-with-cover-plates');

/** A bar bent to a hook, mm. */
const hook: Ring = [
	[0, 0],
	[160, 0],
	[160, 90],
	[130, 90],
	[130, 30],
	[40, 30],
	[40, 240],
	[0, 240]
];

function preparedPreset(id: string): SectionDefinition {
	const preset = platePresets.find((one) => one.id === id);
	if (!preset) throw new Error(`There is no preset ${id}.`);
	return preset.section({}, grade);
}

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
	{ key: 'round', title: 'Round bar', opening: { kind: 'round', d: 60, grade } },
	{ key: 'plates', title: 'Free plates', opening: coveredI },
	{
		key: 'outline',
		title: 'Outline',
		opening: { kind: 'outline', regions: [{ outer: hook }], grade }
	}
];

/** Key of the kind a definition belongs to. */
export const buildKindOf = (section: SectionDefinition): string =>
	section.kind === 'i' ? `i-${section.fabrication}` : section.kind;
