import type { Stiffeners } from '../result';
import type { EnModel } from './model';
import type { ShearPanel } from './shear-area';
import { epsilonOf } from './strengths';

/** Shear buckling of one panel, EN 1993-1-5 clause 5; mm, N/mm², kN. */
export interface PanelBuckling {
	readonly panel: ShearPanel;
	readonly fyw: number;
	readonly epsilon: number;
	/** Panel length between transverse stiffeners; null for none between the supports. */
	readonly spacing: number | null;
	readonly endPost: Stiffeners['endPost'];
	readonly kTau: number;
	/** Depth over thickness up to which no check is needed, 5.1(2). */
	readonly limit: number;
	readonly needed: boolean;
	/** λw, 5.3(3). */
	readonly slenderness: number;
	readonly chiW: number;
	readonly Vbw: number;
	/** η fyw hw t/(√3 γM1), which the flanges cannot raise, (5.1). */
	readonly most: number;
}

const webs = new Set(['web', 'leftWeb', 'rightWeb']);

/** kτ of a panel between rigid transverse stiffeners, (A.5) with no longitudinal ones; 5.34 without end. */
export function shearBucklingCoefficient(depth: number, spacing: number | null): number {
	if (spacing === null) return 5.34;
	const ratio = depth / spacing;
	return spacing >= depth ? 5.34 + 4 * ratio ** 2 : 4 + 5.34 * ratio ** 2;
}

/** hw/t from which shear buckling is checked: 72ε/η, with stiffeners between 31ε√kτ/η; 5.1(2). */
export const shearBucklingLimit = (
	spacing: number | null,
	epsilon: number,
	eta: number,
	kTau: number
): number => (spacing === null ? (72 * epsilon) / eta : (31 * epsilon * Math.sqrt(kTau)) / eta);

/** χw of Table 5.1. */
export function shearReduction(
	slenderness: number,
	eta: number,
	endPost: Stiffeners['endPost']
): number {
	if (slenderness < 0.83 / eta) return eta;
	if (slenderness < 1.08 || endPost === 'non-rigid') return 0.83 / slenderness;
	return 1.37 / (0.7 + slenderness);
}

/** Web in shear with the stiffeners given; flanges of a box have none. End posts not told of count as non-rigid. */
export function panelBuckling(model: EnModel, panel: ShearPanel, fyw: number): PanelBuckling {
	const { code, strengths, stiffeners } = model;
	const { depth, thickness, part } = panel;
	const spacing = webs.has(part) ? (stiffeners?.spacing ?? null) : null;
	const endPost = webs.has(part) ? (stiffeners?.endPost ?? 'non-rigid') : 'non-rigid';
	const epsilon = epsilonOf(strengths.of(part), strengths.modulus);
	const kTau = shearBucklingCoefficient(depth, spacing);
	const limit = shearBucklingLimit(spacing, epsilon, code.eta, kTau);
	const needed = depth / thickness > limit;
	const slenderness =
		spacing === null
			? depth / (86.4 * thickness * epsilon)
			: depth / (37.4 * thickness * epsilon * Math.sqrt(kTau));
	const chiW = needed ? shearReduction(slenderness, code.eta, endPost) : code.eta;
	const whole = (fyw * depth * thickness * 1e-3) / (Math.sqrt(3) * code.gammaM1);
	const found = { panel, fyw, epsilon, spacing, endPost, kTau, limit, needed, slenderness, chiW };
	return { ...found, Vbw: chiW * whole, most: code.eta * whole };
}
