import type { Loop, Point, Region } from '../geometry/boundary';
import type { GradeDefinition } from '../material/material';
import type { Issue, Note, Result } from '../result';

/** One piece of a shape before it is given a material. */
export interface ShapePart {
	readonly name: string;
	readonly region: Region;
	/** Its own thickness, mm. */
	readonly thickness: number;
	/** Grade stated at the piece itself (plates and outlines). */
	readonly grade?: GradeDefinition;
}

/** Torsion figures: mm⁴, mm⁶ and a point from the definition's origin; null where no formula applies. */
export interface TorsionFigures {
	readonly torsionConstant: number | null;
	readonly warpingConstant: number | null;
	readonly shearCentre: Point | null;
}

/** Geometry of a checked definition. */
export interface Shape {
	readonly parts: readonly ShapePart[];
	/** Merged outline: outer loops anticlockwise, holes clockwise. */
	readonly contours: readonly Loop[];
	readonly torsion: TorsionFigures;
	/** All parts take the strength of the thickest one (rolled and hollow shapes). */
	readonly oneThickness: boolean;
	readonly notes: readonly Note[];
}

export type ShapeResult = Result<Shape, Issue[]>;
