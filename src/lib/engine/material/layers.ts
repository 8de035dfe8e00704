import type { StressStrainLaw } from './law';

/**
 * An elastic–perfectly plastic layer: stress = modulus × elastic strain, and its elastic strain stays
 * between −compression and +tension (both positive, infinite for a layer that never yields).
 */
export interface Layer {
	/** N/mm²; negative where the law rises again after a plateau. */
	readonly modulus: number;
	readonly tension: number;
	readonly compression: number;
}

/** Slopes nearer than this share of E are the same. */
const sameSlope = 1e-9;

/**
 * A stress–strain law as parallel layers that all see the same strain (Masing 1926; Besseling 1958):
 * their sum is the law itself on first loading, and on reversal the same curve twice as long, which is
 * kinematic hardening with an elastic range of fy + fyc. Ordered by yield strain: in every state
 * reached from rest, a layer yields only once all before it do. Null for laws that have no such
 * model: softening, a drop to zero, or another modulus in tension than in compression.
 */
export function layersOf(law: StressStrainLaw): readonly Layer[] | null {
	const tension = sideOf(law, 1);
	const compression = sideOf(law, -1);
	if (!tension || !compression) return null;
	const E = tension[0]!.slope;
	if (Math.abs(compression[0]!.slope - E) > sameSlope * E) return null;
	return coupled(tension, compression, sameSlope * E);
}

/** A straight stretch of one side of a law: its slope, and the strain (positive) at which it ends. */
interface Stretch {
	slope: number;
	end: number;
}

function sideOf({ kinks, offsets, slopes }: StressStrainLaw, sign: 1 | -1): Stretch[] | null {
	const order = kinks.map((_, i) => i);
	const outwards = (sign > 0 ? order : order.reverse()).filter((i) => kinks[i]! * sign > 0);
	const found: Stretch[] = [];
	for (const i of outwards) {
		const [inner, outer] = sign > 0 ? [i, i + 1] : [i + 1, i];
		const at = (segment: number) => offsets[segment]! + slopes[segment]! * kinks[i]!;
		if (Math.abs(at(outer) - at(inner)) > 1e-9 * Math.abs(at(inner))) return null;
		found.push({ slope: slopes[inner]!, end: Math.abs(kinks[i]!) });
	}
	const beyond = sign > 0 ? slopes.length - 1 : 0;
	found.push({ slope: slopes[beyond]!, end: Infinity });
	return found.some(({ slope }) => slope < 0) ? null : found;
}

/**
 * Layers whose moduli add up to the slopes of both sides. Where the sides do not fall by the same
 * steps, the steps are shared out in order, which is possible as long as both only fall.
 */
function coupled(tension: Stretch[], compression: Stretch[], same: number): Layer[] | null {
	const [up, down] = [stepsOf(tension), stepsOf(compression)];
	const alike =
		up.length === down.length &&
		up.every(({ modulus }, i) => Math.abs(modulus - down[i]!.modulus) <= same);
	if (alike)
		return up.map(({ modulus, end }, i) => ({ modulus, tension: end, compression: down[i]!.end }));
	if ([...up, ...down].some(({ modulus }) => modulus < 0)) return null;
	const layers: Layer[] = [];
	for (let i = 0, j = 0; i < up.length && j < down.length;) {
		const [a, b] = [up[i]!, down[j]!];
		const modulus = Math.min(a.modulus, b.modulus);
		if (modulus > same) layers.push({ modulus, tension: a.end, compression: b.end });
		a.modulus -= modulus;
		b.modulus -= modulus;
		if (a.modulus <= same) i++;
		if (b.modulus <= same) j++;
	}
	return layers;
}

/** By how much the slope falls at the end of each stretch; the last keeps what is left. */
function stepsOf(stretches: readonly Stretch[]): { modulus: number; end: number }[] {
	return stretches
		.map(({ slope, end }, i) => ({ modulus: slope - (stretches[i + 1]?.slope ?? 0), end }))
		.filter(({ modulus }) => modulus !== 0);
}
