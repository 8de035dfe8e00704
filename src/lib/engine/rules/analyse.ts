import { demandWorkings } from '../explain/demand-workings';
import { grossWorkings } from '../explain/gross-workings';
import { momentWorkings } from '../explain/moment-workings';
import { placeWorkings } from '../explain/place-workings';
import { Workings } from '../explain/working';
import { mechanicsOf } from '../response/law-groups';
import { squashLoad } from '../response/plastic';
import type { Note } from '../result';
import type { PreparedSection } from '../section/prepared';
import type { Analysis, AnalysisFigures } from './analysis';
import { codeChoice, factorIssues } from './code-choice';
import { isEn1993 } from './en1993/edition';
import type { SectionElements } from './en1993/elements/element';
import { elementsOf } from './en1993/elements/elements-of';
import { lawIssues } from './en1993/law-cover';
import { en1993Outcome } from './en1993/rules';
import { strengthIssues, strengthsOf, type Strengths } from './en1993/strengths';
import { tensionOnly } from './en1993/tension-only';
import { codeNotBuilt } from './not-built';
import type { CodeChoice, Demand, Stiffeners } from './result';
import { momentFigures, resistingMoments, sectionMoments } from './section-moments';
import { verdict } from './verdict';

export type { Analysis } from './analysis';

export interface AnalyseRequest {
	code?: Partial<CodeChoice> | undefined;
	demands?: readonly Demand[] | undefined;
	stiffeners?: Stiffeners | undefined;
	/** Whether the answer carries how each figure came about. */
	explain?: boolean | undefined;
}

/** Everything the engine says of a section under a code and demands. */
export function analyse(section: PreparedSection, request: AnalyseRequest = {}): Analysis {
	const code = codeChoice(request.code);
	const mechanics = mechanicsOf(section);
	const strengths = strengthsOf(section);
	const moments = sectionMoments(mechanics, strengths.even);
	const workings = request.explain ? new Workings() : null;
	const stiffeners = request.stiffeners ?? null;
	const demands = request.demands ?? [];
	const outcome = judged(section, code, strengths, (elements) => {
		const resisting = resistingMoments(mechanics, section, moments);
		const given = { section, mechanics, moments: resisting, strengths, code, stiffeners, workings };
		if (elements === null)
			return { classification: null, effective: null, ...tensionOnly(given, demands) };
		return en1993Outcome({ ...given, elements }, demands);
	});
	const figures: AnalysisFigures = {
		strengthBasis: section.strengthBasis,
		code,
		gross: section.gross,
		moment: momentFigures(section, moments),
		squashLoad: strengths.even ? mechanics.squash * 1e-3 : squashLoad(section),
		classification: outcome.classification,
		effective: outcome.effective,
		resistance: outcome.resistance,
		demands: outcome.demands,
		notes: distinct([...section.notes, ...outcome.notes])
	};
	const answer = { ...figures, verdict: verdict(figures) };
	if (workings) {
		grossWorkings(workings, section);
		momentWorkings(workings, section, figures.moment, figures.squashLoad);
		placeWorkings(workings, section, figures.moment);
		for (const state of figures.demands) demandWorkings(workings, figures, state);
	}
	return workings === null ? answer : { ...answer, explain: workings.explanation() };
}

type Outcome = Pick<
	AnalysisFigures,
	'classification' | 'effective' | 'resistance' | 'demands' | 'notes'
>;

/** The code's outcome, or nulls with the reason where its rules do not reach. */
function judged(
	section: PreparedSection,
	code: CodeChoice,
	strengths: Strengths,
	outcome: (elements: SectionElements | null) => Outcome
): Outcome {
	const none = (notes: Note[]): Outcome => ({
		classification: null,
		effective: null,
		resistance: null,
		demands: [],
		notes
	});
	if (!isEn1993(code.standard)) return none([codeNotBuilt(code.standard)]);
	const { elements, notes } = elementsOf(section, strengths);
	const issues = [
		...factorIssues(code),
		...strengthIssues(section, strengths, code.standard),
		...lawIssues(section.parts, code.standard)
	];
	if (issues.length > 0) return none(elements === null ? [...notes, ...issues] : issues);
	// an outline has no resistance until its plates are stated
	if (section.definition.kind === 'outline') return none([...notes]);
	const found = outcome(elements);
	return { ...found, notes: [...notes, ...found.notes] };
}

function distinct(notes: readonly Note[]): Note[] {
	const kept: Note[] = [];
	for (const note of notes) {
		const same = ({ code, message }: Note) => code === note.code && message === note.message;
		if (!kept.some(same)) kept.push(note);
	}
	return kept;
}
