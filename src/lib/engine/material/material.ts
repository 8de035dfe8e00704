import type { StressStrainLaw } from './law';
import type { RambergOsgood } from './ramberg-osgood';

/** Stress–strain law as asked for in a grade; strengths come from the grade itself. */
export type LawDefinition = LawShape & {
	/** No fibre is followed beyond this strain, in either sense; positive. */
	strainLimit?: number;
};

export type LawShape =
	| { type: 'elastic-plastic' }
	| { type: 'bilinear'; Eh: number; fu?: number }
	| { type: 'quad-linear' }
	| ({ type: 'ramberg-osgood' } & RambergOsgood)
	| {
			type: 'curve';
			tension: readonly (readonly [number, number])[];
			compression?: readonly (readonly [number, number])[];
			beyond: 'flat' | 'zero';
	  };

/** A named grade, a plain fy in N/mm² at any thickness, or strengths in full. */
export type GradeDefinition =
	| string
	| number
	| {
			fy: number;
			fyc?: number;
			fu?: number;
			E?: number;
			density?: number;
			law?: LawDefinition;
	  };

/** Which table of nominal strengths is used: EN 1993-1-1 Table 3.1, or the product standard's steps. */
export type StrengthBasis = 'code-table' | 'product-standard';

/** What one part is made of, at its thickness. Stresses N/mm², density kg/m³. */
export interface Material {
	readonly grade: string;
	readonly fy: number;
	/** Strength in compression where it differs; equals fy otherwise. */
	readonly fyc: number;
	readonly fu: number | null;
	readonly E: number;
	readonly density: number;
	readonly law: StressStrainLaw;
}
