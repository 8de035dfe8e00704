import type { Point } from '../geometry/boundary';
import { regionMoments } from '../geometry/moments';
import { initialModulus } from '../material/laws';
import type { Note } from '../result';
import type { Part, PreparedSection } from './prepared';

/** Elastic stiffness of parts of different E acting together; kN-free: N, N·mm², about their own centroid. */
export interface TransformedProperties {
	/** ∑E·A, N. */
	EA: number;
	/** Where N strains the section without bending it, from the definition's origin, mm. */
	centroid: Point;
	/** ∑E∫(z−zt)²dA, N·mm². */
	EIy: number;
	/** ∑E∫(y−yt)²dA, N·mm². */
	EIz: number;
	/** ∑E∫(y−yt)(z−zt)dA, N·mm². */
	EIyz: number;
}

/** Properties with each part's area counted E-fold (transformed section); E is the slope of its law at rest. */
export function transformedProperties({ parts, gross }: PreparedSection): TransformedProperties {
	const origin = gross.centroid;
	const seen = parts.map(({ region, material }) => ({
		E: initialModulus(material.law),
		...regionMoments(region, origin)
	}));
	const sum = (of: (part: (typeof seen)[number]) => number) =>
		seen.reduce((total, part) => total + part.E * of(part), 0);
	const EA = sum(({ area }) => area);
	const [y, z] = [sum(({ firstZ }) => firstZ) / EA, sum(({ firstY }) => firstY) / EA];
	return {
		EA,
		centroid: { y: origin.y + y, z: origin.z + z },
		EIy: sum(({ secondY }) => secondY) - EA * z * z,
		EIz: sum(({ secondZ }) => secondZ) - EA * y * y,
		EIyz: sum(({ product }) => product) - EA * y * z
	};
}

/** What must be known of the steel before its figures are read. */
export function materialNotes(parts: readonly Part[]): Note[] {
	const first = parts[0]!.material;
	return [
		...(parts.some(({ material }) => material.E !== first.E) ? [moduliDiffer] : []),
		...(parts.some(({ material }) => isRounded(material.law)) ? [roundedLaw] : [])
	];
}

const isRounded = ({ kinks, yieldTension }: Part['material']['law']): boolean =>
	yieldTension !== Infinity && kinks.some((kink) => kink > 0 && kink < yieldTension * (1 - 1e-9));

const moduliDiffer: Note = {
	code: 'moduli-differ',
	message:
		'Parts differ in modulus of elasticity. Gross properties are of the areas alone; first yield and bending count each part with its own E (transformed section).'
};

const roundedLaw: Note = {
	code: 'rounded-law',
	message:
		'A rounded stress–strain law has no yield point. First yield is the usual elastic figure with f0.2; the true curve lies below it there.'
};
