import { lawOf, stressAt } from '../../../engine/material/laws';
import { rambergOsgood, roundedStrain } from '../../../engine/material/ramberg-osgood';
import { bent, built } from '../examples/sections';
import { rounding, type ClosedForm } from './closed-form';

const exact = { tolerance: 1e-12, why: rounding } as const;
const [fy, E, Eh] = [250, 210_000, 2100];

/** Bar of a bilinear law: the elastic share of Eh/E, and a perfectly plastic bar for the rest. */
const hardening = [1.5, 4, 20].map((ratio): ClosedForm => ({
	...{ id: `laws/bilinear-${ratio}`, topic: 'Bilinear law', quantity: 'M/My' },
	case: `Bar 40×120, Eh = E/100, at κ/κy = ${ratio}`,
	formula: '(1 − Eh/E)(1.5 − 0.5(κy/κ)²) + Eh/E·κ/κy',
	value: (1 - Eh / E) * (1.5 - 0.5 / ratio ** 2) + (Eh / E) * ratio,
	ours: () => {
		const grade = { fy, E, law: { type: 'bilinear' as const, Eh } };
		const bend = bent(built({ kind: 'flat', b: 40, h: 120, grade }));
		const { curvature, moment } = bend.firstYield;
		const state = bend.atCurvature(ratio * (curvature ?? 0)).moment;
		return state === null || moment === null ? null : state / moment;
	},
	...exact
}));

const [proof, fu] = [220, 520];
const tangent = 200_000 / (1 + (0.002 * 7 * 200_000) / proof);
const at = `f0.2 = ${proof}, fu = ${fu}, n = 7, E = 200 000`;

function strainOf(stress: number): number | null {
	const curve = rambergOsgood({ n: 7 }, 200_000, proof, fu);
	return curve.ok ? roundedStrain(curve.value, stress) : null;
}

const rounded: readonly ClosedForm[] = [
	{
		...{ id: 'laws/rounded-proof', topic: 'Rounded law', case: at, quantity: 'strain at f0.2' },
		formula: '0.002 + f0.2/E (EN 1993-1-4:2006 Annex C)',
		value: 0.002 + proof / 200_000,
		ours: () => strainOf(proof),
		...exact
	},
	{
		...{ id: 'laws/rounded-end', topic: 'Rounded law', case: at, quantity: 'strain at fu' },
		formula: '0.002 + f0.2/E + (fu − f0.2)/Ey + 1 − f0.2/fu (EN 1993-1-4:2006 Annex C)',
		value: 0.002 + proof / 200_000 + (fu - proof) / tangent + (1 - proof / fu),
		ours: () => strainOf(fu),
		...exact
	}
];

/** Stress of the quad-linear law of fy 355, fu 490. */
function quadLinear(strain: number): number | null {
	const strengths = { E: 210_000, fy: 355, fyc: 355, fu: 490 };
	const law = lawOf({ type: 'quad-linear' }, strengths);
	return law.ok ? stressAt(law.value, strain) : null;
}

const four = { topic: 'Quad-linear law (Yun and Gardner 2017)', case: 'fy 355, fu 490' } as const;
const plateau = 0.1 * (355 / 490) - 0.055;
const ultimate = 0.6 * (1 - 355 / 490);

const quadLinears: readonly ClosedForm[] = [
	{
		...{ ...four, id: 'laws/quad-linear-plateau', unit: 'N/mm²', value: 355 },
		...{ quantity: 'stress at the end of the plateau', formula: 'fy at 0.1·fy/fu − 0.055' },
		ours: () => quadLinear(plateau),
		...exact
	},
	{
		...{ ...four, id: 'laws/quad-linear-end', unit: 'N/mm²', value: 490 },
		...{ quantity: 'stress at the ultimate strain', formula: 'fu at 0.6·(1 − fy/fu)' },
		ours: () => quadLinear(ultimate),
		...exact
	}
];

/** Stress–strain laws, and bending by them. */
export const lawForms: readonly ClosedForm[] = [...hardening, ...rounded, ...quadLinears];
