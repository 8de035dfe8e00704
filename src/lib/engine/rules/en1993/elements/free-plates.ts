import type { PlateStretch } from '../../../section/plates/stretches';
import { epsilonOf, type Strengths } from '../strengths';
import type { PlateElement } from './element';

/**
 * Free plates as Table 5.2 measures them: every stretch between its supports. ε comes from the
 * strongest of the plates that a stretch runs through or that hold its ends, since it follows their
 * strain (EN 1993-1-5 4.3(6) has that for webs; for every stretch it is on the safe side).
 */
export const stretchElements = (
	stretches: readonly PlateStretch[],
	strengths: Strengths
): PlateElement[] => stretches.map((stretch) => stretchElement(stretch, strengths));

function stretchElement(
	{ plate: part, id, type, thickness: t, from, to, heldBy, plates }: PlateStretch,
	{ of, modulus }: Strengths
): PlateElement {
	const fy = Math.max(of(part), ...plates.map(of), ...heldBy.map(of));
	const c = Math.hypot(to.y - from.y, to.z - from.z);
	return { id, part, type, c, t, fy, epsilon: epsilonOf(fy, modulus), from, to };
}
