import type { Point } from './boundary';
import { heapBy } from './heap';
import { sidesOf, touchAt, touchReaches, woundRings, type Reach } from './touch-reaches';
import { touchingRadius, type Sides } from './touching-circle';

/** A reach with the greatest radius that a circle touching there can have, as far as that is known. */
interface Promised extends Reach {
	readonly most: number;
}

/** The search ends when nothing is left that is larger than this. */
const enough = 1 + 1e-11;
/** Work that one search may take: places times sides, a few tens of milliseconds. */
const workAtMost = 3e6;

/**
 * Diameter of the largest circle within an outline (first ring) and its holes, mm. It touches the
 * outline somewhere: every side, and the directions at every corner that points inwards, are
 * divided, most promising first, until no part can touch a larger circle. However long and thin the
 * outline, that takes the same work. One too intricate to settle gives the most that it can be:
 * thicker is never the stronger.
 */
export function inscribedDiameter(rings: readonly (readonly Point[])[]): number {
	const ringed = woundRings(rings);
	const sides = sidesOf(ringed);
	const [width, height] = [spanOf(sides, 0), spanOf(sides, 1)];
	const rounding = 4 * Number.EPSILON * Math.hypot(width, height);
	const left = heapBy<Promised>(({ most }) => most);
	for (const reach of firstPromises(ringed, sides, Math.min(width, height) / 2)) left.push(reach);
	const stepsAtMost = Math.max(400, workAtMost / (sides.length / 4));
	let best = 0;
	for (let steps = 0; ; steps++) {
		const reach = left.pop();
		if (!reach || reach.most <= best * enough + rounding) return 2 * best;
		if (steps >= stepsAtMost) return 2 * reach.most;
		const seen = examined(reach, sides, reach.most);
		best = Math.max(best, seen.from.radius, seen.to.radius);
		if (seen.most <= best * enough + rounding) continue;
		for (const part of divided(reach, seen, sides, steps)) left.push(part);
	}
}

/** Extent of the sides' starts along y (0) or z (1), mm. */
function spanOf(sides: Sides, axis: 0 | 1): number {
	let [least, most] = [Infinity, -Infinity];
	for (let k = axis; k < sides.length; k += 4) {
		least = Math.min(least, sides[k]!);
		most = Math.max(most, sides[k]!);
	}
	return most - least;
}

/** How many sides before and after one are asked first. */
const nearBy = 3;

/**
 * Every reach with what a few sides say of it: its neighbours, and those about the one that stood opposite
 * the reach before; all sides only where these say much less than before.
 */
function firstPromises(
	rings: readonly (readonly Point[])[],
	sides: Sides,
	widest: number
): Promised[] {
	const count = sides.length / 4;
	let [own, opposite, before] = [0, 0, widest];
	const promised = (reach: Reach): Promised => {
		let most = widest;
		const ask = (about: number) => {
			for (let k = about - nearBy; k <= about + nearBy; k++) {
				const side = ((k % count) + count) % count;
				const radius = mostBy(reach, sides, side, most);
				if (radius < most) [most, opposite] = [radius, side];
			}
		};
		ask(opposite);
		ask(own);
		if (most > 1.5 * before || before === widest) {
			const seen = examined(reach, sides, most);
			[most, opposite] = [seen.most, seen.opposite ?? opposite];
		}
		before = most;
		return { ...reach, most };
	};
	const groups = rings.flatMap(touchReaches);
	return groups.flatMap((reaches, side) => {
		own = side;
		return reaches.map(promised);
	});
}

/** What a side says of a reach: a circle that touches it is no larger than at its ends. */
const mostBy = ({ from, to }: Reach, sides: Sides, side: number, most?: number): number =>
	Math.max(touchingRadius(from, sides, side, most), touchingRadius(to, sides, side, most));

/** The largest circle that touches an end of a reach, and the side that it is stopped by. */
interface Stopped {
	readonly radius: number;
	readonly by: number | null;
}

interface Examined {
	readonly most: number;
	readonly opposite: number | null;
	readonly from: Stopped;
	readonly to: Stopped;
}

/** What all sides say of a reach that holds no larger circle than `most`. */
function examined({ from, to }: Reach, sides: Sides, atMost: number): Examined {
	let [most, opposite] = [atMost, -1];
	let [fromRadius, fromBy, toRadius, toBy] = [atMost, -1, atMost, -1];
	for (let side = 0; side < sides.length / 4; side++) {
		const a = touchingRadius(from, sides, side, most);
		const b = touchingRadius(to, sides, side, most);
		if (a < fromRadius) [fromRadius, fromBy] = [a, side];
		if (b < toRadius) [toRadius, toBy] = [b, side];
		if (a < most && b < most) [most, opposite] = [Math.max(a, b), side];
	}
	return {
		...{ most, opposite: known(opposite) },
		from: { radius: fromRadius, by: known(fromBy) },
		to: { radius: toRadius, by: known(toBy) }
	};
}

const known = (side: number): number | null => (side < 0 ? null : side);

/** A reach in two, where the sides that stop the circle at its ends would meet it at one radius; now and then in the middle. */
function divided(reach: Reach, seen: Examined, sides: Sides, steps: number): Promised[] {
	const at = touchAt(reach, steps % 3 === 2 ? 0.5 : crossing(reach, seen, sides));
	const asked = [seen.from.by, seen.to.by, seen.opposite].filter((side) => side !== null);
	return [
		{ from: reach.from, to: at },
		{ from: at, to: reach.to }
	].map((part) => ({
		...part,
		most: asked.reduce((most, side) => Math.min(most, mostBy(part, sides, side)), seen.most)
	}));
}

/** A crossing nearer to an end than this share divides nothing. */
const nearEnd = 1e-9;

function crossing(reach: Reach, { from, to }: Examined, sides: Sides): number {
	if (from.by === null || to.by === null) return 0.5;
	const rise = touchingRadius(reach.to, sides, from.by) - from.radius;
	const fall = touchingRadius(reach.from, sides, to.by) - to.radius;
	const share = (fall + to.radius - from.radius) / (rise + fall);
	return share > nearEnd && share < 1 - nearEnd ? share : 0.5;
}
