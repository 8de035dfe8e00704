import type { Note } from '../../result';
import type { Resistance, ResistanceCheck } from '../result';
import type { DemandCase } from './demand-case';
import type { Constraint } from './demand-checks';
import { flangeInducedBucklingCheck } from './flange-induced-buckling';
import type { EnModel, PureCases } from './model';
import type { BendingResistance } from './bending-resistance';

/** Buckling of the compression flange into the web, EN 1993-1-5 8, where bending about y is asked. */
export function flangeChecks(
	c: DemandCase,
	basis: Resistance['basis'] | null
): { checks: ResistanceCheck[]; constraints: Constraint[] } {
	const { model } = c.context;
	if (basis === null || c.direction.y === 0) return { checks: [], constraints: [] };
	if (c.size === 0 && c.effects.N !== 0) return { checks: [], constraints: [] };
	const found = flangeInducedBucklingCheck(
		model,
		{
			overall: c.classified.overall,
			basis,
			topCompressed: c.direction.y > 0
		},
		c.name
	);
	if (found === null) return { checks: [], constraints: [] };
	const { value, limit, clause } = found;
	const fails = value > limit;
	return {
		checks:
			c.size === 0 && !fails
				? []
				: [
						{
							demand: c.name,
							name: 'flange-induced buckling',
							clause,
							value,
							limit,
							utilisation: value / limit
						}
					],
		constraints: fails ? [{ by: 'flange-induced-buckling', use: () => value / limit, most: 0 }] : []
	};
}

/** Without a demanded moment the section is judged for bending with the bottom in tension. */
export function flangeNotes(
	model: EnModel,
	{ plusMy }: PureCases,
	{ basis }: BendingResistance
): Note[] {
	const counted = { overall: plusMy.overall, basis, topCompressed: true };
	const found = flangeInducedBucklingCheck(model, counted);
	if (found === null || found.value <= found.limit) return [];
	return [
		{
			code: 'flange-induced-buckling',
			message: `The compression flange may buckle into the web: hw/tw ${found.value.toFixed(1)} is over ${found.limit.toFixed(1)}. No moment with the bottom in tension may be counted.`,
			clause: found.clause
		}
	];
}
