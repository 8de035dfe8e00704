import type { Note } from '../../result';
import type { PlatesSection } from '../definition';
import type { Contact } from './contacts';
import { isLap } from './holds';
import type { Joints } from './joints';
import { thinnestBetween, type Runs } from './runs';
import type { StretchPlace } from './stretch-places';
import type { Supports } from './supports';

interface Found {
	readonly definition: PlatesSection;
	readonly joints: Joints;
	readonly runs: Runs;
	readonly supports: readonly Supports[];
	readonly places: readonly StretchPlace[];
}

const clause = 'EN 1993-1-5:2006 4.5';

/** What cannot be told from the places of the plates, and what was taken for granted. */
export function stretchNotes(found: Found): Note[] {
	return [
		...unheldNotes(found),
		...doubtfulNotes(found),
		...looseNotes(found),
		...lapNotes(found),
		...stiffenerNotes(found),
		...thicknessNotes(found)
	];
}

const quoted = (names: readonly string[]): string =>
	[...new Set(names)].map((name) => `“${name}”`).join(', ');

const pairs = ({ definition: { plates } }: Found, contacts: readonly Contact[]): string =>
	contacts.map(({ a, b }) => `“${plates[a]!.name}” and “${plates[b]!.name}”`).join('; ');

const notClear = (message: string): Note => ({ code: 'stretch-not-clear', message });

function unheldNotes({ definition: { plates }, runs, supports }: Found): Note[] {
	const unheld = runs.runs.filter((_, run) => supports[run]!.holds.length === 0);
	if (unheld.length === 0) return [];
	const names = quoted(
		unheld.flatMap(({ pieces }) => pieces.map(({ plate }) => plates[plate]!.name))
	);
	return [
		notClear(
			`No plate holds ${names} across its flat, so whether it is internal or an outstand cannot be said and the section has no class.`
		)
	];
}

function doubtfulNotes(found: Found): Note[] {
	const { doubtful } = found.joints;
	if (doubtful.length === 0) return [];
	return [
		notClear(
			`Plates that meet at a point, or with less than half of their ends on each other, are not taken to hold each other: ${pairs(found, doubtful)}. A join between plates that meet at a point says that they are welded.`
		)
	];
}

function looseNotes(found: Found): Note[] {
	const { loose } = found.joints;
	if (loose.length === 0) return [];
	return [
		notClear(
			`Plates touch without a join and are not taken to hold each other: ${pairs(found, loose)}.`
		)
	];
}

function lapNotes(found: Found): Note[] {
	const { joints, runs, supports, definition } = found;
	const laps = joints.welded.filter(isLap);
	const lapHeld = (plate: number) =>
		supports[runs.runOf[plate]!]!.holds.some(({ kind }) => kind === 'lap');
	const counted = laps.filter(({ a, b }) => lapHeld(a) || lapHeld(b));
	const idle = laps.filter(({ a, b }) => !lapHeld(a) && !lapHeld(b));
	const notes: Note[] = [];
	if (counted.length > 0 && !definition.joins)
		notes.push({
			code: 'lap-welds-assumed',
			message: `Plates that lie on each other are taken as welded along both edges of the lap: ${pairs(found, counted)}. Between them no spacing of bolts or broken welds is checked.`
		});
	if (idle.length > 0)
		notes.push({
			code: 'lap-not-counted',
			message: `Plates lie on each other, and each is measured between its own supports as if the other were not there: ${pairs(found, idle)}.`
		});
	return notes;
}

function stiffenerNotes({ definition: { plates }, supports }: Found): Note[] {
	const names = (list: readonly number[]) => quoted(list.map((plate) => plates[plate]!.name));
	const stiffeners = supports.flatMap((one) => one.stiffeners);
	const weak = supports.flatMap((one) => one.weak);
	const notes: Note[] = [];
	if (stiffeners.length > 0)
		notes.push({
			code: 'stiffener-not-checked',
			message: `Panels are measured between the longitudinal stiffeners ${names(stiffeners)}; buckling of the stiffened plate as a whole is not checked.`,
			clause
		});
	if (weak.length > 0)
		notes.push({
			code: 'stiffener-too-weak',
			message: `${names(weak)} is not stiff enough to count as a support of the plate it stands on: its second moment about that plate is below 1.83 t³c at an edge, or 3.66 t³c between two panels (practice for stiffened plates, from memory; check it).`
		});
	return notes;
}

function thicknessNotes({ joints: { strips }, runs, places }: Found): Note[] {
	const mixed = places.filter(({ run, from, to }) => {
		const { pieces } = thinnestBetween(
			strips,
			runs.runs[run]!,
			Math.min(from, to),
			Math.max(from, to)
		);
		const first = strips[pieces[0]!]!.halfThickness;
		return pieces.some((plate) => strips[plate]!.halfThickness !== first);
	});
	if (mixed.length === 0) return [];
	const message =
		'Where a wall changes its thickness between supports, its whole clear width is taken at the thinner thickness.';
	return [{ code: 'thinner-part-taken', message }];
}
