import type { Loop, Point, Region } from '../geometry/boundary';
import type { Material, StrengthBasis } from '../material/material';
import type { Note } from '../result';
import type { SectionDefinition } from './definition';

/** One piece of steel with one material. Coordinates from the definition's origin, mm. */
export interface Part {
	readonly name: string;
	readonly region: Region;
	/** Thickness that sets its nominal strength, mm. */
	readonly thickness: number;
	readonly material: Material;
}

/** Properties of the gross section, in the contract's names; mm-based. */
export interface GrossProperties {
	area: number;
	/** kg/m */
	mass: number;
	centroid: Point;
	secondMomentY: number;
	secondMomentZ: number;
	/** +∫(y−yc)(z−zc)dA */
	productYZ: number;
	secondMomentU: number;
	secondMomentV: number;
	/** Degrees from y to u (major), in (−90, 90]. */
	principalAngle: number;
	elasticModulusYTop: number;
	elasticModulusYBottom: number;
	elasticModulusZLeft: number;
	elasticModulusZRight: number;
	radiusOfGyrationY: number;
	radiusOfGyrationZ: number;
	/** Geometry only: equal-area axis, whatever the grades. */
	plasticModulusY: number;
	plasticModulusZ: number;
	torsionConstant: number | null;
	warpingConstant: number | null;
	shearCentre: Point | null;
	perimeter: number;
	height: number;
	width: number;
}

/** Bounding box, mm. */
export interface Bounds {
	readonly left: number;
	readonly right: number;
	readonly bottom: number;
	readonly top: number;
}

/** A definition checked and turned into steel, once; everything else takes this. Immutable. */
export interface PreparedSection {
	readonly definition: SectionDefinition;
	readonly strengthBasis: StrengthBasis;
	readonly parts: readonly Part[];
	/** Outline of the whole section for drawing: outer loops and holes, parts merged. */
	readonly contours: readonly Loop[];
	readonly bounds: Bounds;
	readonly gross: GrossProperties;
	readonly notes: readonly Note[];
}
