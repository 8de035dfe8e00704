import type { Resistance, SectionClass, Stiffeners } from '../rules/result';
import type { SectionDefinition } from '../section/definition';

/** One size that is changed, mm. `part` may be `flanges` where both change together. */
export interface Change {
	readonly part: string;
	readonly field: string;
	readonly from: number;
	readonly to: number;
}

/** A section as it stands or as it is proposed. */
export interface Girder {
	readonly definition: SectionDefinition;
	readonly stiffeners: Stiffeners | null;
}

/** What a change leads to, found by a full analysis. */
export interface UnlockOption {
	readonly changes: readonly Change[];
	readonly girder: Girder;
	readonly class: SectionClass;
	readonly basis: Resistance['basis'];
	/** kNm, in the sense that the section stands in. */
	readonly MyRd: number | null;
	/** What may be counted along the moment of the demand that decides, kNm. */
	readonly countable: number | null;
	/** kg/m */
	readonly mass: number;
	/** kg/m, negative for less steel. */
	readonly addedMass: number;
	/** Greatest use under all demands; null without demands or where a check is missing. */
	readonly utilisation: number | null;
}
