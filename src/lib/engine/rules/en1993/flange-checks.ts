import type { Note } from '../../result';
import type { Resistance, ResistanceCheck } from '../result';
import type { ClassifiedCase } from './classify';
import type { DemandCase } from './demand-case';
import type { Constraint } from './demand-checks';
import { flangeInducedBucklingCheck, type Counted } from './flange-induced-buckling';
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
	const { overall } = c.classified;
	const found = checkOf(model, { overall, basis, topCompressed: c.direction.y > 0 }, c.name);
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

/**
 * The check with k 0.3 for class 1 while that is met; else with k 0.4, since a plastic moment is counted
 * here but no rotation of a plastic hinge.
 */
function checkOf(model: EnModel, counted: Counted, name: string | null = null) {
	const found = flangeInducedBucklingCheck(model, counted, name);
	if (found === null || counted.overall > 1 || found.value <= found.limit) return found;
	return flangeInducedBucklingCheck(model, { ...counted, overall: 2 }, name);
}

/** Class 1 girders whose moment stands on k 0.4: no plastic hinge may be let turn in them. */
export function noRotationNotes(model: EnModel, { plusMy, minusMy }: PureCases): Note[] {
	const turning = [plusMy, minusMy].some(({ overall }, i) => {
		const counted = { overall, basis: 'plastic' as const, topCompressed: i === 0 };
		const found = overall === 1 ? flangeInducedBucklingCheck(model, counted) : null;
		return found !== null && found.value > found.limit;
	});
	if (!turning) return [];
	return [
		{
			code: 'flange-induced-no-rotation',
			message:
				'The class 1 section is counted without rotation of a plastic hinge: its web is too slender for k 0.3 against buckling of the compression flange into it.',
			clause: 'EN 1993-1-5 8(1)'
		}
	];
}

/**
 * The class that a moment about y counts by: class 3 up to first yield where the flange would buckle into
 * the web beyond it, k 0.3 or 0.4 of EN 1993-1-5 8(1), but not up to it, k 0.55.
 */
export function heldToFirstYield(
	model: EnModel,
	classified: ClassifiedCase,
	My: number
): ClassifiedCase {
	const { overall } = classified;
	if (overall === 4 || My === 0) return classified;
	const passes = (basis: Resistance['basis']) => {
		const found = checkOf(model, { overall, basis, topCompressed: My > 0 });
		return found === null || found.value <= found.limit;
	};
	if (passes(overall === 3 ? 'effective-class-2' : 'plastic') || !passes('elastic'))
		return classified;
	return { ...classified, overall: 3, firstYieldOnly: true };
}

/** That a moment was held to first yield; without a name the bending resistances. */
export const flangeFirstYieldNote = (name: string | null): Note => ({
	code: 'flange-induced-first-yield',
	message: `${name === null ? 'Moments about y are' : `The moment of ${name} is`} counted up to first yield only: beyond it the compression flange could buckle into the web (k 0.3 or 0.4), up to it it cannot (k 0.55).`,
	clause: 'EN 1993-1-5 8(1)'
});

/** Without a demanded moment the section is judged for bending with the bottom in tension. */
export function flangeNotes(
	model: EnModel,
	{ plusMy }: PureCases,
	{ basis }: BendingResistance
): Note[] {
	const counted = { overall: plusMy.overall, basis, topCompressed: true };
	const found = checkOf(model, counted);
	if (found === null || found.value <= found.limit) return [];
	return [
		{
			code: 'flange-induced-buckling',
			message: `The compression flange may buckle into the web: hw/tw ${found.value.toFixed(1)} is over ${found.limit.toFixed(1)}. No moment with the bottom in tension may be counted.`,
			clause: found.clause
		}
	];
}
