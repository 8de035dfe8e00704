import type { Note } from '../../result';
import type { PreparedSection } from '../../section/prepared';
import type { AxisSense } from '../section-moments';

const topParts = new Set(['topFlange']);
const bottomParts = new Set(['bottomFlange']);

/** Parts with bolt holes in them. */
export const holedParts = ({ definition }: PreparedSection): string[] => [
	...new Set((definition.boltHoles ?? []).filter(({ count }) => count > 0).map(({ part }) => part))
];

/**
 * Whether holes lie where this moment pulls, so that 6.2.5(4) would have to be checked. A flange on
 * the compressed side is free: holes filled by fasteners are not deducted there.
 */
export function holesInTension(section: PreparedSection, sense: AxisSense): boolean {
	const compressed = sense === 'plusMy' ? topParts : sense === 'minusMy' ? bottomParts : null;
	return holedParts(section).some((part) => !compressed?.has(part));
}

/** What holes take away from the figures. */
export function holeNotes(section: PreparedSection): Note[] {
	if (holedParts(section).length === 0) return [];
	return [
		{
			code: 'net-section-not-checked',
			message:
				'The net section at bolt holes is not checked yet, so there is no tension resistance.',
			clause: 'EN 1993-1-1:2005 6.2.3(2)'
		},
		{
			code: 'tension-flange-holes-not-built',
			message:
				'Bolt holes in a part that bending pulls are not deducted yet: a moment that pulls a holed part has no resistance. Holes in a compressed flange are taken as filled by fasteners.',
			clause: 'EN 1993-1-1:2005 6.2.5(4)'
		}
	];
}
