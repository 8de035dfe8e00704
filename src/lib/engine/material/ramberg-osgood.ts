import { fail, ok, type Result } from '../result';

/** The curve of one sense as numbers, N/mm² and plain strains. */
export interface RoundedCurve {
	readonly E: number;
	/** 0.2 % proof strength. */
	readonly proof: number;
	readonly n: number;
	/** Stress at which the curve ends. */
	readonly end: number;
	/** Beyond the proof strength, where a second stage is known. */
	readonly second: {
		readonly fu: number;
		readonly m: number;
		readonly epsilonU: number;
		/** Tangent modulus at the proof strength. */
		readonly tangent: number;
	} | null;
}

/** What a law asks for; see `LawDefinition`. */
export interface RambergOsgood {
	n: number;
	m?: number;
	epsilonU?: number;
	stages?: 1 | 2;
	variant?: 'EN1993-1-4:2006' | 'later';
	family?: 'austenitic' | 'duplex' | 'ferritic';
}

const proofStrain = 0.002;
/** A curve of one stage has no end of its own: it is followed to this strain. From no standard. */
const longest = 0.1;

/**
 * Ramberg–Osgood curve of stainless steel or aluminium. Up to f0.2: ε = σ/E + 0.002 (σ/f0.2)ⁿ.
 * Beyond, where fu is known, the second stage of EN 1993-1-4:2006 Annex C with m = 1 + 3.5 f0.2/fu
 * (1 + 2.8 f0.2/fu in the later variant) and εu = 1 − f0.2/fu (0.6 of it, ferritic); without fu, or
 * when asked for, one stage throughout (EN 1999-1-1 Annex E). From memory of the standards.
 */
export function rambergOsgood(
	asked: RambergOsgood,
	E: number,
	proof: number,
	fu: number | null
): Result<RoundedCurve, string> {
	const { n, stages = fu !== null && fu > proof ? 2 : 1 } = asked;
	if (stages === 1) return ok({ E, proof, n, second: null, end: singleEnd(E, proof, n, fu) });
	if (fu === null)
		return fail('A Ramberg–Osgood law of two stages needs fu: give fu with the grade.');
	if (!(fu > proof))
		return fail(`A Ramberg–Osgood law of two stages needs fu above f0.2 (${fu} against ${proof}).`);
	const share = proof / fu;
	const {
		m = 1 + (asked.variant === 'later' ? 2.8 : 3.5) * share,
		epsilonU = (asked.family === 'ferritic' ? 0.6 : 1) * (1 - share)
	} = asked;
	const tangent = E / (1 + (proofStrain * n * E) / proof);
	return ok({ E, proof, n, second: { fu, m, epsilonU, tangent }, end: fu });
}

/** fu, or the stress at the longest strain where that comes first. */
function singleEnd(E: number, proof: number, n: number, fu: number | null): number {
	const curve = { E, proof, n, second: null, end: Infinity };
	let [low, high] = [0, E * longest];
	for (let i = 0; i < 100; i++) {
		const middle = (low + high) / 2;
		if (roundedStrain(curve, middle) < longest) low = middle;
		else high = middle;
	}
	return fu === null ? low : Math.min(fu, low);
}

/** Strain at a stress up to the curve's end. */
export function roundedStrain({ E, proof, n, second }: RoundedCurve, stress: number): number {
	if (second === null || stress <= proof)
		return stress / E + proofStrain * Math.pow(stress / proof, n);
	const { fu, m, epsilonU, tangent } = second;
	const past = stress - proof;
	const share = past / (fu - proof);
	return proofStrain + proof / E + past / tangent + epsilonU * Math.pow(share, m);
}

/** dε/dσ at a stress, mm²/N. */
export function roundedFlexibility({ E, proof, n, second }: RoundedCurve, stress: number): number {
	if (second === null || stress <= proof)
		return 1 / E + ((proofStrain * n) / proof) * Math.pow(stress / proof, n - 1);
	const { fu, m, epsilonU, tangent } = second;
	const range = fu - proof;
	return 1 / tangent + ((epsilonU * m) / range) * Math.pow((stress - proof) / range, m - 1);
}

/** Stress between two others at which the curve has a flexibility; an end where it has it nowhere. */
export function stressOfFlexibility(
	curve: RoundedCurve,
	flexibility: number,
	low: number,
	high: number
): number {
	const { E, proof, n, second } = curve;
	const within = (stress: number) =>
		Math.min(high, Math.max(low, Number.isNaN(stress) ? low : stress));
	if (second === null || flexibility <= 1 / second.tangent) {
		const share = ((flexibility - 1 / E) * proof) / (proofStrain * n);
		return within(proof * Math.pow(Math.max(0, share), 1 / (n - 1)));
	}
	const range = second.fu - proof;
	const share = ((flexibility - 1 / second.tangent) * range) / (second.epsilonU * second.m);
	return within(proof + range * Math.pow(Math.max(0, share), 1 / (second.m - 1)));
}
