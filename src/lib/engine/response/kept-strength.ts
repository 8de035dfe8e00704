import type { StressStrainLaw } from '../material/law';
import type { Note } from '../result';
import type { Mechanics } from './law-groups';

/** Stresses this close are the same, as a share. */
const rounding = 1e-9;

/** Whether a law, once it has given a strength (N/mm²), gives no less under any greater strain of that sense. */
function keeps({ kinks, offsets, slopes }: StressStrainLaw, strength: number, sense: 1 | -1) {
	const least = strength * (1 - rounding);
	const outwards = kinks.map((_, i) => i).filter((i) => kinks[i]! * sense > 0);
	if (sense < 0) outwards.reverse();
	let reached = false;
	for (const i of outwards) {
		const stress = (segment: number) => sense * (offsets[segment]! + slopes[segment]! * kinks[i]!);
		const [before, after] = sense > 0 ? [i, i + 1] : [i + 1, i];
		if (reached && stress(before) < least) return false;
		reached ||= stress(before) >= least;
		if (reached && stress(after) < least) return false;
	}
	return (sense > 0 ? slopes.at(-1)! : slopes[0]!) >= 0;
}

/**
 * Whether every fibre keeps its strength however far it is strained: without that the full plastic block,
 * all fibres at their strength at once, is more than the section ever bears.
 */
export const keepsStrength = ({ groups }: Mechanics): boolean =>
	groups.every(({ law, fy, fyc }) => keeps(law, fy, 1) && keeps(law, fyc, -1));

/** Why a section whose law loses its strength has no full plastic figure. */
export const lostStrengthNote: Note = {
	code: 'strength-not-kept',
	message:
		'The stress–strain law falls below its yield strength, or to zero, as strain grows: not every fibre can be at its strength at once, and no full plastic figure is given.'
};
