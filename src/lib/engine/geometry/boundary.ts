/** A point of the cross-section, mm: y to the right, z up. */
export interface Point {
	readonly y: number;
	readonly z: number;
}

export interface LineEdge {
	readonly kind: 'line';
	readonly from: Point;
	readonly to: Point;
}

/** True circular arc; `start` and `sweep` in radians, sweep positive anticlockwise. */
export interface ArcEdge {
	readonly kind: 'arc';
	readonly centre: Point;
	readonly radius: number;
	readonly start: number;
	readonly sweep: number;
}

export type Edge = LineEdge | ArcEdge;

/** A closed chain of edges, each beginning where the one before ends. */
export type Loop = readonly Edge[];

/** Area to the left of its loops: outer loops anticlockwise, holes clockwise. */
export interface Region {
	readonly loops: readonly Loop[];
}
