import type { Loop } from './boundary';
import type { Frame } from './frame';
import { flanksOf, type ArcFlank, type Flank, type LineFlank } from './flank';
import { addArcAntiderivative, gaussPoint, momentCount, type Moments } from './flank-moments';

/**
 * A body of steel seen along one direction: between two neighbouring levels its slices are bounded
 * by the same flanks, so the moments of all steel below any level come in closed form.
 */
export interface Profile {
	/** Ascending levels (`across`) at which a flank begins or ends. */
	readonly levels: Float64Array;
	/** Moments of all steel below each level, six numbers a level. */
	readonly below: Float64Array;
	/** Straight flanks of each slab added up: width (2), ∑±along²/2 (3), ∑±along³/3 (4), from its lower level. */
	readonly lines: Float64Array;
	readonly arcs: readonly (readonly SlabArc[])[];
	readonly low: number;
	readonly high: number;
	readonly total: Moments;
}

interface SlabArc {
	readonly arc: ArcFlank;
	/** Antiderivatives at the slab's lower level. */
	readonly atLow: Moments;
}

const coefficients = 9;

/** Prepares loops (outer anticlockwise, holes clockwise) for cuts along the frame's axis. */
export function profileOf(loops: readonly Loop[], frame: Frame): Profile {
	const flanks = flanksOf(loops, frame);
	const levels = distinctLevels(flanks);
	const slabs = Math.max(0, levels.length - 1);
	const lines = new Float64Array(slabs * coefficients);
	const arcs: SlabArc[][] = [];
	for (let slab = 0; slab < slabs; slab++) arcs.push([]);
	for (const flank of flanks) spreadFlank(flank, levels, lines, arcs);
	const below = sumsBelow(levels, lines, arcs);
	return {
		levels,
		below,
		lines,
		arcs,
		low: levels[0] ?? 0,
		high: levels[slabs] ?? 0,
		total: below.slice(slabs * momentCount)
	};
}

function distinctLevels(flanks: readonly Flank[]): Float64Array {
	const ends = new Float64Array(2 * flanks.length);
	for (let i = 0; i < flanks.length; i++) {
		ends[2 * i] = flanks[i]!.low;
		ends[2 * i + 1] = flanks[i]!.high;
	}
	ends.sort();
	let count = 0;
	for (let i = 0; i < ends.length; i++) {
		if (i === 0 || ends[i] !== ends[count - 1]) ends[count++] = ends[i]!;
	}
	return ends.slice(0, count);
}

function spreadFlank(
	flank: Flank,
	levels: Float64Array,
	lines: Float64Array,
	arcs: SlabArc[][]
): void {
	for (let slab = slabAt(levels, flank.low); slab < arcs.length; slab++) {
		const low = levels[slab]!;
		if (low >= flank.high) return;
		if (flank.kind === 'line') addLineCoefficients(lines, slab * coefficients, flank, low);
		else {
			const atLow = new Float64Array(momentCount);
			addArcAntiderivative(atLow, flank, low, 1);
			arcs[slab]!.push({ arc: flank, atLow });
		}
	}
}

/** Moments of all steel below each level. */
function sumsBelow(
	levels: Float64Array,
	lines: Float64Array,
	arcs: readonly (readonly SlabArc[])[]
): Float64Array {
	const below = new Float64Array(levels.length * momentCount);
	const out = new Float64Array(momentCount);
	for (let slab = 0; slab < arcs.length; slab++) {
		addSlab(out, levels, lines, arcs, slab, levels[slab + 1]!);
		below.set(out, (slab + 1) * momentCount);
	}
	return below;
}

/** Adds what lies in a slab up to a level. */
function addSlab(
	out: Moments,
	levels: Float64Array,
	lines: Float64Array,
	arcs: readonly (readonly SlabArc[])[],
	slab: number,
	level: number
): void {
	addSlabLines(out, lines, slab * coefficients, levels[slab]!, level - levels[slab]!);
	for (const { arc, atLow } of arcs[slab]!) {
		addArcAntiderivative(out, arc, level, arc.sign);
		for (let i = 0; i < momentCount; i++) out[i]! -= arc.sign * atLow[i]!;
	}
}

function addLineCoefficients(
	lines: Float64Array,
	at: number,
	{ start, slope: b, low, sign }: LineFlank,
	from: number
): void {
	const a = start + b * (from - low);
	lines[at]! += sign * a;
	lines[at + 1]! += sign * b;
	lines[at + 2]! += (sign * a * a) / 2;
	lines[at + 3]! += sign * a * b;
	lines[at + 4]! += (sign * b * b) / 2;
	lines[at + 5]! += (sign * a * a * a) / 3;
	lines[at + 6]! += sign * a * a * b;
	lines[at + 7]! += sign * a * b * b;
	lines[at + 8]! += (sign * b * b * b) / 3;
}

/** Index of the slab that holds a level (the last one that begins at or below it). */
export function slabAt(levels: Float64Array, level: number): number {
	let low = 0;
	let high = levels.length - 1;
	while (low < high) {
		const middle = (low + high + 1) >> 1;
		if (levels[middle]! <= level) low = middle;
		else high = middle - 1;
	}
	return low;
}

/** Writes the moments of all steel below a level into `out` (see `Moments` for the order). */
export function momentsBelow(profile: Profile, level: number, out: Moments): void {
	const { levels, below, lines, arcs } = profile;
	const slab = level < profile.low ? -1 : slabAt(levels, level);
	if (slab < 0) {
		out.fill(0);
		return;
	}
	for (let i = 0; i < momentCount; i++) out[i] = below[slab * momentCount + i]!;
	if (slab < arcs.length) addSlab(out, levels, lines, arcs, slab, level);
}

function addSlabLines(
	out: Moments,
	lines: Float64Array,
	at: number,
	from: number,
	rise: number
): void {
	const half = rise / 2;
	for (let i = -1; i <= 1; i += 2) {
		const x = half + i * half * gaussPoint;
		const across = from + x;
		const width = lines[at]! + lines[at + 1]! * x;
		const square = lines[at + 2]! + x * (lines[at + 3]! + x * lines[at + 4]!);
		const cube = lines[at + 5]! + x * (lines[at + 6]! + x * (lines[at + 7]! + x * lines[at + 8]!));
		out[0]! += half * width;
		out[1]! += half * width * across;
		out[2]! += half * square;
		out[3]! += half * width * across * across;
		out[4]! += half * square * across;
		out[5]! += half * cube;
	}
}

/** Width of the slice at a level, mm; at a step the width above it. */
export function widthAt({ levels, lines, arcs }: Profile, level: number): number {
	const slab = slabAt(levels, level);
	if (slab >= arcs.length || level < levels[0]!) return 0;
	const at = slab * coefficients;
	let width = lines[at]! + lines[at + 1]! * (level - levels[slab]!);
	for (const { arc } of arcs[slab]!) {
		const u = level - arc.across;
		width +=
			arc.sign *
			(arc.along + arc.side * Math.sqrt(Math.max(0, (arc.radius - u) * (arc.radius + u))));
	}
	return width;
}

/** Width of the slice at a level (mm), ∫along (mm²) and ∫along² (mm³) over it; at a step those above it. */
export function chordAt({ levels, lines, arcs }: Profile, level: number): [number, number, number] {
	const slab = slabAt(levels, level);
	if (slab >= arcs.length || level < levels[0]!) return [0, 0, 0];
	const at = slab * coefficients;
	const x = level - levels[slab]!;
	let width = lines[at]! + lines[at + 1]! * x;
	let first = lines[at + 2]! + x * (lines[at + 3]! + x * lines[at + 4]!);
	let second = lines[at + 5]! + x * (lines[at + 6]! + x * (lines[at + 7]! + x * lines[at + 8]!));
	for (const { arc } of arcs[slab]!) {
		const u = level - arc.across;
		const half = Math.sqrt(Math.max(0, (arc.radius - u) * (arc.radius + u)));
		const along = arc.along + arc.side * half;
		width += arc.sign * along;
		first += (arc.sign * along * along) / 2;
		second += (arc.sign * along * along * along) / 3;
	}
	return [width, first, second];
}
