import type { Explanation } from '../explain/working';
import type { StrengthBasis } from '../material/material';
import type { Note } from '../result';
import type { GrossProperties } from '../section/prepared';
import type { EffectiveAnswer } from './effective-answer';
import type { Classification, CodeChoice, DemandState, Resistance } from './result';
import type { MomentFigures } from './section-moments';
import type { Verdict } from './verdict';

/** The contract's answer of `analyse` without its envelope. */
export interface AnalysisFigures {
	strengthBasis: StrengthBasis;
	/** The code and its choices that the figures follow, defaults filled in. */
	code: CodeChoice;
	gross: GrossProperties;
	moment: MomentFigures;
	/** kN */
	squashLoad: number;
	classification: Classification | null;
	/** Of the case that the classification stands on; null where nothing is class 4. */
	effective: EffectiveAnswer | null;
	resistance: Resistance | null;
	/** One for each demand, in their order; empty where no rule covers the section. */
	demands: DemandState[];
	notes: Note[];
}

export interface Analysis extends AnalysisFigures {
	verdict: Verdict;
	/** How the figures came about, where that was asked for. */
	explain?: Explanation;
}
