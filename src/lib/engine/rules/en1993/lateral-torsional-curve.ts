import type { SectionDefinition } from '../../section/definition';
import { iSizes } from '../../section/kinds/i';
import type { CodeChoice } from '../result';

/** A buckling curve with its imperfection factor, Table 6.3. */
export type BucklingCurve = 'a' | 'b' | 'c' | 'd';

export const imperfections: Readonly<Record<BucklingCurve, number>> = {
	a: 0.21,
	b: 0.34,
	c: 0.49,
	d: 0.76
};

/** Which way of 6.3.2 is gone: the general one, or the one for rolled I and welded I like them. */
export interface LateralCurve {
	readonly curve: BucklingCurve;
	readonly method: CodeChoice['ltbCurves'];
}

/**
 * Curves of Table 6.4 (6.3.2.2: rolled I a up to h/b 2, else b; welded I c, else d; others d) or, where
 * chosen, Table 6.5 (6.3.2.3: rolled I b, else c; welded I c, else d), which is for I sections only.
 * h/b takes the narrower flange.
 */
export function lateralCurve(
	definition: SectionDefinition,
	asked: CodeChoice['ltbCurves']
): LateralCurve {
	if (definition.kind !== 'i') return { curve: 'd', method: 'general' };
	const { h, bTop, bBottom } = iSizes(definition);
	const wide = h / Math.min(bTop, bBottom) <= 2;
	if (definition.fabrication === 'welded') return { curve: wide ? 'c' : 'd', method: asked };
	if (asked === 'general') return { curve: wide ? 'a' : 'b', method: asked };
	return { curve: wide ? 'b' : 'c', method: asked };
}

/** χLT of 6.3.2.2 (6.56): Φ = 0.5[1 + α(λ − 0.2) + λ²], χ = 1/(Φ + √(Φ² − λ²)) ≤ 1. */
export function generalReduction(slenderness: number, curve: BucklingCurve): number {
	if (slenderness <= 0.2) return 1;
	const phi = 0.5 * (1 + imperfections[curve] * (slenderness - 0.2) + slenderness ** 2);
	return Math.min(1, 1 / (phi + Math.sqrt(phi ** 2 - slenderness ** 2)));
}

/** β and λLT,0 recommended in 6.3.2.3(1). */
const beta = 0.75;
const plateau = 0.4;

/** χLT of 6.3.2.3 (6.57): Φ = 0.5[1 + α(λ − 0.4) + 0.75λ²], χ ≤ 1 and ≤ 1/λ². */
export function rolledReduction(slenderness: number, curve: BucklingCurve): number {
	if (slenderness <= plateau) return 1;
	const phi = 0.5 * (1 + imperfections[curve] * (slenderness - plateau) + beta * slenderness ** 2);
	const own = 1 / (phi + Math.sqrt(phi ** 2 - beta * slenderness ** 2));
	return Math.min(1, own, 1 / slenderness ** 2);
}

/** f of 6.3.2.3(2): 1 − 0.5(1 − kc)[1 − 2(λ − 0.8)²] ≤ 1 with kc = 1/√C1. */
export function momentShapeFactor(slenderness: number, C1: number): number {
	const kc = Math.min(1, 1 / Math.sqrt(C1));
	return Math.min(1, 1 - 0.5 * (1 - kc) * (1 - 2 * (slenderness - 0.8) ** 2));
}
