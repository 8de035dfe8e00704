import type { FlatSection } from '../../../section/definition';

/** Class 1 limit of an outstand in uniform compression, Table 5.2 sheet 2. */
const outstandClassOne = 9;

/**
 * Whether a flat bar is stocky enough for class 1 under any stress. Table 5.2 has no row for a bar
 * with two free edges. Compressed, it buckles as a plate only by twisting, at G It/Ip = 4G(t/b)²,
 * which is just the critical stress of an outstand of c = b/2 on a hinged root (kσ = 0.425). Half the
 * width is therefore held to the outstand's class 1 limit, uniform compression being the worst it
 * can meet: b/t ≤ 18ε. Beyond, no class is claimed: all other buckling is that of the member.
 */
export function isStockyFlat({ b, h }: FlatSection, epsilon: number): boolean {
	return Math.max(b, h) / 2 <= outstandClassOne * epsilon * Math.min(b, h);
}
