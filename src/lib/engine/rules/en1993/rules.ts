import type { Note } from '../../result';
import type { Classification, Demand, DemandState, Resistance, ResistanceCheck } from '../result';
import type { AxisSense } from '../section-moments';
import { axialStrength } from './axial-resistance';
import { bendingResistance, type BendingResistance } from './bending-resistance';
import { holedParts, holeNotes, holesInTension } from './bolt-holes';
import { classNotes } from './class-notes';
import type { ClassifiedCase } from './classify';
import { demandChecks } from './demand-checks';
import { classifyDemand, effectsOf, type DemandClass } from './demand-class';
import { demandNames } from './demand-names';
import { demandRuler } from './demand-state';
import { flangeInducedBuckling } from './flange-induced-buckling';
import { isUnbent, stabilityNotes } from './member-stability';
import { pureCases, pureClasses, type EnModel, type PureCases } from './model';
import { withoutNegligible } from './negligible-effects';
import { classFourNotes, interactionNotes, strengthNotes } from './notes';
import { shearResistances } from './shear-resistance';

/** Class, resistances and demands by EN 1993-1-1:2005, with what is missing. */
export interface EnOutcome {
	readonly classification: Classification;
	readonly resistance: Resistance;
	readonly demands: DemandState[];
	readonly notes: Note[];
}

interface Judged {
	readonly state: DemandState;
	readonly classed: DemandClass;
	readonly checks: ResistanceCheck[];
}

/** All that the code says of a section and its demands. */
export function en1993Outcome(model: EnModel, asked: readonly Demand[]): EnOutcome {
	const cases = pureCases(model);
	const tubeHolds = model.elements.kind !== 'tube' || cases.compression.overall < 4;
	const shear = shearResistances(model, tubeHolds);
	const names = demandNames(asked);
	const demands = asked.map((demand) => withoutNegligible(model, demand));
	const judged = demands.map((demand, i) => judgeDemand(model, cases, demand, names[i]!, shear));
	const standing = standingCase(cases, judged);
	const bent = bentBothWays(model, cases);
	const resistance = resistanceOf(model, cases, bent, standing, shear, judged);
	const webRefused = bent.plus.webRefused || bent.minus.webRefused;
	return {
		classification: classificationOf(model, cases, standing),
		resistance,
		demands: judged.map(({ state }) => state),
		notes: [
			...classNotes(model, demands.map(effectsOf)),
			...classFourNotes(pureClasses(cases)),
			...strengthNotes(model, cases, { basis: resistance.basis, webRefused }),
			...shear.notes,
			...holeNotes(model.section),
			...interactionNotes(demands),
			...judged.flatMap(({ state }) => state.missing),
			...(demands.length === 0 || demands.some(isUnbent)
				? flangeNotes(model, cases, bent.plus)
				: []),
			...stabilityNotes(model.section, demands)
		]
	};
}

function judgeDemand(
	model: EnModel,
	cases: PureCases,
	demand: Demand,
	name: string,
	shear: Parameters<typeof demandChecks>[4]
): Judged {
	const effects = effectsOf(demand);
	const classed = classifyDemand(model, cases, effects, name);
	const { classified, basis } = classed;
	const used = demandChecks(model, demand, name, classified, shear);
	const sense: AxisSense = effects.My < 0 ? 'minusMy' : 'plusMy';
	const onlyMy = effects.N === 0 && effects.Mz === 0 && model.code.allowEffectiveClass2;
	const alone = bendingResistance(model, sense, classified, onlyMy);
	const holed = holesInTension(model.section, sense);
	const ruler = demandRuler(model, effects, used, holed ? null : alone.value);
	const state: DemandState = {
		demand: name,
		class: classified.overall,
		governing: classified.governing,
		basis,
		elements: classified.elements,
		N: effects.N,
		...ruler,
		countableBasis: ruler.countable === null ? null : alone.basis,
		withheld: used.withheld,
		utilisation: greatest(used.checks, used.missing)?.value ?? null,
		missing: used.missing
	};
	return { state, classed, checks: used.checks };
}

function greatest(checks: readonly ResistanceCheck[], missing: readonly Note[]) {
	if (missing.length > 0 || checks.length === 0) return null;
	const worst = checks.reduce((a, b) => (b.utilisation > a.utilisation ? b : a));
	return { governing: worst.name, value: worst.utilisation };
}

/** The demand with the worst class, the first of equals; without demands +My. */
function standingCase(cases: PureCases, judged: readonly Judged[]): DemandClass {
	const first = judged[0]?.classed ?? {
		classified: cases.plusMy,
		basis: '+My' as const,
		caseName: 'plusMy'
	};
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

function bentOneWay(model: EnModel, cases: PureCases, sense: AxisSense): BendingResistance {
	const found = bendingResistance(model, sense, cases[sense]);
	return holesInTension(model.section, sense) ? { ...found, value: null } : found;
}

const bentBothWays = (model: EnModel, cases: PureCases) => ({
	plus: bentOneWay(model, cases, 'plusMy'),
	minus: bentOneWay(model, cases, 'minusMy')
});

/** Without a demanded moment the section is judged for bending with the bottom in tension. */
const flangeNotes = (model: EnModel, { plusMy }: PureCases, { basis }: BendingResistance) =>
	flangeInducedBuckling(model, { overall: plusMy.overall, basis, topCompressed: true });

function resistanceOf(
	model: EnModel,
	cases: PureCases,
	{ plus, minus }: ReturnType<typeof bentBothWays>,
	standing: DemandClass,
	shear: { y: number | null; z: number | null },
	judged: readonly Judged[]
): Resistance {
	const sideways = (sense: AxisSense) => bentOneWay(model, cases, sense).value;
	return {
		standard: model.code.standard,
		basis: (standing.basis === '−My' ? minus : plus).basis,
		MyRd: plus.value,
		MyRdNegative: minus.value,
		MzRd: lesser(sideways('plusMz'), sideways('minusMz')),
		NRd: compressionResistance(model, cases.compression),
		NtRd: tensionResistance(model),
		VyRd: shear.y,
		VzRd: shear.z,
		checks: judged.flatMap(({ checks }) => checks),
		utilisation: greatest(
			judged.flatMap(({ checks }) => checks),
			judged.flatMap(({ state }) => state.missing)
		)
	};
}

const lesser = (a: number | null, b: number | null) =>
	a === null || b === null ? null : Math.min(a, b);

const compressionResistance = (model: EnModel, { overall }: ClassifiedCase) =>
	overall === 4 ? null : axialStrength(model, overall <= 2) / model.code.gammaM0;

const tensionResistance = (model: EnModel) =>
	holedParts(model.section).length > 0 ? null : axialStrength(model, true) / model.code.gammaM0;
