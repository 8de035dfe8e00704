import type { Note } from '../../result';
import { boxSizes } from '../../section/kinds/box';
import { iSizes } from '../../section/kinds/i';
import type { PreparedSection } from '../../section/prepared';
import type { Resistance, SectionClass } from '../result';
import type { EnModel } from './model';

/** Webs and flanges of a welded section, mm and mm². */
interface WeldedSection {
	readonly hw: number;
	readonly tw: number;
	readonly webArea: number;
	readonly topFlange: number;
	readonly bottomFlange: number;
}

/** What a moment about y is counted by. */
export interface Counted {
	readonly overall: SectionClass;
	readonly basis: Resistance['basis'];
	readonly topCompressed: boolean;
}

/**
 * Buckling of the compression flange into the web, EN 1993-1-5 8(1): hw/tw up to
 * k (E/fyf) √(Aw/Afc), k 0.3 with plastic rotation (class 1), 0.4 with the plastic moment (class 2,
 * or a web taken as class 2), 0.55 elastic. A note where it is exceeded in a welded I or box.
 */
export function flangeInducedBuckling(model: EnModel, counted: Counted): Note[] {
	const welded = weldedSection(model.section);
	if (welded === null) return [];
	const { hw, tw, webArea } = welded;
	const part = counted.topCompressed ? 'topFlange' : 'bottomFlange';
	const { modulus, of } = model.strengths;
	const limit = factor(counted) * (modulus / of(part)) * Math.sqrt(webArea / welded[part]);
	if (hw / tw <= limit) return [];
	return [
		{
			code: 'flange-induced-buckling-not-checked',
			message: `The compression flange may buckle into the web: hw/tw ${(hw / tw).toFixed(1)} is over ${limit.toFixed(1)}. That check is not built beyond this limit.`,
			clause: 'EN 1993-1-5 8(1)'
		}
	];
}

function factor({ overall, basis }: Counted): number {
	if (overall === 1) return 0.3;
	return overall === 2 || basis === 'effective-class-2' ? 0.4 : 0.55;
}

function weldedSection({ definition }: PreparedSection): WeldedSection | null {
	if (definition.kind === 'i' && definition.fabrication === 'welded')
		return plated(iSizes(definition), 1);
	return definition.kind === 'box' ? plated(boxSizes(definition), 2) : null;
}

function plated(
	{ h, tw, bTop, tfTop, bBottom, tfBottom }: Omit<ReturnType<typeof iSizes>, 'r' | 'middle'>,
	webs: number
): WeldedSection {
	const hw = h - tfTop - tfBottom;
	return {
		hw,
		tw,
		webArea: webs * hw * tw,
		topFlange: bTop * tfTop,
		bottomFlange: bBottom * tfBottom
	};
}
