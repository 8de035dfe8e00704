import { sizeLimits } from '$lib/engine/tolerances';

/** What a number may be: both ends belong to it, unless `above` says that the lower end does not. */
export interface Range {
	readonly least?: number;
	/** Greater than this, itself not allowed. */
	readonly above?: number;
	readonly most: number;
}

const either = (most: number): Range => ({ least: -most, most });

/**
 * Bounds far beyond any steel section that is built, so that no arithmetic overflows; they are
 * ours, from no standard.
 */
export const ranges = {
	/** kN */
	force: either(1e9),
	/** kNm */
	moment: either(1e9),
	/** 1/m */
	curvature: either(1e6),
	curvatureRatio: either(1e6),
	strain: either(10),
	strainLimit: { above: 0, most: 10 },
	curveStrain: { least: 0, most: 10 },
	/** N/mm² */
	curveStress: { least: 0, most: 10_000 },
	/** fy, fyc and fu, N/mm² */
	strength: { least: 1, most: 10_000 },
	/** E, N/mm² */
	modulus: { least: 1000, most: 1_000_000 },
	/** Eh, N/mm²; the law sees to it that it is less than E. */
	hardening: { least: 0, most: 1_000_000 },
	/** kg/m³ */
	density: { least: 100, most: 30_000 },
	/** Ramberg–Osgood exponents. */
	exponent: { least: 1, most: 1000 },
	partialFactor: { least: 0.9, most: 2 },
	/** Degrees. */
	angle: either(3600),
	/** Inner flange face, %. */
	slope: { least: 0, most: 100 },
	/** mm */
	unbracedLength: { above: 0, most: 1e7 },
	momentFactor: { least: 0.1, most: 10 },
	/** Height of a load above the shear centre, mm. */
	loadHeight: either(1e5),
	/** Between stiffeners, mm. */
	spacing: { above: 0, most: sizeLimits.most },
	boltHoles: { least: 1, most: 100 },
	/** Plates of a stock, mm. */
	stockThickness: { least: 1, most: 500 },
	/** Steps of widths, depths and spacings, mm. */
	stockStep: { least: 1, most: 5000 }
} as const satisfies Record<string, Range>;

const grouped = (value: number) =>
	(Math.abs(value) < 10_000
		? String(value)
		: value.toLocaleString('en').replaceAll(',', '\u202f')
	).replace('-', '−');

/** `from −10 to 10 mm`, `greater than 0 and at most 10 mm`. */
export const rangeWords = ({ least, above, most }: Range, unit: string): string => {
	const end = `${grouped(most)}${unit ? ` ${unit}` : ''}`;
	if (above !== undefined) return `greater than ${grouped(above)} and at most ${end}`;
	return least === undefined ? `at most ${end}` : `from ${grouped(least)} to ${end}`;
};
