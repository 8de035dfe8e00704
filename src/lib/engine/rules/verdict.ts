import type { Note } from '../result';
import type { AnalysisFigures } from './analysis';
import type {
	ClassifiedElement,
	DemandState,
	Resistance,
	SectionClass,
	CodeChoice
} from './result';
import { uncheckedNames } from './unchecked';
import { countSentence, detailSentence, noClassSentence } from './verdict-sentences';
import { plainSentence, words, type VerdictToken } from './verdict-tokens';

export type VerdictStatus = 'passes' | 'fails' | 'incomplete' | 'no-figure';

/** Moments on one line from zero, kNm; first yield and full plastic under the demand's N. */
export interface VerdictRuler {
	/** Direction of the moment, degrees from y. */
	axisAngle: number;
	demand: number | null;
	countable: number | null;
	firstYield: number | null;
	fullPlastic: number | null;
}

/** What may be counted, in words and on the ruler. */
export interface Verdict {
	sentence: string;
	detail: string;
	/** The same two sentences with their numbers apart, for other units. */
	sentenceTokens: VerdictToken[];
	detailTokens: VerdictToken[];
	/** kNm along the ruler; kN, a size, where N acts alone. */
	countable: { moment: number | null; force: number | null; basis: Resistance['basis'] | null };
	/** Part that decides the class. */
	governing: string | null;
	notChecked: string[];
	/** `no-figure`: nothing is demanded, or nothing may be counted for want of a rule. */
	status: VerdictStatus;
	/** Every demand passes and nothing that may apply to it, member buckling included, is unchecked. */
	clear: boolean;
	/** The demand that the verdict speaks of. */
	demand: string | null;
	ruler: VerdictRuler;
}

/** What the sentences are made of: a demand's own state, or bending +My without demands. */
export interface VerdictView {
	class: SectionClass;
	element: ClassifiedElement | undefined;
	N: number;
	/** Bending about both axes. */
	biaxial: boolean;
	/** N acts, and no moment. */
	axial: boolean;
	/** kN, a size, of N alone. */
	countableForce: number | null;
	/** How N and moments were put together; null without a demand. */
	together: DemandState['together'];
	besideShear: boolean;
	limitedBy: DemandState['limitedBy'];
	/** Checks, in words, for want of which nothing is counted. */
	withheld: readonly string[];
	basis: Resistance['basis'] | null;
	gammaM0: number;
	ruler: VerdictRuler;
}

/**
 * The verdict on one demand: the one named, else the one that fails, is incomplete or uses most.
 * Without demands it speaks of bending with the bottom in tension.
 */
export function verdict(figures: AnalysisFigures, demandName?: string): Verdict {
	const named = figures.demands.find(({ demand }) => demand === demandName);
	const state = named ?? pressing(figures.demands);
	const view = state ? demandView(state, figures.code) : plainView(figures);
	const sentenceTokens = view ? countSentence(view) : noClassSentence();
	const detailTokens = view ? detailSentence(view) : [words(figures.notes.at(-1)?.message ?? '')];
	return {
		sentence: plainSentence(sentenceTokens),
		detail: plainSentence(detailTokens),
		sentenceTokens,
		detailTokens,
		countable: {
			moment: view?.ruler.countable ?? null,
			force: view?.countableForce ?? null,
			basis: view?.basis ?? null
		},
		governing: view?.element?.part ?? null,
		notChecked: notChecked(figures, view?.class ?? null),
		status: statusOf(figures, named),
		clear: statusOf(figures, undefined) === 'passes' && !figures.notes.some(isMemberCheck),
		demand: state?.demand ?? null,
		ruler: view?.ruler ?? bareRuler(figures)
	};
}

/** What fails first, then what misses a check, then what uses most; what asks nothing last. */
function pressing(demands: readonly DemandState[]): DemandState | undefined {
	const press = ({ utilisation, missing }: DemandState) =>
		utilisation ?? (missing.length > 0 ? 1 : -1);
	return demands.reduce<DemandState | undefined>(
		(most, state) => (most === undefined || press(state) > press(most) ? state : most),
		undefined
	);
}

function demandView(state: DemandState, { gammaM0 }: CodeChoice): VerdictView {
	const { axisAngle, moment: demand, countable, firstYield, fullPlastic } = state;
	return {
		class: state.class,
		element: governingElement(state.elements, state.governing, state.class),
		N: state.N,
		biaxial: axisAngle % 90 !== 0,
		axial: state.N !== 0 && demand === 0,
		countableForce: state.countableForce,
		together: state.together,
		besideShear: state.besideShear,
		limitedBy: state.limitedBy,
		withheld: uncheckedNames(state.withheld),
		basis: state.countableBasis,
		gammaM0,
		ruler: { axisAngle, demand, countable, firstYield, fullPlastic }
	};
}

function plainView(figures: AnalysisFigures): VerdictView | null {
	const { classification, resistance } = figures;
	if (classification === null || resistance === null) return null;
	const { elements, governing, overall } = classification;
	return {
		class: overall,
		element: governingElement(elements, governing, overall),
		N: 0,
		biaxial: false,
		axial: false,
		countableForce: null,
		together: null,
		besideShear: false,
		limitedBy: plainCountable(figures, 1) === 0 ? 'flange-induced-buckling' : null,
		withheld: [],
		basis: plainCountable(figures, resistance.MyRd) === null ? null : resistance.basis,
		gammaM0: figures.code.gammaM0,
		ruler: { ...bareRuler(figures), countable: plainCountable(figures, resistance.MyRd) }
	};
}

/** A girder whose flange may buckle into the web counts nothing. */
const plainCountable = ({ notes }: AnalysisFigures, MyRd: number | null): number | null =>
	notes.some(({ code }) => code === 'flange-induced-buckling') ? 0 : MyRd;

const governingElement = (
	elements: readonly ClassifiedElement[],
	governing: string,
	overall: SectionClass
) => elements.find((element) => element.part === governing && element.class === overall);

const bareRuler = ({ moment }: AnalysisFigures): VerdictRuler => ({
	axisAngle: 0,
	demand: null,
	countable: null,
	firstYield: moment.firstYieldY,
	fullPlastic: moment.plasticY
});

function statusOf(figures: AnalysisFigures, named: DemandState | undefined): VerdictStatus {
	const { resistance, demands } = figures;
	if (resistance === null || demands.length === 0) return 'no-figure';
	const over = resistance.checks.some(
		({ demand, utilisation }) => utilisation > 1 && (!named || demand === named.demand)
	);
	if (over) return 'fails';
	const used = named ? named.utilisation : (resistance.utilisation?.value ?? null);
	if (used !== null) return 'passes';
	const asked = named ? [named] : demands;
	return asked.some(({ missing }) => missing.length > 0) ? 'incomplete' : 'no-figure';
}

const isMemberCheck = ({ code }: Note): boolean =>
	code === 'ltb-not-checked' || code === 'member-buckling-not-checked';

/** A missing class 4 matters only where the section stands in it. */
function notChecked({ notes }: AnalysisFigures, standing: SectionClass | null): string[] {
	const codes = notes.map(({ code }) => code);
	return uncheckedNames(codes.filter((code) => code !== 'class-4-not-built' || standing === 4));
}
