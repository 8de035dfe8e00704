import { fail, ok, type Result } from '../result';
import type { StrainLimit, StressStrainLaw } from './law';
import type { LawDefinition } from './material';
import { quadLinearPoints } from './quad-linear';
import { rambergOsgood, type RambergOsgood } from './ramberg-osgood';
import { roundedPoints } from './rounded-lines';

/** What a law is built from: E, fy, fyc and fu in N/mm²; fyc and fu positive numbers. */
export interface Strengths {
	E: number;
	fy: number;
	fyc: number;
	fu: number | null;
}

/** One side of a law: strains and stresses as positive numbers from the origin outwards. */
export interface LawSide {
	points: readonly (readonly [number, number])[];
	/** Slope beyond the last point, N/mm²; `null` means that the stress drops to zero there. */
	beyond: number | null;
	/** Yield strain where it is not the first point's. */
	yield?: number;
	/** Why the law ends with its last point, if it does. */
	ends?: string;
}

/**
 * Stress–strain law of a grade as straight lines, tension positive; elastic–perfectly plastic
 * when none is asked for. Fails with a sentence when the numbers make no law.
 */
export function lawOf(
	definition: LawDefinition | undefined,
	strengths: Strengths
): Result<StressStrainLaw, string> {
	const tension = lawSide(definition, strengths, strengths.fy, 'tension');
	if (!tension.ok) return tension;
	const compression = lawSide(definition, strengths, strengths.fyc, 'compression');
	if (!compression.ok) return compression;
	const law = piecewiseLaw(tension.value, compression.value);
	const limit = strainLimit(definition?.strainLimit, tension.value, compression.value);
	return ok(limit ? { ...law, limit } : law);
}

function strainLimit(
	asked: number | undefined,
	tension: LawSide,
	compression: LawSide
): StrainLimit | undefined {
	const end = (side: LawSide) => (side.ends ? side.points.at(-1)![0] : Infinity);
	const own = { tension: end(tension), compression: end(compression) };
	const least = Math.min(own.tension, own.compression);
	if (asked !== undefined && asked <= least)
		return {
			tension: asked,
			compression: asked,
			reason: 'The strain limit of the law is reached.'
		};
	const reason = tension.ends ?? compression.ends;
	if (reason === undefined) return undefined;
	const within = asked ?? Infinity;
	return {
		tension: Math.min(own.tension, within),
		compression: Math.min(own.compression, within),
		reason
	};
}

function lawSide(
	definition: LawDefinition | undefined,
	{ E, fu }: Strengths,
	strength: number,
	sense: 'tension' | 'compression'
): Result<LawSide, string> {
	const type = definition?.type ?? 'elastic-plastic';
	switch (type) {
		case 'elastic-plastic':
			return ok({ points: [[strength / E, strength]], beyond: 0 });
		case 'bilinear':
			return bilinearSide(definition as BilinearDefinition, E, strength);
		case 'quad-linear': {
			if (fu === null) return fail('The quad-linear law needs fu: give fu with the grade.');
			const points = quadLinearPoints(E, strength, fu);
			const ends = 'The quad-linear law ends at the ultimate strain.';
			return points.ok ? ok({ points: points.value, beyond: 0, ends }) : points;
		}
		case 'curve':
			return curveSide(definition as CurveDefinition, sense);
		case 'ramberg-osgood':
			return roundedSide(definition as RambergOsgood, E, strength, fu);
		default:
			return unknownLaw(type);
	}
}

type BilinearDefinition = Extract<LawDefinition, { type: 'bilinear' }>;
type CurveDefinition = Extract<LawDefinition, { type: 'curve' }>;

function bilinearSide(
	{ Eh, fu }: BilinearDefinition,
	E: number,
	strength: number
): Result<LawSide, string> {
	if (!(Eh >= 0 && Eh < E))
		return fail(`Hardening slope Eh must lie between 0 and E (${E} N/mm²).`);
	const yieldPoint = [strength / E, strength] as const;
	if (fu === undefined) return ok({ points: [yieldPoint], beyond: Eh });
	if (!(fu >= strength)) return fail(`fu of the law (${fu}) must not be below the yield strength.`);
	if (fu === strength || Eh === 0) return ok({ points: [yieldPoint], beyond: 0 });
	return ok({ points: [yieldPoint, [strength / E + (fu - strength) / Eh, fu]], beyond: 0 });
}

function curveSide(
	{ tension, compression, beyond }: CurveDefinition,
	sense: 'tension' | 'compression'
): Result<LawSide, string> {
	const given = sense === 'compression' ? (compression ?? tension) : tension;
	const points = given.filter(([strain, stress]) => strain !== 0 || stress !== 0);
	if (points.length === 0) return fail(`The ${sense} curve needs at least one point.`);
	let before = 0;
	for (const [strain, stress] of points) {
		if (!(strain > before))
			return fail(`Strains of the ${sense} curve must rise from 0 (at ${strain}).`);
		if (!(stress >= 0))
			return fail(`Stresses of the ${sense} curve must not be negative (at ${strain}).`);
		before = strain;
	}
	if (!(points[0]![1] > 0)) return fail(`The ${sense} curve must begin with a stress above 0.`);
	if (beyond === 'flat') return ok({ points, beyond: 0 });
	return ok({ points, beyond: null, ends: 'The stress–strain curve ends.' });
}

function roundedSide(
	asked: RambergOsgood,
	E: number,
	strength: number,
	fu: number | null
): Result<LawSide, string> {
	const curve = rambergOsgood(asked, E, strength, fu);
	if (!curve.ok) return curve;
	const points = roundedPoints(curve.value);
	const ends = 'The Ramberg–Osgood curve ends.';
	return ok({ points, beyond: 0, yield: strength / E, ends });
}

function unknownLaw(type: never): Result<LawSide, string> {
	return fail(`Unknown stress–strain law “${String(type)}”.`);
}

/** Joins both sides; a point at which the slope does not change is no kink. */
export function piecewiseLaw(tension: LawSide, compression: LawSide): StressStrainLaw {
	const up = sideSegments(tension);
	const down = sideSegments(compression);
	const joined = sameSlope(up.slopes[0]!, down.slopes[0]!);
	return {
		kinks: [...down.kinks.map((k) => -k).reverse(), ...(joined ? [] : [0]), ...up.kinks],
		offsets: [...down.offsets.map((o) => -o).reverse(), ...up.offsets.slice(joined ? 1 : 0)],
		slopes: [...[...down.slopes].reverse(), ...up.slopes.slice(joined ? 1 : 0)],
		yieldTension: tension.yield ?? up.kinks[0] ?? Infinity,
		yieldCompression: compression.yield ?? down.kinks[0] ?? Infinity
	};
}

/** Slopes that differ by rounding only. */
const sameSlope = (a: number, b: number): boolean => Math.abs(a - b) <= 1e-12 * Math.abs(b);

function sideSegments({ points, beyond }: LawSide) {
	const kinks: number[] = [];
	const offsets: number[] = [];
	const slopes: number[] = [];
	let [strain, stress] = [0, 0];
	for (const [nextStrain, nextStress] of points) {
		const slope = (nextStress - stress) / (nextStrain - strain);
		const before = slopes.at(-1);
		if (before === undefined || !sameSlope(slope, before)) {
			if (before !== undefined) kinks.push(strain);
			slopes.push(slope);
			offsets.push(stress - slope * strain);
		}
		[strain, stress] = [nextStrain, nextStress];
	}
	kinks.push(strain);
	slopes.push(beyond ?? 0);
	offsets.push(beyond === null ? 0 : stress - beyond * strain);
	return { kinks, offsets, slopes };
}

/** Stress at a strain, N/mm²; at a kink the segment above it. */
export function stressAt(law: StressStrainLaw, strain: number): number {
	const at = segmentAt(law, strain);
	return law.offsets[at]! + law.slopes[at]! * strain;
}

/** Index of the segment that holds a strain. */
export function segmentAt({ kinks }: StressStrainLaw, strain: number): number {
	let at = 0;
	while (at < kinks.length && strain >= kinks[at]!) at++;
	return at;
}

/** Slope of the law at zero strain, N/mm²: the E that the section's elastic stiffness uses. */
export function initialModulus(law: StressStrainLaw): number {
	return law.slopes[segmentAt(law, 0)]!;
}

/** Greatest stress that a law can give in tension and in compression, N/mm², both positive; infinite while it hardens. */
export function lawLimits({ kinks, offsets, slopes }: StressStrainLaw): {
	tension: number;
	compression: number;
} {
	let tension = slopes.at(-1)! > 0 ? Infinity : 0;
	let compression = slopes[0]! > 0 ? Infinity : 0;
	kinks.forEach((kink, i) => {
		for (const segment of [i, i + 1]) {
			const stress = offsets[segment]! + slopes[segment]! * kink;
			tension = Math.max(tension, stress);
			compression = Math.max(compression, -stress);
		}
	});
	return { tension, compression };
}
