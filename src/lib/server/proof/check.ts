/** Groups of published values, in the order of the page. */
export const proofFamilies = {
	catalogue: 'Catalogue tables',
	'section-properties': 'Section properties',
	classification: 'Classification',
	effective: 'Effective sections',
	shear: 'Shear',
	resistance: 'Resistance and stability',
	interaction: 'Forces together',
	bending: 'Plastic bending in textbooks',
	'closed-form': 'Closed forms'
} as const;

export type ProofFamily = keyof typeof proofFamilies;

export type MemoryConfidence = 'high' | 'medium';

/** How far ours may lie from the published value. */
export type Tolerance =
	/** The same word, or the same number but for binary noise. */
	| { readonly kind: 'exact' }
	/** A share of the published value. */
	| { readonly kind: 'relative'; readonly value: number; readonly why: string }
	/** In the unit of the published value. */
	| { readonly kind: 'absolute'; readonly value: number; readonly why: string }
	/** The larger of a share and half the last printed digit, the latter in the published unit. */
	| {
			readonly kind: 'relative-or-half-digit';
			readonly value: number;
			readonly halfDigit: number;
			readonly why: string;
	  };

/** Where a published value stands. */
export interface ProofSource {
	readonly family: ProofFamily;
	/** Book, table or derivation. */
	readonly source: string;
	/** The standard with its edition that the value follows, or what else it rests on. */
	readonly standard: string;
	readonly clause: string | null;
	/** Written down without the source at hand. */
	readonly fromMemory: boolean;
	readonly memoryConfidence: MemoryConfidence | null;
}

/** A published value, our own, and what may lie between them. */
export interface ProofValue {
	/** Stays the same as long as the value is held: part of links and of tests' names. */
	readonly id: string;
	/** Which section, under what. */
	readonly case: string;
	readonly quantity: string;
	/** Unit of both values; empty for plain numbers and words. */
	readonly unit: string;
	readonly published: number | string;
	/** As the source prints it, where that says more than the number. */
	readonly printed?: string;
	/** Null where the engine gives no figure. */
	readonly ours: number | string | null;
	readonly tolerance: Tolerance;
	/** What must be known to read the comparison. */
	readonly remark?: string;
}

/** One published value held against ours. */
export interface ProofCheck extends ProofSource {
	readonly id: string;
	readonly case: string;
	readonly quantity: string;
	readonly unit: string;
	readonly published: number | string;
	readonly printed: string;
	readonly ours: number | string | null;
	/** Ours less published, in the unit; null for words and where we give none. */
	readonly difference: number | null;
	/** The difference as a share of the published value; null also where that is nil. */
	readonly relativeDifference: number | null;
	/** Largest size of the difference that passes, in the unit; null for words. */
	readonly allowed: number | null;
	readonly tolerance: Tolerance['kind'];
	readonly why: string;
	/** Size of the difference over what is allowed; null where there is no difference. */
	readonly use: number | null;
	readonly pass: boolean;
	readonly remark: string | null;
}

/** Binary noise of a number that must be the same. */
const noise = 1e-9;

/** The comparison itself: no figure of ours never passes. */
export function proofCheck(source: ProofSource, value: ProofValue): ProofCheck {
	const { tolerance, published, ours } = value;
	const held = { ...source, ...value, tolerance: tolerance.kind, why: whyOf(tolerance) };
	const printed = value.printed ?? String(published);
	const remark = value.remark ?? null;
	if (typeof published === 'string' || typeof ours === 'string' || ours === null) {
		const allowed = typeof published === 'string' ? null : allowance(tolerance, published);
		const none = { difference: null, relativeDifference: null, use: null };
		return { ...held, printed, remark, ...none, allowed, pass: ours === published };
	}
	const difference = ours - published;
	const allowed = allowance(tolerance, published);
	const relativeDifference = published === 0 ? null : difference / Math.abs(published);
	const pass = Math.abs(difference) <= allowed;
	const use = allowed > 0 ? Math.abs(difference) / allowed : null;
	return { ...held, printed, remark, difference, relativeDifference, allowed, use, pass };
}

function allowance(tolerance: Tolerance, published: number): number {
	const size = Math.abs(published);
	switch (tolerance.kind) {
		case 'exact':
			return noise * size;
		case 'relative':
			return tolerance.value * size;
		case 'absolute':
			return tolerance.value;
		case 'relative-or-half-digit':
			return Math.max(tolerance.value * size, tolerance.halfDigit);
	}
}

const whyOf = (tolerance: Tolerance): string =>
	tolerance.kind === 'exact' ? 'must be the same' : tolerance.why;
