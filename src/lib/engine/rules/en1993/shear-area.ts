import type { WorkingInput } from '../../explain/working';
import type { PreparedSection } from '../../section/prepared';
import { angleAreas, channelAreas, rolledIAreas, teeAreas, weldedIAreas } from './shear-area-open';
import { barAreas, parallelPlates, roundAreas } from './shear-area-solid';
import { boxAreas, circularHollowAreas, rectangularHollowAreas } from './shear-area-closed';

/** A flat plate that the shear runs along: clear depth and thickness, mm. */
export interface ShearPanel {
	readonly part: string;
	readonly depth: number;
	readonly thickness: number;
	/** What holds its long edges; a tube's wall is held at both, but its buckling is not covered. */
	readonly support: 'both-edges' | 'one-edge' | 'tube';
}

/** Shear area along one axis, mm², and what it is made of. */
export interface ShearArea {
	readonly area: number;
	/** Share of each part's area that belongs to the shear area; parts that are left out have none. */
	readonly shares: Readonly<Record<string, number>>;
	/** Letter of the clause's list; null where the code names no area for this shape. */
	readonly letter: string | null;
	/** The area in the grammar of workings, and the numbers in it. */
	readonly formula: string;
	readonly inputs: readonly WorkingInput[];
	readonly panels: readonly ShearPanel[];
	/** The plates in shear, for words. */
	readonly plate: string;
}

/** Null along an axis for which no safe area is known. */
export interface ShearAreas {
	readonly y: ShearArea | null;
	readonly z: ShearArea | null;
}

/** Shear areas of 6.2.6(3) (2022: 8.2.6(3)); η counts for the webs of I and box sections alone. */
export function shearAreasOf(section: PreparedSection, eta: number): ShearAreas {
	const { definition, gross } = section;
	switch (definition.kind) {
		case 'i':
			return definition.fabrication === 'rolled'
				? rolledIAreas(definition, gross.area, eta)
				: weldedIAreas(definition, eta);
		case 'channel':
			return channelAreas(definition, gross.area);
		case 'tee':
			return teeAreas(definition, gross.area);
		case 'angle':
			return angleAreas(definition);
		case 'box':
			return boxAreas(definition, gross.area, eta);
		case 'rectangular-hollow':
			return rectangularHollowAreas(definition, gross.area);
		case 'circular-hollow':
			return circularHollowAreas(gross.area);
		case 'flat':
			return barAreas(definition);
		case 'round':
			return roundAreas(gross.area);
		case 'plates':
			return parallelPlates(definition.plates);
		case 'outline':
			return { y: null, z: null };
	}
}
