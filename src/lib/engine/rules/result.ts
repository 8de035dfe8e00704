import type { Note } from '../result';

/** The contract's demand: factored design effects, kN and kNm. */
export interface Demand {
	name?: string;
	N?: number;
	My?: number;
	Mz?: number;
	Vy?: number;
	Vz?: number;
	unbracedLength?: number;
	C1?: number;
	zg?: number;
}

export type Standard =
	'EN1993-1-1:2005' | 'EN1993-1-1:2022' | 'AISC360-22' | 'CSA-S16:19' | 'AS4100' | 'IS800';

/** The code and its choices, defaults filled in. */
export interface CodeChoice {
	standard: Standard;
	gammaM0: number;
	gammaM1: number;
	gammaM2: number;
	eta: number;
	method: 'LRFD' | 'ASD';
	classAlpha: 'actual-N' | 'proportional';
	allowEffectiveClass2: boolean;
	/** Class 4 taken as class 3 where the stress is low enough, 5.5.2(9) of EN 1993-1-1:2005. */
	useStressLevel: boolean;
	/** Buckling curves of lateral–torsional buckling: 6.3.2.2, or 6.3.2.3 for rolled I and their like. */
	ltbCurves: 'general' | 'rolled-or-equivalent';
}

/** Transverse stiffeners of a web. */
export interface Stiffeners {
	/** Clear distance between them, mm. */
	spacing: number;
	endPost: 'rigid' | 'non-rigid';
}

export type SectionClass = 1 | 2 | 3 | 4;

export interface ClassifiedElement {
	part: string;
	/** Which element of the part: `topFlange.left`. Absent where the part is judged as a whole. */
	element?: string;
	type: 'internal' | 'outstand' | 'tubular' | 'angle';
	stress: 'compression' | 'bending' | 'combined' | 'tension';
	c: number;
	t: number;
	slenderness: number;
	epsilon: number;
	alpha?: number;
	psi?: number;
	/** Limits of classes 1, 2, 3 on the slenderness; empty for a part in tension. */
	limits: number[];
	class: SectionClass;
	clause: string;
}

export interface Classification {
	standard: Standard;
	overall: SectionClass;
	basis: '+My' | '−My' | 'N' | 'demand';
	elements: ClassifiedElement[];
	governing: string;
	byCase: {
		plusMy: SectionClass | null;
		minusMy: SectionClass | null;
		plusMz: SectionClass | null;
		minusMz: SectionClass | null;
		compression: SectionClass | null;
	};
}

export interface ResistanceCheck {
	demand: string;
	name: string;
	clause: string;
	value: number;
	limit: number;
	utilisation: number;
}

export interface Resistance {
	standard: Standard;
	basis: 'plastic' | 'effective-class-2' | 'interpolated' | 'elastic' | 'effective';
	MyRd: number | null;
	MyRdNegative: number | null;
	MzRd: number | null;
	NRd: number | null;
	NtRd: number | null;
	VyRd: number | null;
	VzRd: number | null;
	/** Of the demand that is answered for: the one that uses most, or misses a check. */
	VbRd?: number;
	MbRd?: number;
	MyVRd?: number;
	MyNRd?: number;
	MzNRd?: number;
	checks: ResistanceCheck[];
	/** Null when a check that applies is missing. */
	utilisation: { governing: string; value: number } | null;
}

/** Resistances beside a demand's own N and V; kN, kNm, mm. What does not apply is absent. */
export interface ReducedFigures {
	MyVRd?: number;
	MzVRd?: number;
	/** Beside N by the code, and of the exact plastic block. */
	MyNRd?: number;
	MyNRdExact?: number;
	MzNRd?: number;
	MzNRdExact?: number;
	/** Of the plastic block along the demand's own direction beside N. */
	MNRd?: number;
	/** Beside N and high shear. */
	MNVRd?: number;
	NVRd?: number;
	/** Exponents of the biaxial curve. */
	alpha?: number;
	beta?: number;
	/** Moments that N adds about a shifted effective centroid. */
	deltaMy?: number;
	deltaMz?: number;
	/** Lateral–torsional buckling. */
	MbRd?: number;
	Mcr?: number;
	lambdaLT?: number;
	chiLT?: number;
	/** Shear buckling along z with the flanges' share. */
	VbRd?: number;
}

/** What the countable moment ends at. */
export type LimitedBy =
	'section' | 'shear' | 'web-shear' | 'lateral-torsional' | 'flange-induced-buckling';

/** Elastic check by von Mises, 6.2.1(5): for information. */
export interface ElasticUse {
	/** √(σ² + 3τ²)/fyd: at most 1. */
	readonly value: number;
	readonly part: string;
	/** N/mm² */
	readonly sigma: number;
	readonly tau: number;
}

/** One demand with its class and its place on the ruler of its own moment, N held; kNm. */
export interface DemandState {
	demand: string;
	class: SectionClass;
	governing: string;
	basis: Classification['basis'];
	elements: ClassifiedElement[];
	/** kN, as demanded. */
	N: number;
	/** Direction of the moment, degrees from y; 0 is +My, 90 is +Mz. */
	axisAngle: number;
	/** Size of the demand's moment. */
	moment: number;
	/** Null without a moment along N, and where a missing check may reduce it. */
	countable: number | null;
	countableBasis: Resistance['basis'] | null;
	/** kN, a size: of N where it acts without a moment. */
	countableForce: number | null;
	/** Codes of the missing checks for which nothing is counted. */
	withheld: string[];
	limitedBy: LimitedBy | null;
	/** How N and moments were put together: one alone, a sum, a curve or block, or fibre stresses. */
	together: 'alone' | 'sum' | 'curve' | 'fibre' | null;
	/** Shear acts and lowers the moment. */
	besideShear: boolean;
	reduced: ReducedFigures;
	/** Null where the shear stress has no formula. */
	elastic: ElasticUse | null;
	/** Under the demand's N, without γM0. */
	firstYield: number | null;
	fullPlastic: number | null;
	/** Greatest use of the checks made; null when one that applies is missing or nothing acts. */
	utilisation: number | null;
	/** Checks that apply to this demand and are missing. */
	missing: Note[];
}
