import type { WorkingInput } from '../../explain/working';
import { iSizes } from '../../section/kinds/i';
import type { Demand } from '../result';
import { flangesMoment } from './effective/flange-moments';
import type { EnModel } from './model';
import type { PanelBuckling } from './shear-buckling';
import { epsilonOf } from './strengths';

/** What the flanges add to the shear resistance of a web panel, kN, and the numbers it comes from. */
export interface FlangeShare {
	readonly Vbf: number;
	readonly inputs: readonly WorkingInput[];
}

/** Flange width beside the web that is counted, 5.4(1): 15ε tf on each side. */
const countedSide = 15;

/**
 * Vbf,Rd of 5.4(1) for an I with transverse stiffeners, under the demand's My and N:
 * bf tf² fyf/(c γM1) [1 − (MEd/Mf,Rd)²] with the flange of least axial resistance and
 * c = a(0.25 + 1.6 bf tf² fyf/(t hw² fyw)); 0 once MEd reaches Mf,Rd. Null, and nothing counted, for a web
 * without stiffeners between supports (the panel is as long as the span, so it adds next to nothing),
 * and for boxes, whose flange is shared by two webs.
 */
export function flangeShare(
	model: EnModel,
	panel: PanelBuckling,
	{ My = 0, N = 0 }: Demand
): FlangeShare | null {
	const { spacing: a, fyw } = panel;
	const flange = weakerFlange(model);
	if (a === null || flange === null || panel.panel.part !== 'web') return null;
	const { bf, tf, fyf } = flange;
	const { depth: hw, thickness: t } = panel.panel;
	const Mf = flangesMoment(model, My < 0 ? 'minusMy' : 'plusMy', N)?.value ?? 0;
	const M = Math.abs(My);
	const strength = bf * tf ** 2 * fyf;
	const c = a * (0.25 + (1.6 * strength) / (t * hw ** 2 * fyw));
	const left = M < Mf ? 1 - (M / Mf) ** 2 : 0;
	const { gammaM1 } = model.code;
	return {
		Vbf: ((strength * 1e-3) / (c * gammaM1)) * left,
		inputs: [
			{ symbol: 'bf', value: bf, unit: 'mm', from: 'at most 15ε tf each side of the web' },
			{ symbol: 'tf', value: tf, unit: 'mm' },
			{ symbol: 'fyf', value: fyf, unit: 'N/mm²' },
			{ symbol: 'c', value: c, unit: 'mm', from: 'a·(0.25 + 1.6·bf·tf²·fyf/(t·hw²·fyw))' },
			{ symbol: 'γM1', value: gammaM1, unit: '' },
			{ symbol: 'M_Ed', value: Math.min(M, Mf), unit: 'kNm', from: 'not more than Mf,Rd' },
			{ symbol: 'M_f,Rd', value: Mf > 0 ? Mf : 1, unit: 'kNm', from: 'effective flanges alone' }
		]
	};
}

/** The flange of least axial resistance: counted width, thickness, strength. */
function weakerFlange({ section, strengths }: EnModel) {
	const { definition, parts } = section;
	if (definition.kind !== 'i') return null;
	const { bTop, tfTop, bBottom, tfBottom, tw } = iSizes(definition);
	const counted = (part: string, b: number, tf: number) => {
		const material = parts.find(({ name }) => name === part)!.material;
		const epsilon = epsilonOf(strengths.of(part), strengths.modulus);
		const bf = Math.min(b, 2 * countedSide * epsilon * tf + tw);
		return { bf, tf, fyf: Math.min(material.fy, material.fyc) };
	};
	const [top, bottom] = [
		counted('topFlange', bTop, tfTop),
		counted('bottomFlange', bBottom, tfBottom)
	];
	const force = ({ bf, tf, fyf }: typeof top) => bf * tf * fyf;
	return force(top) <= force(bottom) ? top : bottom;
}
