import type { Point } from '../../geometry/boundary';
import type { Note } from '../../result';
import type { PlatesSection } from '../definition';
import { jointsOf } from './joints';
import { runsOf } from './runs';
import { stretchNotes } from './stretch-notes';
import { placesAlong, stretchesAt } from './stretch-places';
import { supportsOf } from './supports';

/**
 * A flat stretch of plate between its supports, mm: its clear width is the distance from `from` to
 * `to` along the mid-line, between weld toes (internal: low or left to high or right) or from weld
 * toe to free tip (outstand).
 */
export interface PlateStretch {
	/** The plate, or the thinnest one where the stretch runs through several end to end. */
	readonly plate: string;
	/** Unique in the section. */
	readonly id: string;
	readonly type: 'internal' | 'outstand';
	readonly thickness: number;
	readonly from: Point;
	readonly to: Point;
	/** Plates that hold its ends. */
	readonly heldBy: readonly string[];
	/** All plates that it runs through; the strongest of them decides its ε. */
	readonly plates: readonly string[];
	/** Those of `heldBy` that are longitudinal stiffeners: whether they hold the panel as a whole needs a check of its own. */
	readonly stiffenedBy: readonly string[];
}

/** `stretches` is null when some plate is held nowhere: then nothing can be said of the section. */
export interface StretchResult {
	readonly stretches: PlateStretch[] | null;
	readonly notes: Note[];
}

/**
 * Internal and outstand stretches of the plates of a checked section, from geometry alone, for the
 * width-to-thickness limits of a code. A plate is held where another stands on it or it stands on
 * another, when what stands there is stiff enough; a cover plate is held along its weld lines. Plates
 * that follow each other end to end are one wall.
 */
export function plateStretches(definition: PlatesSection): StretchResult {
	const joints = jointsOf(definition);
	const { strips, welded } = joints;
	const runs = runsOf(strips, welded);
	const supports = supportsOf(strips, runs, welded);
	const held = supports.every(({ holds }) => holds.length > 0);
	const places = runs.runs.flatMap((run, i) =>
		placesAlong(run, supports[i]!).map((place) => ({ ...place, run: i }))
	);
	return {
		stretches: held ? stretchesAt(strips, runs, places) : null,
		notes: stretchNotes({ definition, joints, runs, supports, places })
	};
}
