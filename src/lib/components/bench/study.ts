import type { StrengthBasis } from '$lib/engine/material/material';
import type { ResidualPattern } from '$lib/engine/material/residual/pattern';
import type { CodeChoice, Demand, Stiffeners } from '$lib/engine/rules/result';
import type { SectionDefinition } from '$lib/engine/section/definition';
import type { Turn } from './turns';

/** A demand case on the Bench: always named, so that the governing one can be. */
export type DemandCase = Demand & { name: string };

/** Everything that a figure on the Bench depends on. Immutable: a change makes a new one. */
export interface Study {
	/** Designation of the catalogue shape it was taken from; null once a size is changed. */
	readonly shape: string | null;
	readonly section: SectionDefinition;
	readonly code: Partial<CodeChoice>;
	readonly strengthBasis: StrengthBasis;
	readonly demands: readonly DemandCase[];
	/** Residual stress that bending begins with; none when absent. The code's figures do not know of it. */
	readonly residual?: Exclude<ResidualPattern, 'none'> | undefined;
	/** Transverse stiffeners of the web; absent where there are none. */
	readonly stiffeners?: Stiffeners | undefined;
}

/** How the section is bent at the moment: no part of what is saved or undone. */
export interface BendChoice {
	/** Degrees anticlockwise from y. */
	readonly axisAngle: number;
	readonly transverse: 'moment-zero' | 'curvature-zero';
	/** Curvature over the curvature at first yield. */
	readonly ratio: number;
	/** Which demand case gives N and the ruler; null for the governing one. */
	readonly activeCase: number | null;
	/** Where bending turned before; none when absent. */
	readonly turns?: readonly Turn[];
	/** It stands where the last turn left it. */
	readonly atTurn?: boolean;
	/** N held while bending, kN, where it is not the demand's. */
	readonly typedN?: number;
}

export const openingStudy: Study = {
	shape: null,
	section: {
		kind: 'i',
		h: 940,
		b: 400,
		tf: 20,
		bBottom: 400,
		tfBottom: 20,
		tw: 14,
		fabrication: 'welded',
		weldLeg: 8,
		grade: 'S355'
	},
	code: { standard: 'EN1993-1-1:2005', gammaM0: 1, eta: 1.2, allowEffectiveClass2: true },
	strengthBasis: 'product-standard',
	demands: [{ name: 'Case 1', My: 2400 }]
};

export const openingBend: BendChoice = {
	axisAngle: 0,
	transverse: 'moment-zero',
	ratio: 2,
	activeCase: null
};

/** A name no other case has: "Case 3". */
export function freeCaseName(demands: readonly DemandCase[]): string {
	let number = demands.length + 1;
	while (demands.some(({ name }) => name === `Case ${number}`)) number += 1;
	return `Case ${number}`;
}
