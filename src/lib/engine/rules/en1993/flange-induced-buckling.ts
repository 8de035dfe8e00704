import { workingKey } from '../../explain/keys';
import type { SectionDefinition } from '../../section/definition';
import type { Resistance, SectionClass } from '../result';
import type { EnModel } from './model';
import { plateGirderOf } from './plate-girder';

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
	readonly part: string;
}

const clause = 'EN 1993-1-5 8(1)';

/**
 * Buckling of the compression flange into the web, EN 1993-1-5 8(1): hw/tw up to
 * k (E/fyf) √(Aw/Afc), k 0.3 with plastic rotation (class 1), 0.4 with the plastic moment (class 2,
 * a web taken as class 2, or a moment between first yield and the full block), 0.55 elastic. Afc is the whole flange, which is on the safe side of its
 * effective area. Null for sections other than a welded I or box, and plates that stand as an I; girders curved in elevation (8(2)) are
 * not covered.
 */
export function flangeInducedBucklingCheck(
	model: EnModel,
	counted: Counted,
	name: string | null = null
): FlangeInducedBuckling | null {
	const { definition } = model.section;
	const girder = isRolled(definition) ? null : plateGirderOf(definition);
	if (girder === null) return null;
	const { hw, tw, webs } = girder;
	const { part, b, t } = counted.topCompressed ? girder.top : girder.bottom;
	const [E, fyf] = [model.strengths.modulus, model.strengths.of(part)];
	const [k, webArea, flangeArea] = [factor(counted), webs.length * hw * tw, b * t];
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
	if (basis === 'elastic' || basis === 'effective') return 0.55;
	return basis === 'plastic' && overall === 1 ? 0.3 : 0.4;
}

const isRolled = (definition: SectionDefinition): boolean =>
	definition.kind === 'i' && definition.fabrication === 'rolled';
