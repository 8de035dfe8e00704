import type { PartStress } from './stress-profile';

/** A stop of the tint that deepens with stress: `at` from 0 (top) to 1 (bottom). */
export interface TintStop {
	readonly at: number;
	readonly sense: 'tension' | 'compression';
	readonly opacity: number;
}

const pale = 0.07;
const deep = 0.5;

/** Stops of the elastic tint over one part; opacity rises with |stress| over its own strength. */
export function tintStops({ part, knots }: PartStress): TintStop[] {
	const span = part.top - part.bottom || 1;
	return knots.flatMap(({ depth, stress }, index) => {
		const at = Math.max(0, Math.min(1, (part.top - depth) / span));
		const strength = stress < 0 ? part.fyc : part.fy;
		const opacity = pale + (deep - pale) * Math.min(1, Math.abs(stress) / strength);
		const own = stress === 0 ? null : stress < 0 ? 'compression' : 'tension';
		return stopsAt(at, opacity, own, neighbour(knots, index, -1), neighbour(knots, index, 1));
	});
}

type Sense = TintStop['sense'] | null;

function neighbour(knots: PartStress['knots'], index: number, step: 1 | -1): Sense {
	const stress = knots[index + step]?.stress ?? 0;
	if (Math.abs(stress) < 1e-9) return null;
	return stress < 0 ? 'compression' : 'tension';
}

/** At zero stress the colour changes: one stop for each side. */
function stopsAt(at: number, opacity: number, own: Sense, before: Sense, after: Sense): TintStop[] {
	if (own) return [{ at, sense: own, opacity }];
	const senses = [before, after].filter((sense): sense is TintStop['sense'] => sense !== null);
	return senses.map((sense) => ({ at, sense, opacity }));
}
