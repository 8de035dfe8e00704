import { workingKey } from '../../explain/keys';
import type { WorkingInput } from '../../explain/working';
import type { AxisSense } from '../section-moments';
import { clauseOf, editionName } from './edition';
import type { EnModel } from './model';

/** A moment lowered by shear, kNm, and the numbers it comes from. */
export type ReducedBy = {
	readonly rho: number;
	readonly resistance: number;
	readonly moment: number;
} & (
	| {
			readonly kind: 'equal-flanges';
			readonly W: number;
			readonly hw: number;
			readonly tw: number;
			readonly fy: number;
	  }
	| {
			readonly kind: 'tube';
			readonly W: number;
			readonly area: number;
			readonly t: number;
			readonly fy: number;
	  }
	| { readonly kind: 'block'; readonly block: number }
	| { readonly kind: 'shares'; readonly Mf: number }
	| { readonly kind: 'web-buckling'; readonly Mf: number; readonly Mpl: number }
);

type Shown = ReducedBy & { readonly V: number; readonly Mc: number; readonly MyVRd: number };

const figures: Readonly<Record<AxisSense, 'MyVRd' | 'MzVRd'>> = {
	plusMy: 'MyVRd',
	minusMy: 'MyVRd',
	plusMz: 'MzVRd',
	minusMz: 'MzVRd'
};

/** Keeps how ρ and the moment beside shear came about. */
export function explainMomentUnderShear(
	{ workings, code }: EnModel,
	sense: AxisSense,
	name: string,
	shown: Shown
): void {
	if (workings === null) return;
	const figure = figures[sense];
	const buckling = shown.kind === 'web-buckling';
	const clause = buckling ? 'EN 1993-1-5 7.1(1)' : clauseOf(code.standard, 'bendingShear');
	const edition = buckling ? 'EN 1993-1-5' : editionName(code.standard);
	const loss = workingKey.reduced(name, `${figure}.rho`);
	const R = buckling ? 'V_bw,Rd' : 'V_pl,Rd';
	workings.add(loss, () => ({
		title: 'Strength taken by shear',
		clause,
		edition,
		formula: `ρ = min(1, (2·V_Ed/${R} − 1)²)`,
		inputs: [
			{ symbol: 'V_Ed', value: Math.abs(shown.V), unit: 'kN', from: name },
			{ symbol: R, value: shown.resistance, unit: 'kN', from: 'shear resistance across this axis' }
		],
		result: { value: shown.rho, unit: '' }
	}));
	const { expression, inputs } = formulaOf(shown, code.gammaM0);
	workings.add(workingKey.reduced(name, figure), () => ({
		title: 'Moment resistance beside shear',
		clause,
		edition,
		formula: `M_V,Rd = min(${expression}, M_c,Rd)`,
		inputs: [
			...inputs,
			{ symbol: 'ρ', value: shown.rho, unit: '', from: loss },
			{ symbol: 'M_c,Rd', value: shown.Mc, unit: 'kNm', from: 'without shear' }
		],
		result: { value: shown.MyVRd, unit: 'kNm' }
	}));
}

function formulaOf(shown: Shown, gammaM0: number): { expression: string; inputs: WorkingInput[] } {
	const gamma: WorkingInput = {
		symbol: 'γM0',
		value: gammaM0,
		unit: '',
		from: 'chosen with the code'
	};
	const strength = (value: number): WorkingInput => ({ symbol: 'fy', value, unit: 'N/mm²' });
	const modulus = (value: number): WorkingInput => ({ symbol: 'W_pl', value, unit: 'mm³' });
	const moment = (symbol: string, value: number, from: string): WorkingInput => ({
		symbol,
		value,
		unit: 'kNm',
		from
	});
	switch (shown.kind) {
		case 'equal-flanges':
			return {
				expression: '(W_pl − ρ·(hw·tw)²/(4·tw))·fy/γM0·10^-6',
				inputs: [
					modulus(shown.W),
					{ symbol: 'hw', value: shown.hw, unit: 'mm' },
					{ symbol: 'tw', value: shown.tw, unit: 'mm' },
					strength(shown.fy),
					gamma
				]
			};
		case 'tube':
			return {
				expression: '(W_pl − ρ·A_v²/(8·t))·fy/γM0·10^-6',
				inputs: [
					modulus(shown.W),
					{ symbol: 'A_v', value: shown.area, unit: 'mm²' },
					{ symbol: 't', value: shown.t, unit: 'mm' },
					strength(shown.fy),
					gamma
				]
			};
		case 'block':
			return {
				expression: 'M_pl/γM0',
				inputs: [
					moment('M_pl', shown.block, 'plastic block with (1 − ρ)fy on the shear area'),
					gamma
				]
			};
		case 'shares':
			return {
				expression: 'ρ·M_f + (1 − ρ)·M_c,Rd',
				inputs: [moment('M_f', shown.Mf, 'flanges alone, not more than M_c,Rd')]
			};
		case 'web-buckling':
			return {
				expression: 'M_pl − (M_pl − M_f)·ρ',
				inputs: [
					moment('M_pl', shown.Mpl, 'effective flanges with the whole web'),
					moment('M_f', shown.Mf, 'effective flanges alone')
				]
			};
	}
}
