import type { Loop, Point } from '../geometry/boundary';
import { frameAt } from '../geometry/frame';
import { profileOf, type Profile } from '../geometry/profile';
import { initialModulus, lawLimits } from '../material/laws';
import type { StressStrainLaw } from '../material/law';
import type { Material } from '../material/material';
import type { PreparedSection } from '../section/prepared';

/** All steel of a section that follows one law, to be cut together. */
export interface LawGroup {
	readonly loops: readonly Loop[];
	readonly law: StressStrainLaw;
	/** Slope of the law at zero strain, N/mm². */
	readonly modulus: number;
	/** Strength of the full plastic block: the grade's, or less where the law never gets there. */
	readonly fy: number;
	readonly fyc: number;
	/** Greatest stresses that the law can give, hardening included. */
	readonly most: { readonly tension: number; readonly compression: number };
	/** Strains at which to cut when tension and compression are told apart. */
	readonly cuts: readonly number[];
	readonly cutOffsets: readonly number[];
	readonly cutSlopes: readonly number[];
}

/** The section as its response needs it: steel by law, about the gross centroid. */
export interface Mechanics {
	readonly groups: readonly LawGroup[];
	readonly centroid: Point;
	readonly area: number;
	/** N: least of the plastic forces in tension and compression; the scale of convergence. */
	readonly squash: number;
	/** mm: largest distance of the bounding box's corners from the centroid. */
	readonly reach: number;
	/** The groups seen along the normal of an axis turned by an angle (radians from y). */
	readonly profiles: (angle: number) => readonly Profile[];
}

/** Mechanics of sections that are still in use: a prepared section never changes. */
const made = new WeakMap<PreparedSection, Mechanics>();

export function mechanicsOf(section: PreparedSection): Mechanics {
	const known = made.get(section);
	if (known) return known;
	const mechanics = newMechanics(section);
	made.set(section, mechanics);
	return mechanics;
}

function newMechanics(section: PreparedSection): Mechanics {
	const groups = lawGroups(section);
	const { centroid, area } = section.gross;
	const { left, right, bottom, top } = section.bounds;
	const profiles = turnedProfiles(groups, centroid);
	const upright = profiles(0);
	return {
		groups,
		centroid,
		area,
		profiles,
		squash: groups.reduce(
			(sum, { fy, fyc }, i) => sum + upright[i]!.total[0]! * Math.min(fy, fyc),
			0
		),
		reach: Math.hypot(
			Math.max(right - centroid.y, centroid.y - left),
			Math.max(top - centroid.z, centroid.z - bottom)
		)
	};
}

function lawGroups({ parts }: PreparedSection): LawGroup[] {
	const found: { material: Material; loops: Loop[] }[] = [];
	for (const { material, region } of parts) {
		const same = found.find((group) => sameStrength(group.material, material));
		if (same) same.loops.push(...region.loops);
		else found.push({ material, loops: [...region.loops] });
	}
	return found.map(({ material, loops }) => {
		const most = lawLimits(material.law);
		return {
			loops,
			law: material.law,
			modulus: initialModulus(material.law),
			fy: atMost(material.fy, most.tension),
			fyc: atMost(material.fyc, most.compression),
			most,
			...cutsOf(material.law)
		};
	});
}

/** The strength itself unless the law falls short of it by more than rounding. */
const atMost = (strength: number, most: number): number =>
	most < strength * (1 - 1e-12) ? most : strength;

function sameStrength(a: Material, b: Material): boolean {
	if (a === b || a.law === b.law) return a.fy === b.fy && a.fyc === b.fyc;
	if (a.fy !== b.fy || a.fyc !== b.fyc) return false;
	return (
		a.law.limit?.tension === b.law.limit?.tension &&
		a.law.limit?.compression === b.law.limit?.compression &&
		sameNumbers(a.law.kinks, b.law.kinks) &&
		sameNumbers(a.law.offsets, b.law.offsets) &&
		sameNumbers(a.law.slopes, b.law.slopes)
	);
}

const sameNumbers = (a: readonly number[], b: readonly number[]): boolean =>
	a.length === b.length && a.every((value, i) => value === b[i]);

/** The law's kinks with zero strain among them. */
function cutsOf({ kinks, offsets, slopes }: StressStrainLaw) {
	const at = kinks.findIndex((kink) => kink >= 0);
	if (kinks[at] === 0) return { cuts: kinks, cutOffsets: offsets, cutSlopes: slopes };
	const place = at < 0 ? kinks.length : at;
	const twice = (values: readonly number[]) => [
		...values.slice(0, place + 1),
		...values.slice(place)
	];
	return {
		cuts: [...kinks.slice(0, place), 0, ...kinks.slice(place)],
		cutOffsets: twice(offsets),
		cutSlopes: twice(slopes)
	};
}

/** So many turned views are kept beside those along y and z. */
const keptTurned = 8;

/** Profiles by angle: those along y and z stay, of others the few last ones, since one analysis asks for the same again. */
function turnedProfiles(groups: readonly LawGroup[], centroid: Point) {
	const kept = new Map<number, readonly Profile[]>();
	const turned: number[] = [];
	return (angle: number): readonly Profile[] => {
		const known = kept.get(angle);
		if (known) return known;
		const frame = frameAt(centroid, angle);
		const made = groups.map(({ loops }) => profileOf(loops, frame));
		kept.set(angle, made);
		if (angle % (Math.PI / 2) !== 0 && turned.push(angle) > keptTurned)
			kept.delete(turned.shift()!);
		return made;
	};
}
