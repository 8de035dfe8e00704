import type { PlateStretch } from '../../../section/plates/stretches';
import { epsilonOf, type Strengths } from '../strengths';
import type { PlateElement } from './element';

/**
 * Free plates as Table 5.2 measures them: every stretch between its supports. ε of an
 * outstand comes from its own plates; of an internal stretch from the strongest of its own and of those
 * that hold its ends, since it follows their strain (EN 1993-1-5 4.3(6) has that for webs).
 */
export const stretchElements = (
	stretches: readonly PlateStretch[],
	strengths: Strengths
): PlateElement[] => stretches.map((stretch) => stretchElement(stretch, strengths));

function stretchElement(
	{ plate: part, id, type, thickness: t, from, to, heldBy, plates }: PlateStretch,
	{ of, modulus }: Strengths
): PlateElement {
	const own = Math.max(of(part), ...plates.map(of));
	const fy = type === 'internal' ? Math.max(own, ...heldBy.map(of)) : own;
	const c = Math.hypot(to.y - from.y, to.z - from.z);
	return { id, part, type, c, t, fy, epsilon: epsilonOf(fy, modulus), from, to };
}
