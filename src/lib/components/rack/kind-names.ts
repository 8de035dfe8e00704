import type { SectionKind } from '../../engine/section/definition';

/** Kinds in the words of the shop. */
export const kindNames: Readonly<Record<SectionKind, string>> = {
	i: 'I section',
	channel: 'Channel',
	tee: 'Tee',
	angle: 'Angle',
	'rectangular-hollow': 'Rectangular hollow',
	'circular-hollow': 'Circular hollow',
	box: 'Box girder',
	flat: 'Flat bar',
	round: 'Round bar',
	plates: 'Plates',
	outline: 'Outline'
};

/** The kind's name; a kind that is not known is shown as it is stored. */
export const kindName = (kind: string): string =>
	Object.entries(kindNames).find(([known]) => known === kind)?.[1] ?? kind;
