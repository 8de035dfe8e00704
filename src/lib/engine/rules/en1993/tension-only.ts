import { workingKey } from '../../explain/keys';
import type { Note } from '../../result';
import type { Demand, DemandState, Resistance } from '../result';
import { tensionResistance } from './axial-resistance';
import type { EnModel } from './model';
import { en1993Outcome } from './rules';

export interface TensionOnly {
	readonly resistance: Resistance;
	readonly demands: DemandState[];
	readonly notes: Note[];
}

const isPull = ({ N = 0, My = 0, Mz = 0, Vy = 0, Vz = 0 }: Demand): boolean =>
	N > 0 && My === 0 && Mz === 0 && Vy === 0 && Vz === 0;

/**
 * What needs no class: the resistance to tension, 6.2.3, of a section whose parts Table 5.2 does not know.
 * Demands are judged where all of them are a pull alone; every other figure is null.
 */
export function tensionOnly(
	given: Omit<EnModel, 'elements'>,
	demands: readonly Demand[]
): TensionOnly {
	const model: EnModel = { ...given, elements: { kind: 'solid', part: 'section' } };
	const { value, working } = tensionResistance(model);
	const pulled = demands.length > 0 && demands.every(isPull);
	const found = pulled ? en1993Outcome({ ...model, workings: null }, demands) : null;
	if (working !== null && value !== null)
		model.workings?.add(workingKey.resistance('NtRd'), working);
	return {
		resistance: {
			standard: model.code.standard,
			basis: 'elastic',
			MyRd: null,
			MyRdNegative: null,
			MzRd: null,
			NRd: null,
			NtRd: value,
			VyRd: null,
			VzRd: null,
			checks: found?.resistance.checks ?? [],
			utilisation: found?.resistance.utilisation ?? null
		},
		demands: found?.demands ?? [],
		notes: found?.demands.flatMap(({ missing }) => missing) ?? []
	};
}
