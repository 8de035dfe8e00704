import type { Point } from '../../../geometry/boundary';

/**
 * A flat part as Table 5.2 measures it, mm: width c along its mid-thickness from `from` to `to`
 * (of an outstand from the supported root to the free tip).
 */
export interface PlateElement {
	/** Unique in the section: `topFlange.left`. */
	readonly id: string;
	readonly part: string;
	readonly type: 'internal' | 'outstand';
	readonly c: number;
	readonly t: number;
	/** Strength that its ε is taken from, N/mm². */
	readonly fy: number;
	readonly epsilon: number;
	readonly from: Point;
	readonly to: Point;
}

/** A round tube: outside diameter and wall, mm. */
export interface TubeElement {
	readonly part: string;
	readonly type: 'tubular';
	readonly c: number;
	readonly t: number;
	readonly fy: number;
	readonly epsilon: number;
	readonly centre: Point;
}

/** An angle in compression as a whole: full legs and thickness, mm. */
export interface AngleElement {
	/** The longer leg. */
	readonly part: string;
	readonly longer: number;
	readonly shorter: number;
	readonly t: number;
	readonly fy: number;
	readonly epsilon: number;
}

export type SectionElements =
	| {
			readonly kind: 'plates';
			readonly plates: readonly PlateElement[];
			readonly angle: AngleElement | null;
	  }
	| { readonly kind: 'tube'; readonly tube: TubeElement }
	/** A bar without plates that could buckle locally. */
	| { readonly kind: 'solid'; readonly part: string };

/** A flat part by its place alone. */
export type Flat = Pick<PlateElement, 'id' | 'part' | 'type' | 't' | 'from' | 'to'>;
