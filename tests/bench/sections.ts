import type { PlatesSection, SectionDefinition } from '../../src/lib/engine/section/definition';
import { prepareSection } from '../../src/lib/engine/section/prepare';
import type { PreparedSection } from '../../src/lib/engine/section/prepared';

export const ipe300: SectionDefinition = {
	...{ kind: 'i', h: 300, b: 150, tw: 7.1, tf: 10.7, r: 15 },
	...{ fabrication: 'rolled', grade: 'S355' }
};

/** Welded, of unequal flanges stronger than the web, which is of class 4. */
export const hybridGirder: SectionDefinition = {
	...{ kind: 'i', h: 1240, b: 300, tf: 18, bBottom: 400, tfBottom: 22, tw: 8, weldLeg: 6 },
	...{ fabrication: 'welded', grade: 'S355' },
	partGrades: { topFlange: 'S460N', bottomFlange: 'S460N' }
};

export const angle: SectionDefinition = {
	...{ kind: 'angle', h: 120, b: 80, t: 10, r: 11, rToe: 5.5, grade: 'S355' }
};

/** A comb of forty plates on a base, each standing beside the other. */
export const fortyPlates: PlatesSection = {
	kind: 'plates',
	grade: 'S355',
	plates: [
		{ name: 'base', width: 2000, thickness: 20, y: 0, z: 0, angle: 0 },
		...Array.from({ length: 39 }, (_, i) => ({
			...{ name: `rib ${i + 1}`, width: 150, thickness: 12, angle: 90 },
			...{ y: (i - 19) * 50, z: 85 }
		}))
	]
};

export function prepared(definition: SectionDefinition): PreparedSection {
	const result = prepareSection(definition);
	if (!result.ok) throw new Error(result.error.map(({ message }) => message).join(' '));
	return result.value;
}
