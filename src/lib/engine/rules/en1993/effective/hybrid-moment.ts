import { frameAt } from '../../../geometry/frame';
import { profileOf, type Profile } from '../../../geometry/profile';
import type { StressStrainLaw } from '../../../material/law';
import type { LawGroup } from '../../../response/law-groups';
import { planeForces } from '../../../response/plane-forces';
import { risingRoot } from '../../../response/rising-root';
import type { Part } from '../../../section/prepared';
import type { EnModel } from '../model';
import { cutLoops } from './cut-mechanics';
import type { MajorSense } from './flange-moments';
import type { Reduced } from './reduce';
import { farthestFibre } from './remaining-fibres';

/** A hybrid section at the yield of its first flange fibre; N·mm and 1/mm. */
export interface HybridMoment {
	readonly moment: number;
	readonly flanges: number;
	/** Of the webs, whose stress ends at their own strength. */
	readonly webs: number;
	readonly curvature: number;
	/** Where the flange fibre lies that yields first. */
	readonly side: 'compression' | 'tension';
	/** z of the neutral axis from the definition's origin. */
	readonly axis: number;
}

const webParts = new Set(['web', 'leftWeb', 'rightWeb']);
const balance = 1e-13;

/** Whether the webs of this section may yield before its flanges: an I or box with parts of different strength, bent about y. */
export const isHybridGirder = ({ section: { definition }, strengths }: EnModel): boolean =>
	strengths.hybrid && (definition.kind === 'i' || definition.kind === 'box');

/**
 * Elastic route of EN 1993-1-5 4.3(6) about y, without γM0: strains stay plane until the first flange
 * fibre reaches its own yield strength, stresses of the webs end at theirs. The neutral axis lies where
 * N is zero.
 */
export function hybridMoment(model: EnModel, sense: MajorSense, reduced: Reduced): HybridMoment {
	const { section, strengths } = model;
	const E = strengths.modulus;
	const upwards = sense === 'plusMy' ? 1 : -1;
	const frame = frameAt(section.gross.centroid, upwards > 0 ? 0 : Math.PI);
	const isWeb = ({ name }: Part) => webParts.has(name);
	const bodies = section.parts.map((part) => ({
		group: groupOf(part, isWeb(part) ? cappedLaw(part, E) : elasticLaw(E)),
		profile: profileOf(cutLoops(section, part, reduced.strips), frame),
		web: isWeb(part)
	}));
	const groups = bodies.map(({ group }) => group);
	const profiles = bodies.map(({ profile }) => profile);
	const limit = curvatureLimit(model, reduced, upwards);
	const at = (axis: number) => {
		const { curvature, rise } = limit(axis);
		const { N, NN, NM } = planeForces(groups, profiles, curvature * axis, curvature);
		return { value: N, slope: NN * curvature + (NN * axis + NM) * rise };
	};
	const { centroid } = section.gross;
	const guess = upwards * (reduced.remaining.z - centroid.z);
	const { x } = risingRoot(at, guess, section.gross.height / 16, balance * model.mechanics.squash);
	const { curvature, rise } = limit(x);
	const momentOf = (web: boolean) =>
		momentOfBodies(
			bodies.filter((body) => body.web === web),
			curvature * x,
			curvature
		);
	const [flanges, webs] = [momentOf(false), momentOf(true)];
	return {
		moment: flanges + webs,
		flanges,
		webs,
		curvature,
		side: rise > 0 ? 'compression' : 'tension',
		axis: centroid.z + upwards * x
	};
}

function momentOfBodies(
	bodies: readonly { group: LawGroup; profile: Profile }[],
	e0: number,
	curvature: number
): number {
	return planeForces(
		bodies.map(({ group }) => group),
		bodies.map(({ profile }) => profile),
		e0,
		curvature
	).M;
}

/**
 * Curvature at which the first flange fibre yields while the neutral axis lies at a level across (from
 * the gross centroid towards the compressed side), and how it rises with that level.
 */
function curvatureLimit(model: EnModel, reduced: Reduced, upwards: number) {
	const { section, strengths } = model;
	const flanges = section.parts
		.filter(({ name }) => !webParts.has(name))
		.map((part) => ({
			high: farthestFibre([part], reduced.strips, 0, upwards) - upwards * section.gross.centroid.z,
			low: -farthestFibre([part], reduced.strips, 0, -upwards) - upwards * section.gross.centroid.z,
			crushed: part.material.fyc / strengths.modulus,
			stretched: part.material.fy / strengths.modulus
		}));
	return (axis: number) => {
		let [curvature, rise] = [Infinity, 0];
		for (const { high, low, crushed, stretched } of flanges) {
			const [above, below] = [crushed / (high - axis), stretched / (axis - low)];
			if (above > 0 && above < curvature) [curvature, rise] = [above, above / (high - axis)];
			if (below > 0 && below < curvature) [curvature, rise] = [below, -below / (axis - low)];
		}
		return { curvature, rise };
	};
}

const elasticLaw = (E: number): StressStrainLaw => ({
	kinks: [],
	offsets: [0],
	slopes: [E],
	yieldTension: Infinity,
	yieldCompression: Infinity
});

function cappedLaw({ material: { fy, fyc } }: Part, E: number): StressStrainLaw {
	return {
		kinks: [-fyc / E, fy / E],
		offsets: [-fyc, 0, fy],
		slopes: [0, E, 0],
		yieldTension: fy / E,
		yieldCompression: fyc / E
	};
}

const groupOf = ({ region, material: { fy, fyc } }: Part, law: StressStrainLaw): LawGroup => ({
	loops: region.loops,
	law,
	modulus: law.slopes[0]!,
	fy,
	fyc,
	most: { tension: fy, compression: fyc },
	cuts: [],
	cutOffsets: [],
	cutSlopes: []
});
