/** A quantity that is linear over the section: c + y·Y + z·Z, with Y, Z from the gross centroid, mm. */
export interface LinearField {
	readonly c: number;
	readonly y: number;
	readonly z: number;
}

export const zeroField: LinearField = { c: 0, y: 0, z: 0 };

export const fieldSum = (a: LinearField, b: LinearField, factor = 1): LinearField => ({
	c: a.c + factor * b.c,
	y: a.y + factor * b.y,
	z: a.z + factor * b.z
});

export const shifted = (a: LinearField, by: number): LinearField => ({ ...a, c: a.c + by });

export const scaled = (a: LinearField, by: number): LinearField => ({
	c: a.c * by,
	y: a.y * by,
	z: a.z * by
});

/** Strain plane of the frame of an axis at `angle` radians: ε = e0 − curvature·across + turn·along. */
export function strainField(
	angle: { cos: number; sin: number },
	{ e0, curvature, turn }: { e0: number; curvature: number; turn: number }
): LinearField {
	const { cos, sin } = angle;
	return { c: e0, y: curvature * sin + turn * cos, z: turn * sin - curvature * cos };
}
