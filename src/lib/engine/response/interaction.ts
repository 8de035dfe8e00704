import { fail, ok, type Issue, type Result } from '../result';
import type { PreparedSection } from '../section/prepared';
import { firstYieldCurve } from './interaction-first-yield';
import { plasticCurve } from './interaction-plastic';
import { spreadingPoints, type PlanePoint } from './interaction-spread';
import { keepsStrength, lostStrengthNote } from './kept-strength';
import { mechanicsOf, type Mechanics } from './law-groups';

export type InteractionLimit = 'first-yield' | 'plastic';
export type InteractionPlane = 'N-My' | 'N-Mz' | 'My-Mz';

export interface InteractionRequest {
	limit: InteractionLimit;
	plane: InteractionPlane;
	/** kN, for My–Mz; 0 when absent. */
	N?: number;
	/** Entries of the loop, the last repeating the first. */
	points?: number;
}

/** kN and kNm about the gross centroid. */
export interface InteractionPoint {
	N: number;
	My: number;
	Mz: number;
}

export interface InteractionCurve {
	/** Anticlockwise in the plane (first-named force to the right); the last point is the first again. */
	points: InteractionPoint[];
}

export const interactionPoints = { least: 12, most: 720, usual: 72 } as const;

/**
 * The curve of one limit in one plane of forces, the moment not in the plane held at zero: every
 * point lies on it. First yield: a fibre reaches the strain at which its law leaves its first line.
 * Plastic: every fibre at its own fy or fyc. Fails when N is beyond the section, or where a law is
 * stiffer in one sense than in the other (first yield then follows no straight line) or does not keep
 * its strength (there is then no full plastic block).
 */
export function interactionCurve(
	section: PreparedSection,
	request: InteractionRequest
): Result<InteractionCurve, Issue> {
	const steps = interactionTracing(section, request);
	for (;;) {
		const { done, value } = steps.next();
		if (done) return value;
	}
}

/** The same curve as a generator, so that it can pause: it yields before every point. */
export function* interactionTracing(
	section: PreparedSection,
	{ limit, plane, N = 0, points = interactionPoints.usual }: InteractionRequest
): Generator<void, Result<InteractionCurve, Issue>> {
	const mechanics = mechanicsOf(section);
	if (limit === 'first-yield' && !isStraight(mechanics)) return fail(bentIssue);
	if (limit === 'plastic' && !keepsStrength(mechanics)) return fail(lostStrengthIssue);
	const make = limit === 'plastic' ? plasticCurve : firstYieldCurve;
	const curve = make(mechanics, plane, N * 1e3);
	if (curve === null) return fail(outsideIssue(N, limit));
	const spread = yield* spreadingPoints(curve, points - 1);
	const loop = spread.map((point) => inUnits(plane, point, N));
	return ok({ points: [...loop, { ...loop[0]! }] });
}

/** Whether every law starts with one slope in both senses. */
export const isStraight = ({ groups }: Mechanics): boolean =>
	groups.every(({ law }) => !law.kinks.includes(0));

const bentIssue: Issue = {
	path: 'limit',
	message:
		'A stress–strain law of this section starts with another slope in compression than in tension: it has no first-yield curve of straight lines.'
};

const lostStrengthIssue: Issue = { path: 'limit', message: lostStrengthNote.message };

const outsideIssue = (N: number, limit: InteractionLimit): Issue => ({
	path: 'N',
	message: `N = ${Number(N.toPrecision(6))} kN is beyond what the section bears ${limit === 'plastic' ? 'fully plastic' : 'before first yield'}.`
});

function inUnits(plane: InteractionPlane, { a, b }: PlanePoint, N: number): InteractionPoint {
	switch (plane) {
		case 'N-My':
			return { N: a * 1e-3 + 0, My: b * 1e-6 + 0, Mz: 0 };
		case 'N-Mz':
			return { N: a * 1e-3 + 0, My: 0, Mz: b * 1e-6 + 0 };
		case 'My-Mz':
			return { N, My: a * 1e-6 + 0, Mz: b * 1e-6 + 0 };
	}
}
