import { plasticMomentOf } from '../../response/plastic';
import type { SectionDefinition } from '../../section/definition';
import { boxSizes } from '../../section/kinds/box';
import { iSizes } from '../../section/kinds/i';
import type { AxisSense } from '../section-moments';
import { axisAngles } from '../section-moments';
import type { EnModel } from './model';

/** Which formula of 6.2.9.1 gives the moment beside N; `block` is the exact plastic block. */
export type AxialRule =
	'rectangle' | 'i-strong' | 'i-weak' | 'hollow-y' | 'hollow-z' | 'round' | 'block';

/** What the formula takes of the section: mm, mm². */
export interface AxialShape {
	readonly rule: AxialRule;
	/** Share of the area outside the flanges (across z: outside the webs), at most 0.5. */
	readonly a: number;
	/** Symbol and formula of `a`, with its numbers. */
	readonly share: { readonly formula: string; readonly inputs: readonly [string, number][] } | null;
	/** Area of the web for the thresholds of I sections. */
	readonly web: number;
}

/** A moment beside N, design, kNm. */
export interface AxialMoment extends AxialShape {
	readonly sense: AxisSense;
	/** |N| over the plastic resistance of the whole section. */
	readonly n: number;
	/** By the code's formula, or the block where it has none for the section. */
	readonly value: number;
	/** The plastic block under N, whatever the rule. */
	readonly exact: number;
	/** Plastic moment without N. */
	readonly alone: number;
}

const isWeak = (sense: AxisSense) => sense === 'plusMz' || sense === 'minusMz';

/**
 * Plastic moment beside the axial force N (kN, design) of a class 1 or 2 section, 6.2.9.1(3)–(5).
 * Sections with equal flanges and one strength follow the code's formulas; all others the exact
 * block of 6.2.9.1(1). Nothing is left (0) when N alone is too much. `NRd`: kN, design.
 */
export function momentBesideAxial(
	model: EnModel,
	sense: AxisSense,
	N: number,
	NRd: number
): AxialMoment {
	const shape = axialShape(model, sense);
	const n = Math.abs(N) / NRd;
	const { gammaM0 } = model.code;
	const alone = (model.moments[sense].plastic.moment ?? 0) / gammaM0;
	const exact = N === 0 ? alone : blockBesideAxial(model, axisAngles[sense], N);
	const web = (shape.web * model.strengths.least * 1e-3) / gammaM0;
	const value =
		shape.rule === 'block' ? exact : alone * shareLeft(shape, n, Math.abs(N) <= 0.5 * web);
	return { ...shape, sense, n, alone, exact, value };
}

/** Plastic block about an axis under N (design, kN), no moment across it; kNm, design. */
export function blockBesideAxial(model: EnModel, axisAngle: number, N: number): number {
	const { gammaM0 } = model.code;
	const path = { axisAngle, transverse: 'moment-zero', N: N * gammaM0 } as const;
	return Math.max(0, plasticMomentOf(model.mechanics, path).moment ?? 0) / gammaM0;
}

/** Share of the plastic moment that the code's formula leaves beside n. */
export function shareLeft({ rule, a }: AxialShape, n: number, withinWeb: boolean): number {
	if (n >= 1) return 0;
	switch (rule) {
		case 'rectangle':
			return 1 - n ** 2;
		case 'i-strong':
			return n <= 0.25 && withinWeb ? 1 : Math.min(1, (1 - n) / (1 - 0.5 * a));
		case 'hollow-y':
		case 'hollow-z':
			return Math.min(1, (1 - n) / (1 - 0.5 * a));
		case 'i-weak':
			return n <= a ? 1 : 1 - ((n - a) / (1 - a)) ** 2;
		case 'round':
			return 1 - n ** 1.7;
		case 'block':
			return 0;
	}
}

const block: AxialShape = { rule: 'block', a: 0, share: null, web: 0 };

/** The formula that fits the section; hybrids and unequal flanges have none. */
export function axialShape({ section, strengths }: EnModel, sense: AxisSense): AxialShape {
	if (strengths.hybrid || !strengths.even) return block;
	return shapeOf(section.definition, section.gross.area, isWeak(sense));
}

function shapeOf(definition: SectionDefinition, A: number, weak: boolean): AxialShape {
	switch (definition.kind) {
		case 'flat':
			return { ...block, rule: 'rectangle' };
		case 'circular-hollow':
			return { ...block, rule: 'round' };
		case 'i': {
			const { h, bTop: b, tfTop: tf, bBottom, tfBottom, tw } = iSizes(definition);
			if (b !== bBottom || tf !== tfBottom) return block;
			const web = (h - 2 * tf) * tw;
			return { rule: weak ? 'i-weak' : 'i-strong', ...outside(A, 'b', b, 't_f', tf), web };
		}
		case 'rectangular-hollow': {
			const { h, b, t } = definition;
			const share = weak ? outside(A, 'h', h, 't', t) : outside(A, 'b', b, 't', t);
			return { rule: weak ? 'hollow-z' : 'hollow-y', ...share, web: 0 };
		}
		case 'box': {
			const { h, bTop: b, tfTop: tf, bBottom, tfBottom, tw } = boxSizes(definition);
			if (b !== bBottom || tf !== tfBottom) return block;
			const share = weak ? outside(A, 'h', h, 't_w', tw) : outside(A, 'b', b, 't_f', tf);
			return { rule: weak ? 'hollow-z' : 'hollow-y', ...share, web: 0 };
		}
		default:
			return block;
	}
}

/** a = (A − 2 width thickness)/A ≤ 0.5, of what is not in the two plates named. */
function outside(A: number, width: string, c: number, thickness: string, t: number) {
	return {
		a: Math.min((A - 2 * c * t) / A, 0.5),
		share: {
			formula: `min((A − 2·${width}·${thickness})/A, 0.5)`,
			inputs: [
				['A', A],
				[width, c],
				[thickness, t]
			] as [string, number][]
		}
	};
}
