import { Workings } from '../explain/working';
import { mechanicsOf } from '../response/law-groups';
import { squashLoad } from '../response/plastic';
import type { Note } from '../result';
import type { PreparedSection } from '../section/prepared';
import type { Analysis, AnalysisFigures } from './analysis';
import { codeChoice, factorIssues } from './code-choice';
import { lawIssues } from './en1993/law-cover';
import { elementsOf, type SectionElements } from './en1993/plate-elements';
import { en1993Outcome, type EnOutcome } from './en1993/rules';
import { strengthIssues, strengthsOf, type Strengths } from './en1993/strengths';
import { classNotBuilt, codeNotBuilt } from './not-built';
import type { CodeChoice, Demand, Stiffeners } from './result';
import { momentFigures, sectionMoments } from './section-moments';
import { verdict } from './verdict';

export type { Analysis } from './analysis';

export interface AnalyseRequest {
	code?: Partial<CodeChoice> | undefined;
	demands?: readonly Demand[] | undefined;
	stiffeners?: Stiffeners | undefined;
	/** Whether the answer carries how each figure came about. */
	explain?: boolean | undefined;
}

/** Everything the engine says of a section under a code and demands; nothing is kept between calls. */
export function analyse(section: PreparedSection, request: AnalyseRequest = {}): Analysis {
	const code = codeChoice(request.code);
	const mechanics = mechanicsOf(section);
	const strengths = strengthsOf(section);
	const moments = sectionMoments(mechanics, strengths.even);
	const workings = request.explain ? new Workings() : null;
	const stiffeners = request.stiffeners ?? null;
	const outcome = judged(section, code, strengths, (elements) =>
		en1993Outcome(
			{ section, mechanics, moments, strengths, elements, code, stiffeners, workings },
			request.demands ?? []
		)
	);
	const figures: AnalysisFigures = {
		strengthBasis: section.strengthBasis,
		code,
		gross: section.gross,
		moment: momentFigures(section, moments),
		squashLoad: strengths.even ? mechanics.squash * 1e-3 : squashLoad(section),
		classification: outcome.classification,
		effective: null,
		resistance: outcome.resistance,
		demands: outcome.demands,
		notes: distinct([...section.notes, ...outcome.notes])
	};
	const answer = { ...figures, verdict: verdict(figures) };
	return workings === null ? answer : { ...answer, explain: workings.explanation() };
}

type Outcome = Pick<AnalysisFigures, 'classification' | 'resistance' | 'demands' | 'notes'>;

/** The code's outcome, or nulls with the reason where its rules do not reach. */
function judged(
	section: PreparedSection,
	code: CodeChoice,
	strengths: Strengths,
	outcome: (elements: SectionElements) => EnOutcome
): Outcome {
	const none = (notes: Note[]): Outcome => ({
		classification: null,
		resistance: null,
		demands: [],
		notes
	});
	if (code.standard !== 'EN1993-1-1:2005') return none([codeNotBuilt(code.standard)]);
	const elements = elementsOf(section, strengths);
	if (elements === null) return none([classNotBuilt(section.definition.kind)]);
	const issues = [
		...factorIssues(code),
		...strengthIssues(section, strengths),
		...lawIssues(section.parts)
	];
	return issues.length > 0 ? none(issues) : outcome(elements);
}

function distinct(notes: readonly Note[]): Note[] {
	const kept: Note[] = [];
	for (const note of notes) {
		const same = ({ code, message }: Note) => code === note.code && message === note.message;
		if (!kept.some(same)) kept.push(note);
	}
	return kept;
}
