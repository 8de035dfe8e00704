import { connectedPieces } from '../../geometry/pieces';
import { plateGap } from '../../geometry/plate-contact';
import type { Issue } from '../../result';
import type { Plate, PlatesSection } from '../definition';
import { joinIssues } from '../kinds/plate-fields';
import { millimetres } from '../sizes';
import type { PlacedPlates } from './placing';

/** An issue of two plates (indices), and the plates that hang together with the second one. */
export interface PlacingIssue extends Issue {
	readonly kind: 'overlap' | 'apart' | 'join';
	readonly a: number;
	readonly b: number;
	/** Which plates would have to move together to close a gap; none for an overlap. */
	readonly piece: readonly number[];
	/** Depth of an overlap in mm, or the number of pieces that lie apart. */
	readonly size: number;
}

/** Plates that overlap, joins between plates that do not touch, and pieces that hang together nowhere. */
export function placingIssues(definition: PlatesSection, placed: PlacedPlates): PlacingIssue[] {
	return [...overlapIssues(definition.plates, placed), ...connectionIssues(definition, placed)];
}

function overlapIssues(
	plates: readonly Plate[],
	{ touching, tolerance }: PlacedPlates
): PlacingIssue[] {
	return touching
		.filter(({ gap }) => gap < -tolerance)
		.map(({ a, b, gap }) => ({
			kind: 'overlap',
			a,
			b,
			piece: [],
			size: -gap,
			path: `plates.${b}`,
			message: `Plates “${plates[a]!.name}” and “${plates[b]!.name}” overlap by ${millimetres(-gap)}.`
		}));
}

function connectionIssues(definition: PlatesSection, placed: PlacedPlates): PlacingIssue[] {
	const { plates, joins, tied } = definition;
	if (tied) return [];
	const touching = placed.touching.map(({ a, b }) => [a, b] as const);
	const place = new Map(plates.map(({ name }, i) => [name, i]));
	const named = joins?.map(({ a, b }) => [place.get(a)!, place.get(b)!] as const);
	const wrong = joins ? joinIssues(definition, touching) : [];
	if (wrong.length > 0)
		return wrong.map(({ join, ...issue }) => {
			const [a, b] = named![join]!;
			return { ...issue, kind: 'join', a, b, piece: [b], size: 1 };
		});
	const pieces = connectedPieces(plates.length, named ?? touching);
	return pieces.length < 2 ? [] : [apartIssue(plates, placed, pieces, joins !== undefined)];
}

function apartIssue(
	plates: readonly Plate[],
	{ boxes }: PlacedPlates,
	[piece = [], ...others]: readonly (readonly number[])[],
	joined: boolean
): PlacingIssue {
	let nearest = { gap: Infinity, a: 0, b: 0, other: [] as readonly number[] };
	for (const other of others)
		for (const a of piece)
			for (const b of other) {
				const gap = plateGap(boxes[a]!, boxes[b]!);
				if (gap < nearest.gap) nearest = { gap, a, b, other };
			}
	const { a, b, other } = nearest;
	const gap = Math.max(nearest.gap, 0);
	const why = joined && gap === 0 ? 'no join connects them' : `the gap is ${millimetres(gap)}`;
	const crowd = piece.length + other.length > namedAtMost;
	const where = crowd && gap > 0 ? `, between “${plates[a]!.name}” and “${plates[b]!.name}”` : '';
	return {
		kind: 'apart',
		a,
		b,
		piece: other,
		size: others.length + 1,
		path: `plates.${other[0]}`,
		message: `Plates ${namesOf(plates, piece, a)} and ${namesOf(plates, other, b)} are not connected: ${why}${where}. Join them, or set tied when they act together by intent.`
	};
}

/** So many plates are named one by one. */
const namedAtMost = 6;

/** The names of a piece, or the nearest of them and how many more there are. */
function namesOf(plates: readonly Plate[], list: readonly number[], nearest: number): string {
	if (list.length <= namedAtMost / 2) return list.map((i) => `“${plates[i]!.name}”`).join(', ');
	return `“${plates[nearest]!.name}” with ${list.length - 1} others`;
}
