import { moveToTouch } from '../../geometry/plate-contact';
import { connectedPieces } from '../../geometry/pieces';
import type { Issue, Mend } from '../../result';
import type { PlatesSection } from '../definition';
import { millimetres } from '../sizes';
import { placedPlates, type PlacedPlates } from './placing';
import { placingIssues, type PlacingIssue } from './placing-issues';

/** Mends are looked for so many issues at most, so that a heap of plates costs no more than a few. */
const mendsSought = 3;

/**
 * Issues with a mend where one is found: a move of a plate, or of plates that hang together, after
 * which the issue is gone and no other has come. Every mend offered has been tried.
 */
export function mendedIssues(
	definition: PlatesSection,
	placed: PlacedPlates,
	issues: readonly PlacingIssue[]
): Issue[] {
	return issues.map((issue, i) => {
		const { path, message } = issue;
		const mend = i < mendsSought ? mendOf(definition, placed, issue, issues) : null;
		return mend ? { path, message, mend } : { path, message };
	});
}

function mendOf(
	definition: PlatesSection,
	placed: PlacedPlates,
	issue: PlacingIssue,
	before: readonly PlacingIssue[]
): Mend | null {
	for (const { plates, anchor, mover } of candidates(definition, placed, issue)) {
		const mend = moved(definition, placed, plates, anchor, mover);
		const left = issuesAfter(definition, mend);
		const worse = left.some(
			(one) => !before.some((old) => isSame(old, one) && one.size <= old.size + placed.tolerance)
		);
		const solved = !left.some((one) => isSame(issue, one) && one.size >= issue.size);
		if (solved && !worse) return mend;
	}
	return null;
}

/** Two issues speak of the same pair of plates, or both of pieces that lie apart. */
const isSame = (p: PlacingIssue, q: PlacingIssue): boolean =>
	p.kind === q.kind && (p.kind === 'apart' || (p.a === q.a && p.b === q.b));

interface Candidate {
	readonly plates: readonly number[];
	readonly anchor: number;
	readonly mover: number;
}

/** One plate out of the way of the other first; then what hangs on either of them, the smaller piece first. */
function candidates(
	{ plates }: PlatesSection,
	{ touching }: PlacedPlates,
	{ kind, a, b, piece }: PlacingIssue
): Candidate[] {
	if (kind === 'apart') return bySize(apartCandidates(plates.length, touching, a, b, piece));
	const links = touching.filter((one) => one.a !== a || one.b !== b);
	const pieces = connectedPieces(
		plates.length,
		links.map((one) => [one.a, one.b] as const)
	);
	const pieceOf = (plate: number) => pieces.find((one) => one.includes(plate))!;
	const alone = [
		{ plates: [b], anchor: a, mover: b },
		{ plates: [a], anchor: b, mover: a }
	];
	if (pieceOf(a) === pieceOf(b)) return alone;
	const together = alone.map((one) => ({ ...one, plates: pieceOf(one.mover) }));
	return [...alone, ...bySize(together)];
}

const bySize = (list: readonly Candidate[]): Candidate[] =>
	[...list].sort((p, q) => p.plates.length - q.plates.length);

/** Either piece may close a gap. */
function apartCandidates(
	count: number,
	touching: PlacedPlates['touching'],
	a: number,
	b: number,
	piece: readonly number[]
): Candidate[] {
	const pieces = connectedPieces(
		count,
		touching.map((one) => [one.a, one.b] as const)
	);
	const own = pieces.find((one) => one.includes(a));
	const there = { plates: piece, anchor: a, mover: b };
	return own && !own.includes(b) ? [there, { plates: own, anchor: b, mover: a }] : [there];
}

/** Digits of a coordinate that a mend gives: enough to touch a kilometre from the origin. */
const digits = 15;

function moved(
	{ plates }: PlatesSection,
	{ boxes }: PlacedPlates,
	which: readonly number[],
	anchor: number,
	mover: number
): Mend {
	const by = moveToTouch(boxes[anchor]!, boxes[mover]!);
	const place = (value: number) => Number(value.toPrecision(digits));
	const [first, second] = [plates[mover]!.name, plates[anchor]!.name];
	const rest = which.length > 1 ? ` and what hangs on it` : '';
	return {
		words: `Move “${first}”${rest} by ${wayWords(by.y, by.z)} so that it touches “${second}”.`,
		path: `plates.${mover}`,
		changes: which.map((i) => {
			const { name, y, z } = plates[i]!;
			return { plate: name, y: place(y + by.y), z: place(z + by.z) };
		})
	};
}

/** Moves below this share of the whole are rounding and not told. */
const told = 1e-6;

function wayWords(y: number, z: number): string {
	const whole = Math.hypot(y, z);
	const ways = [
		Math.abs(y) > told * whole
			? `${millimetres(Math.abs(y))} to the ${y > 0 ? 'right' : 'left'}`
			: '',
		Math.abs(z) > told * whole ? `${millimetres(Math.abs(z))} ${z > 0 ? 'up' : 'down'}` : ''
	];
	return ways.filter((way) => way !== '').join(' and ');
}

function issuesAfter(definition: PlatesSection, mend: Mend): PlacingIssue[] {
	const { plates } = mendedPlates(definition, mend);
	return placingIssues({ ...definition, plates }, placedPlates(plates));
}

/** The section with a mend applied. */
export function mendedPlates(definition: PlatesSection, { changes }: Mend): PlatesSection {
	const places = new Map(changes.map(({ plate, y, z }) => [plate, { y, z }]));
	return {
		...definition,
		plates: definition.plates.map((plate) => ({ ...plate, ...places.get(plate.name) }))
	};
}
