import type { Working } from '../../explain/working';
import type { Resistance } from '../result';
import type { ReducedFigures } from '../result';
import type { Topic } from './edition';

/**
 * How N and the moments of one demand are judged together. Everything is of moments along the
 * demand's own direction (kNm) with N and V held.
 */
export interface NormalRule {
	readonly name: string;
	readonly topic: Topic;
	/** Words after the clause: the paragraph or standard that it also stands on. */
	readonly also?: string;
	/** Of the demand's own moment: value over limit is its use. */
	readonly value: number;
	readonly limit: number;
	/** Use of a moment of that size. */
	readonly use: (moment: number) => number;
	/** Greatest moment with use 1, where it has a closed form; otherwise it is looked for. */
	readonly most: number | null;
	readonly basis: Resistance['basis'];
	/** `sum`: added up linearly; `block`: by an interaction curve or the stress block. */
	readonly kind: 'alone' | 'sum' | 'curve' | 'fibre';
	readonly reduced: ReducedFigures;
	readonly working: (() => Omit<Working, 'title' | 'clause' | 'edition'>) | null;
}

/** Why no rule gives a figure. */
export interface NoRule {
	readonly gap: 'holes' | 'slender';
}

export const isRule = (rule: NormalRule | NoRule): rule is NormalRule => !('gap' in rule);
