import { workingKey } from '../../explain/keys';
import type { Note } from '../../result';
import { effectiveAnswer, type EffectiveAnswer } from '../effective-answer';
import type { Classification, Demand, DemandState, Resistance } from '../result';
import type { AxisSense } from '../section-moments';
import { tensionResistance, type AxialResistance } from './axial-resistance';
import type { BendingResistance } from './bending-resistance';
import { holeNotes } from './bolt-holes';
import { classNotes } from './class-notes';
import { effectsOf, type DemandClass } from './demand-class';
import { demandNames } from './demand-names';
import type { EffectiveSection } from './effective/effective-section';
import { contextOf, type EnContext } from './en-context';
import {
	flangeFirstYieldNote,
	flangeNotes,
	heldToFirstYield,
	noRotationNotes
} from './flange-checks';
import { greatest, judgeDemand, type JudgedDemand } from './judged-demand';
import { isUnbent, stabilityNotes } from './member-stability';
import { pureCases, pureClasses, type EnModel, type PureCases } from './model';
import { withoutNegligible } from './negligible-effects';
import { strengthNotes } from './notes';
import { shearLagNotes } from './shear-lag';
import { shearResistances, type ShearResistances } from './shear-resistance';

/** Class, resistances and demands by EN 1993-1-1, with what is missing. */
export interface EnOutcome {
	readonly classification: Classification;
	readonly effective: EffectiveAnswer | null;
	readonly resistance: Resistance;
	readonly demands: DemandState[];
	readonly notes: Note[];
}

type Bent = Readonly<Record<AxisSense, BendingResistance>>;

/** All that the code says of a section and its demands. */
export function en1993Outcome(model: EnModel, asked: readonly Demand[]): EnOutcome {
	const cases = pureCases(model);
	const context = contextOf(model, cases);
	const tubeHolds = model.elements.kind !== 'tube' || cases.compression.overall < 4;
	const shear = shearResistances(model, tubeHolds);
	const names = demandNames(asked);
	const demands = asked.map((demand) => withoutNegligible(model, demand));
	const judged = demands.map((demand, i) =>
		judgeDemand(context, demand, names[i]!, shear, tubeHolds)
	);
	const standing = standingCase(cases, judged);
	const bent = bentAllWays(context);
	const axial = context.axial(-1, cases.compression);
	const resistance = resistanceOf(context, bent, axial, standing, shear, judged);
	const slender = [...Object.values(bent), axial].flatMap(({ effective }) => effective ?? []);
	const unbent = demands.length === 0 || demands.some(isUnbent);
	return {
		classification: classificationOf(model, cases, standing),
		effective: effectiveAnswer(slender, standingEffective(bent, axial.effective, standing)),
		resistance,
		demands: judged.map(({ state }) => state),
		notes: [
			...classNotes(model, demands.map(effectsOf)),
			...strengthNotes(model, cases, bent, judged),
			...slender.flatMap(({ notes }) => notes),
			...shear.notes,
			...holeNotes(model),
			...judged.flatMap(({ state, notes }) => [...notes, ...state.missing]),
			...(unbent ? flangeNotes(model, cases, bent.plusMy) : []),
			...noRotationNotes(model, cases),
			...(isHeldToFirstYield(model, cases) ? [flangeFirstYieldNote(null)] : []),
			...shearLagNotes(model),
			...stabilityNotes(model, demands, isHeld(demands, judged))
		]
	};
}

/** Whether a demand's lateral–torsional buckling has been checked. */
const isHeld =
	(demands: readonly Demand[], judged: readonly JudgedDemand[]) =>
	(demand: Demand): boolean =>
		judged[demands.indexOf(demand)]?.state.reduced.MbRd !== undefined;

/** The demand with the worst class, the first of equals; without demands +My. */
function standingCase(cases: PureCases, judged: readonly JudgedDemand[]): DemandClass {
	const plain: DemandClass = { classified: cases.plusMy, basis: '+My', caseName: 'plusMy' };
	const first = judged[0]?.classed ?? plain;
	return judged.reduce(
		(worst, { classed }) =>
			classed.classified.overall > worst.classified.overall ? classed : worst,
		first
	);
}

function classificationOf(
	{ code }: EnModel,
	cases: PureCases,
	{ classified, basis }: DemandClass
): Classification {
	const { overall, elements, governing } = classified;
	const byCase = pureClasses(cases);
	return { standard: code.standard, overall, basis, elements, governing, byCase };
}

const bentAllWays = ({ bending, cases, model }: EnContext): Bent => ({
	plusMy: bending('plusMy', heldToFirstYield(model, cases.plusMy, 1)),
	minusMy: bending('minusMy', heldToFirstYield(model, cases.minusMy, -1)),
	plusMz: bending('plusMz', cases.plusMz),
	minusMz: bending('minusMz', cases.minusMz)
});

const isHeldToFirstYield = (model: EnModel, { plusMy, minusMy }: PureCases): boolean =>
	heldToFirstYield(model, plusMy, 1) !== plusMy || heldToFirstYield(model, minusMy, -1) !== minusMy;

/** The effective section of the pure case that the class stands on. */
function standingEffective(
	bent: Bent,
	axial: EffectiveSection | null,
	{ basis, caseName }: DemandClass
): EffectiveSection | null {
	if (basis === 'N') return axial;
	if (caseName in bent) return bent[caseName as AxisSense].effective;
	return bent.plusMy.effective ?? axial;
}

function resistanceOf(
	{ model }: EnContext,
	bent: Bent,
	compression: AxialResistance,
	standing: DemandClass,
	shear: ShearResistances,
	judged: readonly JudgedDemand[]
): Resistance {
	const tension = tensionResistance(model);
	const weak = weaker(bent.plusMz, bent.minusMz);
	explain(model, {
		MyRd: bent.plusMy,
		MyRdNegative: bent.minusMy,
		MzRd: weak,
		NRd: compression,
		NtRd: tension
	});
	const checks = judged.flatMap((one) => one.checks);
	const own = standing.caseName in bent ? bent[standing.caseName as AxisSense] : bent.plusMy;
	return {
		standard: model.code.standard,
		basis: own.basis,
		MyRd: bent.plusMy.value,
		MyRdNegative: bent.minusMy.value,
		MzRd: weak.value,
		NRd: compression.value,
		NtRd: tension.value,
		VyRd: shear.y?.resistance ?? null,
		VzRd: shear.z?.resistance ?? null,
		...ofPressing(judged),
		checks,
		utilisation: greatest(
			checks,
			judged.flatMap(({ state }) => state.missing)
		)
	};
}

/** The lesser of both senses; without a figure where one has none. */
function weaker(a: BendingResistance, b: BendingResistance): BendingResistance {
	if (a.value === null) return a;
	return b.value === null || b.value < a.value ? b : a;
}

interface Figure {
	readonly value: number | null;
	readonly working: BendingResistance['working'];
}

function explain({ workings }: EnModel, figures: Readonly<Record<string, Figure>>): void {
	if (workings === null) return;
	for (const [name, { value, working }] of Object.entries(figures))
		if (value !== null && working !== null) workings.add(workingKey.resistance(name), working);
}

/** The contract's figures beside N and V: of the demand that uses most, or misses a check. */
function ofPressing(
	judged: readonly JudgedDemand[]
): Pick<Resistance, 'MyVRd' | 'MyNRd' | 'MzNRd' | 'VbRd' | 'MbRd'> {
	const press = ({ state }: JudgedDemand) =>
		state.utilisation ?? (state.missing.length > 0 ? Infinity : -1);
	const [first, ...rest] = judged;
	if (!first) return {};
	const most = rest.reduce((a, b) => (press(b) > press(a) ? b : a), first);
	const { MyVRd, MyNRd, MzNRd, VbRd, MbRd } = most.state.reduced;
	const given = Object.entries({ MyVRd, MyNRd, MzNRd, VbRd, MbRd });
	return Object.fromEntries(given.filter(([, value]) => value !== undefined));
}
