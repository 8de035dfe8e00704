import { workingKey } from '../../../explain/keys';
import type { Working, WorkingInput, Workings } from '../../../explain/working';
import type { EffectiveBasis } from './stress-field';
import type { FirstFibre } from './first-fibre';
import type { HybridMoment } from './hybrid-moment';
import { edition, input } from './working-parts';

/** The working of the moment at the first fibre, kNm, under `effective.<basis>.moment`. */
export function momentWorking(
	workings: Workings,
	basis: EffectiveBasis,
	{ modulus, strength, side, part }: FirstFibre,
	value: number,
	gammaM0: number
): void {
	const inputs = [
		input('W_eff', modulus, 'mm³', `moment over stress at the ${side} fibre`),
		input('fy', strength, 'N/mm²', part),
		input('γM0', gammaM0, '')
	];
	workings.add(workingKey.effective(basis, 'moment'), () =>
		moment('EN 1993-1-5 4.4', 'M_c,Rd = W_eff·fy/γM0·10^-6', inputs, value)
	);
}

/** The same of a hybrid whose webs yield early. */
export function hybridWorking(
	workings: Workings,
	basis: EffectiveBasis,
	{ flanges, webs, axis }: HybridMoment,
	value: number,
	gammaM0: number
): void {
	const inputs = [
		input('M_f', flanges * 1e-6, 'kNm', 'flanges, at first yield of a flange fibre'),
		input('M_w', webs * 1e-6, 'kNm', `webs, stress up to their own strength, axis at z ${axis}`),
		input('γM0', gammaM0, '')
	];
	workings.add(workingKey.effective(basis, 'moment'), () =>
		moment('EN 1993-1-5 4.3(6)', 'M_c,Rd = (M_f + M_w)/γM0', inputs, value)
	);
}

/** The same where the gross section gives less than the reduced one. */
export function grossWorking(
	workings: Workings,
	basis: EffectiveBasis,
	value: number,
	gammaM0: number
): void {
	const inputs = [
		input('M_el', value * gammaM0, 'kNm', 'elastic moment of the gross section, not exceeded'),
		input('γM0', gammaM0, '')
	];
	workings.add(workingKey.effective(basis, 'moment'), () =>
		moment('EN 1993-1-5 4.4', 'M_c,Rd = M_el/γM0', inputs, value)
	);
}

const moment = (
	clause: string,
	formula: string,
	inputs: readonly WorkingInput[],
	value: number
): Working => ({
	title: 'Bending resistance of the effective section',
	clause,
	edition,
	formula,
	inputs,
	result: { value, unit: 'kNm' }
});

/** The working of the compression resistance, kN, under `effective.N.resistance`. */
export function axialWorking(
	workings: Workings,
	area: number,
	fy: number,
	value: number,
	gammaM0: number
): void {
	workings.add(workingKey.effective('N', 'resistance'), () => ({
		title: 'Compression resistance of the effective section',
		clause: 'EN 1993-1-5 4.4',
		edition,
		formula: 'N_c,Rd = A_eff·fy/γM0·10^-3',
		inputs: [
			input('A_eff', area, 'mm²', workingKey.effective('N', 'area')),
			input('fy', fy, 'N/mm²', 'weakest part'),
			input('γM0', gammaM0, '')
		],
		result: { value, unit: 'kN' }
	}));
}
