import { workingKey } from '../../explain/keys';
import type { AxisSense } from '../section-moments';
import { flangesMoment, flangesWithWebMoment, type MajorSense } from './effective/flange-moments';
import type { EnModel } from './model';
import { plateGirderOf } from './plate-girder';
import type { ReducedBy } from './moment-shear-workings';
import type { AxisShear } from './shear-resistance';

/** Effects that act on the web together, kN and kNm; M as a size in its sense. */
export interface WebEffects {
	readonly M: number;
	readonly V: number;
	readonly N: number;
}

/** The check of 7.1(1); moments kNm, design. */
export interface WebShearInteraction {
	readonly value: number;
	readonly limit: 1;
	readonly clause: string;
	readonly Mf: number;
	readonly Mpl: number;
	/** VEd over Vbw,Rd, the web's part alone. */
	readonly eta3: number;
}

const clause = 'EN 1993-1-5 7.1(1)';

/**
 * Bending with shear in a web that may buckle: η1 + (1 − Mf,Rd/Mpl,Rd)(2η3 − 1)² ≤ 1 with η1 = MEd/Mpl,Rd
 * and η3 = VEd/Vbw,Rd. Mpl,Rd counts the effective flanges and the web whole whatever its class; with N
 * both moments are lowered. Null where it need not be met: no shear buckling, η3 ≤ 0.5 or MEd < Mf,Rd; and
 * where N alone is too much, which its own check shows. It need not be met within hw/2 of a support, which
 * is not known here.
 */
export function webShearInteraction(
	model: EnModel,
	sense: MajorSense,
	{ M, V, N }: WebEffects,
	shear: AxisShear | null,
	name: string | null = null
): WebShearInteraction | null {
	if (!shear?.buckling) return null;
	const eta3 = Math.abs(V) / shear.buckling.Vbw;
	if (eta3 <= 0.5) return null;
	const moments = webMoments(model, sense, N);
	if (moments === null || M < moments.Mf) return null;
	const { Mf, Mpl } = moments;
	const value = M / Mpl + (1 - Mf / Mpl) * (2 * eta3 - 1) ** 2;
	if (name !== null)
		model.workings?.add(workingKey.check(name, 'bending with shear in the web'), () => ({
			title: 'Bending with shear in a web that may buckle',
			clause,
			edition: 'EN 1993-1-5',
			formula: 'η = M_Ed/M_pl,Rd + (1 − M_f,Rd/M_pl,Rd)·(2·V_Ed/V_bw,Rd − 1)²',
			inputs: [
				{ symbol: 'M_Ed', value: M, unit: 'kNm', from: name },
				{
					symbol: 'M_pl,Rd',
					value: Mpl,
					unit: 'kNm',
					from: 'effective flanges with the whole web'
				},
				{ symbol: 'M_f,Rd', value: Mf, unit: 'kNm', from: 'effective flanges alone' },
				{ symbol: 'V_Ed', value: Math.abs(V), unit: 'kN', from: name },
				{ symbol: 'V_bw,Rd', value: shear.buckling!.Vbw, unit: 'kN', from: 'the web’s part alone' }
			],
			result: { value, unit: '' }
		}));
	return { value, limit: 1, clause, Mf, Mpl, eta3 };
}

/** Mf,Rd and Mpl,Rd; null for sections without such moments and where N leaves none. */
function webMoments(model: EnModel, sense: MajorSense, N: number) {
	const Mpl = flangesWithWebMoment(model, sense, N);
	const flanges = flangesMoment(model, sense, N);
	if (flanges === null || Mpl === null || Mpl <= 0) return null;
	return { Mpl, Mf: webWhollyCompressed(model, N) ? 0 : Math.min(flanges.value, Mpl) };
}

/** A thrust that the web alone would have to yield for: its whole depth is then in compression, 7.1(4). */
function webWhollyCompressed({ section, code }: EnModel, N: number): boolean {
	if (N >= 0) return false;
	const girder = plateGirderOf(section.definition);
	if (girder === null) return false;
	const { hw, tw, webs } = girder;
	let squash = 0;
	for (const { name, material } of section.parts)
		if (webs.includes(name)) squash += hw * tw * Math.min(material.fy, material.fyc);
	return -N * 1e3 * code.gammaM0 >= squash;
}

/**
 * The moment that 7.1(1) leaves beside V, kNm: Mpl − (Mpl − Mf)(2η3 − 1)², from Vbw,Rd on Mf. Sections
 * without flange moments, and bending about z, take Mf = 0 and Mc,Rd for Mpl, on the safe side. Null
 * up to η3 = 0.5.
 */
export function momentBesideBuckling(
	model: EnModel,
	sense: AxisSense,
	Mc: number,
	V: number,
	Vbw: number
): ReducedBy | null {
	const eta3 = Math.abs(V) / Vbw;
	if (eta3 <= 0.5) return null;
	const major = sense === 'plusMy' || sense === 'minusMy';
	const { Mf, Mpl } = (major ? webMoments(model, sense, 0) : null) ?? { Mf: 0, Mpl: Mc };
	const rho = Math.min(1, (2 * eta3 - 1) ** 2);
	const moment = Mpl - (Mpl - Mf) * rho;
	return { kind: 'web-buckling', rho, resistance: Vbw, moment, Mf, Mpl };
}
