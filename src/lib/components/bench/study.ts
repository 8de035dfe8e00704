import type { StrengthBasis } from '$lib/engine/material/material';
import type { CodeChoice, Demand } from '$lib/engine/rules/result';
import type { SectionDefinition } from '$lib/engine/section/definition';

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

/** The section in few words: the shape's designation, or its kind and size. */
export function studyTitle({ shape, section }: Study): string {
	return shape ?? sectionTitle(section);
}

const size = (value: number) => String(Math.round(value * 10) / 10);

function sectionTitle(section: SectionDefinition): string {
	switch (section.kind) {
		case 'i':
			return section.fabrication === 'welded'
				? `Plate girder ${size(section.h)} × ${size(section.b)}`
				: `I-section ${size(section.h)} × ${size(section.b)}`;
		case 'channel':
			return `Channel ${size(section.h)} × ${size(section.b)}`;
		case 'tee':
			return `Tee ${size(section.h)} × ${size(section.b)}`;
		case 'angle':
			return `Angle ${size(section.h)} × ${size(section.b)} × ${size(section.t)}`;
		case 'rectangular-hollow':
			return `Hollow ${size(section.h)} × ${size(section.b)} × ${size(section.t)}`;
		case 'circular-hollow':
			return `Tube ${size(section.d)} × ${size(section.t)}`;
		case 'box':
			return `Box girder ${size(section.h)} × ${size(section.b)}`;
		case 'flat':
			return `Flat ${size(section.b)} × ${size(section.h)}`;
		case 'round':
			return `Round ${size(section.d)}`;
		case 'plates':
			return `${section.plates.length} plates`;
		case 'outline':
			return 'Outline';
	}
}
