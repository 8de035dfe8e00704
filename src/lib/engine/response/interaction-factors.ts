import type { PreparedSection } from '../section/prepared';
import { isStraight, type InteractionPoint } from './interaction';
import { fibreUse } from './interaction-fibres';
import { elasticSection } from './interaction-first-yield';
import { keepsStrength } from './kept-strength';
import { mechanicsOf, type Mechanics } from './law-groups';
import { plasticMomentOf } from './plastic';

/** Multiples of a demand, all its forces in proportion, at which it meets each limit. */
export interface LoadFactors {
	/** Null where the section has no straight elastic range. */
	firstYield: number | null;
	/** Null where a law does not keep its strength. */
	plastic: number | null;
}

/**
 * How far a demand (kN, kNm about the gross centroid) may grow in proportion until it meets first
 * yield and full plastic: below 1 it lies outside. Both null for a demand of nothing.
 */
export function interactionWith(section: PreparedSection, demand: InteractionPoint): LoadFactors {
	const { N, My, Mz } = demand;
	if (N === 0 && My === 0 && Mz === 0) return { firstYield: null, plastic: null };
	const mechanics = mechanicsOf(section);
	return {
		firstYield: isStraight(mechanics) ? elasticFactor(mechanics, demand) : null,
		plastic: keepsStrength(mechanics) ? plasticFactor(mechanics, demand) : null
	};
}

function elasticFactor(mechanics: Mechanics, { N, My, Mz }: InteractionPoint): number {
	const { bodies, planeOf } = elasticSection(mechanics);
	const plane = planeOf(N * 1e3, My * 1e6, Mz * 1e6);
	return 1 / fibreUse(bodies, plane, plane).use;
}

function plasticFactor(mechanics: Mechanics, { N, My, Mz }: InteractionPoint): number {
	const moment = Math.hypot(My, Mz);
	const axisAngle = (Math.atan2(Mz, My) * 180) / Math.PI;
	const most = (factor: number, turned: number) =>
		plasticMomentOf(mechanics, {
			axisAngle: axisAngle + turned,
			transverse: 'moment-zero',
			N: N * factor
		}).moment ?? -Infinity;
	if (N === 0) return most(0, 0) / moment;
	const end = squashFactor(mechanics, N * 1e3);
	// both ends of the line of moments through the demand: with unequal strengths N alone may pass either
	const left = (factor: number) =>
		Math.min(most(factor, 0) - factor * moment, most(factor, 180) + factor * moment);
	return lastWithin(left, end);
}

function squashFactor(mechanics: Mechanics, N: number): number {
	const bears = mechanics.profiles(0).reduce((sum, { total }, i) => {
		const { fy, fyc } = mechanics.groups[i]!;
		return sum + (N > 0 ? fy : fyc) * total[0]!;
	}, 0);
	return bears / Math.abs(N);
}

/** Root of a concave function that is above 0 at 0, or `end` when it stays there. */
function lastWithin(left: (factor: number) => number, end: number): number {
	let [low, high] = [0, end];
	let [atLow, atHigh] = [left(0), left(end)];
	if (atHigh >= 0) return end;
	for (let i = 0; i < 100 && high - low > 1e-15 * end; i++) {
		const secant = low + ((high - low) * atLow) / (atLow - atHigh);
		const middle = i % 3 === 2 || !(secant > low && secant < high) ? (low + high) / 2 : secant;
		const value = left(middle);
		if (value >= 0) [low, atLow] = [middle, value];
		else [high, atHigh] = [middle, value];
		if (value === 0) return middle;
	}
	return low;
}
