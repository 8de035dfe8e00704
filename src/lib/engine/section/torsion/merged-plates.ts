import type { Note } from '../../result';
import type { SectionDefinition } from '../definition';
import { contactOf } from '../plates/contacts';
import { placedPlates } from '../plates/placing';
import { stripOf } from '../plates/strips';
import { joinedPairs } from './mid-lines';

/** What a solution over the merged outline must say of plates; `unjoined`: it does not hold at all. */
export interface MergedPlates {
	readonly unjoined: boolean;
	readonly notes: readonly Note[];
}

const nothing: MergedPlates = { unjoined: false, notes: [] };

/** Whether plates may be taken as one piece of steel wherever they touch. */
export function mergedPlates(definition: SectionDefinition): MergedPlates {
	if (definition.kind !== 'plates') return nothing;
	const placed = placedPlates(definition.plates);
	const pairs = joinedPairs(definition, placed);
	if (pairs.length < placed.touching.length) return { unjoined: true, notes: [unjoinedNote] };
	const strips = definition.plates.map(stripOf);
	const lapped = pairs.some(({ a, b }) => {
		const { onA, onB } = contactOf(strips, a, b, placed.tolerance);
		return onA.edge === 'face' && onB.edge === 'face';
	});
	return lapped ? { unjoined: false, notes: [lappedNote] } : nothing;
}

const unjoinedNote: Note = {
	code: 'torsion-not-covered',
	message:
		'Some plates touch without being joined: the numerical torsion solution would take them as one piece, so it gives no figures.'
};

const lappedNote: Note = {
	code: 'torsion-plates-lapped',
	message:
		'Plates lying face to face are taken as one solid piece in torsion; welds or bolts must carry the shear between them.'
};
