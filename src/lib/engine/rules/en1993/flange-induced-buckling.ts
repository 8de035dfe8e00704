import { workingKey } from '../../explain/keys';
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

/** Buckling of the compression flange into the web as a check: hw/tw against its limit. */
export interface FlangeInducedBuckling {
	readonly value: number;
	readonly limit: number;
	readonly clause: string;
	/** The compression flange. */
	readonly part: 'topFlange' | 'bottomFlange';
}

const clause = 'EN 1993-1-5 8(1)';

/**
 * Buckling of the compression flange into the web, EN 1993-1-5 8(1): hw/tw up to
 * k (E/fyf) √(Aw/Afc), k 0.3 with plastic rotation (class 1), 0.4 with the plastic moment (class 2,
 * or a web taken as class 2), 0.55 elastic. Afc is the whole flange, which is on the safe side of its
 * effective area. Null for sections other than a welded I or box; girders curved in elevation (8(2)) are
 * not covered.
 */
export function flangeInducedBucklingCheck(
	model: EnModel,
	counted: Counted,
	name: string | null = null
): FlangeInducedBuckling | null {
	const welded = weldedSection(model.section);
	if (welded === null) return null;
	const { hw, tw, webArea } = welded;
	const part = counted.topCompressed ? 'topFlange' : 'bottomFlange';
	const [E, fyf] = [model.strengths.modulus, model.strengths.of(part)];
	const [k, flangeArea] = [factor(counted), welded[part]];
	const value = hw / tw;
	const limit = k * (E / fyf) * Math.sqrt(webArea / flangeArea);
	if (name !== null)
		model.workings?.add(workingKey.check(name, 'flange-induced buckling'), () => ({
			title: 'Limit of the web’s slenderness against flange-induced buckling',
			clause,
			edition: 'EN 1993-1-5',
			formula: 'λ_lim = k·E/fyf·√(A_w/A_fc)',
			inputs: [
				{ symbol: 'k', value: k, unit: '', from: '0.3 class 1, 0.4 plastic moment, 0.55 elastic' },
				{ symbol: 'E', value: E, unit: 'N/mm²' },
				{ symbol: 'fyf', value: fyf, unit: 'N/mm²', from: `strength of the part ${part}` },
				{ symbol: 'A_w', value: webArea, unit: 'mm²' },
				{ symbol: 'A_fc', value: flangeArea, unit: 'mm²', from: 'compression flange' }
			],
			result: { value: limit, unit: '' }
		}));
	return { value, limit, clause, part };
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
