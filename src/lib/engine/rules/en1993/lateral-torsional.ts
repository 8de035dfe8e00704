import type { Note } from '../../result';
import type { CodeChoice, Demand } from '../result';
import { clauseOf, isLater, memoryNote } from './edition';
import {
	generalReduction,
	lateralCurve,
	momentShapeFactor,
	rolledReduction,
	type BucklingCurve
} from './lateral-torsional-curve';
import {
	criticalMoment,
	lateralStiffness,
	momentShape,
	type LateralStiffness,
	type MomentShape
} from './lateral-torsional-moment';
import { explainLateral } from './lateral-torsional-workings';
import { canBuckleSideways } from './member-stability';
import type { EnModel } from './model';

/** Resistance to lateral–torsional buckling, kNm, and what it comes from. */
export interface LateralTorsional {
	readonly MbRd: number;
	/** Elastic critical moment, kNm. */
	readonly Mcr: number;
	/** λLT */
	readonly lambda: number;
	/** χLT, with the moment's shape where 6.3.2.3 takes it. */
	readonly chi: number;
	/** f of 6.3.2.3(2); 1 where it is not taken. */
	readonly f: number;
	readonly curve: BucklingCurve;
	readonly method: CodeChoice['ltbCurves'];
	readonly clause: string;
	/** kNm, without γ: Wy fy of the class. */
	readonly Mk: number;
	readonly length: number;
	readonly stiffness: LateralStiffness;
	readonly shape: MomentShape;
}

export interface LateralOutcome {
	/** The demand gives an unbraced length and its moment lets the member buckle sideways. */
	readonly applies: boolean;
	readonly value: LateralTorsional | null;
	readonly notes: Note[];
}

const notApplying: LateralOutcome = { applies: false, value: null, notes: [] };

/**
 * Lateral–torsional buckling of a demand, 6.3.2: Mb,Rd = χLT Wy fy/γM1 with λLT = √(Wy fy/Mcr). `Mk` is Wy fy of
 * the section's class in the demand's sense, kNm, without γ (Weff for class 4). I sections, channels
 * bent about y, rectangular tubes and boxes of equal flanges; other shapes have a note instead of a figure.
 */
export function lateralTorsional(
	model: EnModel,
	demand: Demand,
	name: string,
	Mk: number | null
): LateralOutcome {
	const { unbracedLength: length = 0 } = demand;
	if (length <= 0 || !canBuckleSideways(model.section, demand)) return notApplying;
	const clause = clauseOf(model.code.standard, 'lateralTorsional');
	const none = (message: string): LateralOutcome => ({
		applies: true,
		value: null,
		notes: [{ code: 'ltb-not-covered', message, clause }]
	});
	const stiffness = lateralStiffness(model.section, model.strengths.modulus, demand);
	if (stiffness === null)
		return none(
			`Lateral–torsional buckling under ${name} is not covered for this shape or axis, so there is no Mb,Rd.`
		);
	const shape = momentShape(demand);
	if (shape === null)
		return none(
			`Under ${name} the load acts above the shear centre (zg > 0). C2 is known for C1 1.13 (uniform load) and 1.35 (load at midspan) only, so there is no Mb,Rd.`
		);
	if (Mk === null)
		return none(
			`There is no moment resistance under ${name} to reduce for lateral–torsional buckling.`
		);
	const value = lateralResistance(model, { length, stiffness, shape, Mk });
	explainLateral(model, name, value);
	return { applies: true, value, notes: lateralNotes(model, name, clause, value) };
}

type Given = Pick<LateralTorsional, 'length' | 'stiffness' | 'shape' | 'Mk'>;

function lateralResistance({ section, code }: EnModel, given: Given): LateralTorsional {
	const { length, stiffness, shape, Mk } = given;
	const asked = isLater(code.standard) ? 'general' : code.ltbCurves;
	const { curve, method } = lateralCurve(section.definition, asked);
	const Mcr = criticalMoment(stiffness, shape, length);
	const lambda = Math.sqrt(Mk / Mcr);
	const f = method === 'general' ? 1 : momentShapeFactor(lambda, shape.C1);
	const chi =
		method === 'general'
			? generalReduction(lambda, curve)
			: Math.min(1, 1 / lambda ** 2, rolledReduction(lambda, curve) / f);
	const clause = `${clauseOf(code.standard, 'lateralTorsional')}${method === 'general' ? '.2' : '.3'}`;
	return { ...given, MbRd: (chi * Mk) / code.gammaM1, Mcr, lambda, chi, f, curve, method, clause };
}

function lateralNotes(
	{ section: { definition }, code }: EnModel,
	name: string,
	clause: string,
	{ shape, length }: LateralTorsional
): Note[] {
	const plane =
		definition.kind === 'channel' ? ' The load acts through the shear centre, beside the web.' : '';
	const notes: Note[] = [
		{
			code: 'ltb-assumptions',
			message: `Lateral–torsional buckling under ${name} takes ${length} mm held sideways and against twist at both ends, free to warp and to turn in plan there, with C1 ${shape.C1} and a load ${shape.zg} mm above the shear centre.${plane}`,
			clause
		}
	];
	if (isLater(code.standard))
		notes.push(
			memoryNote(
				'The 2022 edition has curves of its own for doubly symmetric I sections; the general curves are taken instead. This use',
				clause
			)
		);
	return notes;
}
