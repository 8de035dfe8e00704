import type { GradeDefinition } from '../material/material';

/** Sizes in mm. Axes: y to the right, z up, seen along the member. */
interface Common {
	readonly grade: GradeDefinition;
	readonly partGrades?: Readonly<Record<string, GradeDefinition>>;
	readonly boltHoles?: readonly BoltHoles[];
}

export interface BoltHoles {
	readonly part: string;
	readonly diameter: number;
	readonly count: number;
}

export type Fabrication = 'rolled' | 'welded';

export interface ISection extends Common {
	readonly kind: 'i';
	readonly h: number;
	/** Top flange, or both. */
	readonly b: number;
	readonly tf: number;
	readonly bBottom?: number;
	readonly tfBottom?: number;
	readonly tw: number;
	readonly fabrication: Fabrication;
	/** Root radius, rolled. */
	readonly r?: number;
	/** Fillet leg, welded: sets the plate edge for slenderness, its area is not counted. */
	readonly weldLeg?: number;
	/** Instead of the leg: leg = throat × √2. */
	readonly weldThroat?: number;
}

export interface ChannelSection extends Common {
	readonly kind: 'channel';
	readonly h: number;
	readonly b: number;
	readonly tw: number;
	readonly tf: number;
	readonly r?: number;
	readonly rToe?: number;
	/** Slope of the inner flange face, per cent. */
	readonly flangeSlopePercent?: number;
	/** Where tf is measured: at b/2 from the toe, or at (b − tw)/2. */
	readonly tfAt?: 'half-flange' | 'half-outstand';
}

export interface TeeSection extends Common {
	readonly kind: 'tee';
	readonly h: number;
	readonly b: number;
	readonly tw: number;
	readonly tf: number;
	readonly fabrication: Fabrication;
	readonly r?: number;
	readonly weldLeg?: number;
	readonly weldThroat?: number;
}

export interface AngleSection extends Common {
	readonly kind: 'angle';
	/** Vertical leg, on the left. */
	readonly h: number;
	/** Horizontal leg, at the bottom. */
	readonly b: number;
	readonly t: number;
	readonly r?: number;
	readonly rToe?: number;
}

export interface RectangularHollowSection extends Common {
	readonly kind: 'rectangular-hollow';
	readonly h: number;
	readonly b: number;
	readonly t: number;
	/** Outside and inside corner radii. */
	readonly ro?: number;
	readonly ri?: number;
	readonly fabrication: 'hot-finished' | 'cold-formed';
}

export interface CircularHollowSection extends Common {
	readonly kind: 'circular-hollow';
	readonly d: number;
	readonly t: number;
}

export interface BoxSection extends Common {
	readonly kind: 'box';
	readonly h: number;
	/** Top flange, or both. */
	readonly b: number;
	readonly bBottom?: number;
	readonly tw: number;
	readonly tfTop: number;
	readonly tfBottom: number;
	/** Clear distance between the webs. */
	readonly webGap: number;
	readonly weldLeg?: number;
	readonly weldThroat?: number;
}

export interface FlatSection extends Common {
	readonly kind: 'flat';
	readonly b: number;
	readonly h: number;
}

export interface RoundSection extends Common {
	readonly kind: 'round';
	readonly d: number;
}

export interface Plate {
	readonly name: string;
	readonly width: number;
	readonly thickness: number;
	/** Centre of the plate. */
	readonly y: number;
	readonly z: number;
	/** Direction of the width, degrees anticlockwise from y. */
	readonly angle: number;
	readonly grade?: GradeDefinition;
}

export interface PlateJoin {
	readonly a: string;
	readonly b: string;
	readonly weldLeg?: number;
}

export interface PlatesSection extends Common {
	readonly kind: 'plates';
	readonly plates: readonly Plate[];
	readonly joins?: readonly PlateJoin[];
	/** Separate pieces act together by intent. */
	readonly tied?: boolean;
}

export type Ring = readonly (readonly [number, number])[];

export interface OutlineRegion {
	readonly outer: Ring;
	readonly holes?: readonly Ring[];
	readonly grade?: GradeDefinition;
}

export interface OutlineSection extends Common {
	readonly kind: 'outline';
	readonly regions?: readonly OutlineRegion[];
	/** Short form of one region. */
	readonly outer?: Ring;
	readonly holes?: readonly Ring[];
}

export type SectionDefinition =
	| ISection
	| ChannelSection
	| TeeSection
	| AngleSection
	| RectangularHollowSection
	| CircularHollowSection
	| BoxSection
	| FlatSection
	| RoundSection
	| PlatesSection
	| OutlineSection;

export type SectionKind = SectionDefinition['kind'];
