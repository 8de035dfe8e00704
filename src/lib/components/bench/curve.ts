import type { Bending } from '$lib/engine/response/respond';

export interface CurvePoint {
	/** Curvature over the curvature at first yield. */
	readonly ratio: number;
	/** kNm */
	readonly moment: number;
}

/** Ratios from 0 to `most`, close together where the curve turns. */
export function curveRatios(most: number, pieces = 60): number[] {
	const elastic = [0, 0.25, 0.5, 0.75, 0.9];
	const grown = Array.from(
		{ length: pieces },
		(_, index) => most ** ((index / (pieces - 1)) ** 1.15)
	);
	return [...elastic, ...grown].filter((ratio) => ratio <= most + 1e-9);
}

/** Points of the moment–curvature curve at the ratios asked; those without a state are left out. */
export function curvePoints(
	bender: Bending,
	unit: number,
	ratios: readonly number[]
): CurvePoint[] {
	return ratios.flatMap((ratio) => {
		const moment = bender.momentAt(ratio * unit);
		return moment === null ? [] : [{ ratio, moment }];
	});
}
