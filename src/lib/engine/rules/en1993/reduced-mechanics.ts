import { mechanicsOf, type Mechanics } from '../../response/law-groups';
import type { Part, PreparedSection } from '../../section/prepared';

/**
 * The section's mechanics with other strengths of its parts (N/mm²), for plastic blocks only: a
 * block takes a part's strength, not its law.
 */
export function mechanicsWith(
	section: PreparedSection,
	strength: (part: Part) => { fy: number; fyc: number }
): Mechanics {
	const parts = section.parts.map((part) => ({
		...part,
		material: { ...part.material, ...strength(part) }
	}));
	return mechanicsOf({ ...section, parts });
}
