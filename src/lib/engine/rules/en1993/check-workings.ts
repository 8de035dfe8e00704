import { workingKey } from '../../explain/keys';
import type { Working } from '../../explain/working';
import type { ResistanceCheck } from '../result';
import { editionName } from './edition';
import type { EnModel } from './model';

/** Keeps how a check's use came about: its own formula, else value over limit. */
export function explainCheck(
	{ workings, code }: EnModel,
	check: ResistanceCheck,
	body: (() => Omit<Working, 'title' | 'clause' | 'edition'>) | null
): void {
	const { demand, name, clause, value, limit, utilisation } = check;
	const key = resistanceKeys[name]?.(demand);
	const known = key !== undefined && workings?.get(key)?.result.value === limit;
	const unit = key === undefined ? '' : 'kN';
	const from = known ? key : 'resistance beside the other effects';
	workings?.add(workingKey.check(demand, name), () => ({
		title: `${name.charAt(0).toUpperCase()}${name.slice(1)}, ${demand}`,
		clause,
		edition: editionName(code.standard),
		...(body?.() ?? {
			formula: 'U = E_d/R_d',
			inputs: [
				{ symbol: 'E_d', value, unit, from: 'demand' },
				{ symbol: 'R_d', value: limit, unit, from }
			],
			result: { value: utilisation, unit: '' }
		})
	}));
}

/** Resistances, kN, that plain checks hold against. */
const resistanceKeys: Readonly<Record<string, (demand: string) => string>> = {
	'shear along y': (demand) => workingKey.reduced(demand, 'VyRd'),
	'shear along z': (demand) => workingKey.reduced(demand, 'VzRd'),
	compression: () => workingKey.resistance('NRd'),
	tension: () => workingKey.resistance('NtRd')
};

/** A check of an effect against its resistance, with its working. */
export function simpleCheck(
	model: EnModel,
	demand: string,
	name: string,
	clause: string,
	value: number,
	limit: number
): ResistanceCheck {
	const check = { demand, name, clause, value, limit, utilisation: value / limit };
	explainCheck(model, check, null);
	return check;
}
