import type { Point } from '../geometry/boundary';

/** ε(y,z) = e0 − ky·(z−zc) + kz·(y−yc); e0 a plain number, curvatures in 1/m as in the contract. */
export interface StrainPlane {
	e0: number;
	ky: number;
	kz: number;
}

/** Resultant of the stresses of one sign; force in kN, tension positive (so compression is negative). */
export interface Resultant extends Point {
	force: number;
}

/** Straight line of zero strain: signed distance from the centroid along the normal of an axis at `angle` degrees. */
export interface NeutralAxis {
	distance: number;
	angle: number;
}

/** One state of the bent section. kN, kNm, 1/m, N/mm². */
export interface ResponseState {
	curvature: number | null;
	curvatureRatio: number | null;
	moment: number | null;
	N: number | null;
	My: number | null;
	Mz: number | null;
	e0: number | null;
	ky: number | null;
	kz: number | null;
	neutralAxis: NeutralAxis | null;
	/** Share of the area beyond the first line of its law, 0 to 1. */
	yieldedShare: number | null;
	extremes: {
		strainMin: number;
		strainMax: number;
		stressMin: number;
		stressMax: number;
	} | null;
	compression: Resultant | null;
	tension: Resultant | null;
	/** Distance between the two resultants, mm. */
	leverArm: number | null;
	converged: boolean;
}

export type Transverse = 'moment-zero' | 'curvature-zero';

/** How the section is bent: about an axis turned `axisAngle` degrees from y, at constant N (kN). */
export interface BendingPath {
	axisAngle: number;
	transverse: Transverse;
	N: number;
}

export interface FirstYield {
	/** 1/m; null when N alone already yields the section. */
	curvature: number | null;
	/** kNm */
	moment: number | null;
}
