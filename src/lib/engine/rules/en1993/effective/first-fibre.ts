import type { Part } from '../../../section/prepared';
import type { EnModel } from '../model';
import type { Reduced } from './reduce';
import { farthestFibre } from './remaining-fibres';
import { stressField, type EffectiveBasis } from './stress-field';

/** The moment at which a fibre of what remains first reaches its own strength; N·mm, mm³ and N/mm². */
export interface FirstFibre {
	readonly moment: number;
	/** Moment over stress at that fibre. */
	readonly modulus: number;
	readonly strength: number;
	readonly side: 'compression' | 'tension';
	readonly part: string;
}

/**
 * Elastic moment of the reduced section without γM0: compression side and tension side of every part at
 * its own strength. Parts of one steel are taken together.
 */
export function firstFibre(model: EnModel, basis: EffectiveBasis, reduced: Reduced): FirstFibre {
	const { section, strengths } = model;
	const alike = !strengths.hybrid && strengths.even;
	const bodies = alike ? [section.parts] : section.parts.map((part) => [part]);
	const [first, ...others] = bodies.map((body) => firstOf(body, basis, reduced));
	return others.reduce((least, next) => (next.moment < least.moment ? next : least), first!);
}

function firstOf(
	parts: readonly Part[],
	basis: EffectiveBasis,
	{ remaining, strips }: Reduced
): FirstFibre {
	const { centre, alongY, alongZ } = stressField(remaining, basis);
	const atCentre = centre.y * alongY + centre.z * alongZ;
	const compressed = farthestFibre(parts, strips, alongY, alongZ) - atCentre;
	const pulled = farthestFibre(parts, strips, -alongY, -alongZ) + atCentre;
	const { name, material } = parts[0]!;
	const pressing = fibre('compression', name, material.fyc, compressed);
	const pulling = fibre('tension', name, material.fy, pulled);
	return pulling.moment < pressing.moment ? pulling : pressing;
}

/** `stress`: of the fibre under 1 N·mm; none or the other sign never yields in this sense. */
function fibre(
	side: FirstFibre['side'],
	part: string,
	strength: number,
	stress: number
): FirstFibre {
	const modulus = stress > 0 ? 1 / stress : Infinity;
	return { moment: strength * modulus, modulus, strength, side, part };
}
