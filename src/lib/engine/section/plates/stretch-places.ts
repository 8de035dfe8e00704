import { thinnestBetween, type Run, type Runs } from './runs';
import type { PlateStretch } from './stretches';
import { pointOfStrip, type Strip } from './strips';
import type { Supports } from './supports';

/** A clear stretch of a run, mm along it; an outstand from root to tip. */
export interface StretchPlace {
	readonly run: number;
	readonly type: 'internal' | 'outstand';
	readonly from: number;
	readonly to: number;
	readonly heldBy: readonly number[];
	readonly stiffenedBy: readonly number[];
}

/** Stretches shorter than this share of a run are rounding. */
const leastShare = 1e-9;

/** The clear stretches between the supports of a run and beyond them, in order. */
export function placesAlong(
	run: Run,
	{ holds, stiffeners }: Supports
): Omit<StretchPlace, 'run'>[] {
	const [first, last] = [holds[0], holds.at(-1)];
	if (!first || !last) return [];
	const outstand = (from: number, to: number, heldBy: readonly number[]) => ({
		type: 'outstand' as const,
		from,
		to,
		heldBy,
		stiffenedBy: []
	});
	const internal = holds.slice(1).map((hold, i) => {
		const before = holds[i]!;
		const heldBy = [...new Set([...before.by, ...hold.by])];
		const stiffenedBy = heldBy.filter((plate) => stiffeners.includes(plate));
		return { type: 'internal' as const, from: before.to, to: hold.from, heldBy, stiffenedBy };
	});
	const least = leastShare * (run.to - run.from);
	return [
		...(first.from - run.from > least ? [outstand(first.from, run.from, first.by)] : []),
		...internal.filter(({ from, to }) => to - from > least),
		...(run.to - last.to > least ? [outstand(last.to, run.to, last.by)] : [])
	];
}

/** The stretches of all runs, each on the mid-line of its thinnest plate. */
export function stretchesAt(
	strips: readonly Strip[],
	runs: Runs,
	places: readonly StretchPlace[]
): PlateStretch[] {
	const taken = new Set<string>();
	return places.map((place): PlateStretch => {
		const [low, high] = [Math.min(place.from, place.to), Math.max(place.from, place.to)];
		const { pieces, thinnest } = thinnestBetween(strips, runs.runs[place.run]!, low, high);
		const strip = strips[thinnest]!;
		const at = (u: number) => pointOfStrip(strip, u - runs.shift[thinnest]!);
		const names = (plates: readonly number[]) => plates.map((plate) => strips[plate]!.name);
		return {
			plate: strip.name,
			id: freeName(`${strip.name}${placeWord(strip, place)}`, taken),
			type: place.type,
			thickness: 2 * strip.halfThickness,
			from: at(place.from),
			to: at(place.to),
			heldBy: names(place.heldBy),
			plates: names(pieces),
			stiffenedBy: names(place.stiffenedBy)
		};
	});
}

/** Outstands are called after the side they stand on. */
function placeWord({ along }: Strip, { type, from, to }: StretchPlace): string {
	if (type === 'internal') return '';
	const level = Math.abs(along.y) >= Math.abs(along.z);
	if (to > from) return level ? '.right' : '.top';
	return level ? '.left' : '.bottom';
}

/** The name, numbered when it is taken. */
function freeName(name: string, taken: Set<string>): string {
	let free = name;
	for (let n = 2; taken.has(free); n++) free = `${name}.${n}`;
	taken.add(free);
	return free;
}
