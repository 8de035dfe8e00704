import type { ReducedFigures, ResistanceCheck } from '../result';
import { simpleCheck } from './check-workings';
import { singleSense, type DemandCase } from './demand-case';
import type { Constraint } from './demand-checks';
import { clauseOf } from './edition';
import { shearResistances, type AxisShear } from './shear-resistance';
import { webShearInteraction } from './web-shear-interaction';

/** V against its resistance along both axes, 6.2.6 and EN 1993-1-5 5.2, and what that leaves of the moment. */
export function shearChecks(c: DemandCase): {
	checks: ResistanceCheck[];
	constraints: Constraint[];
} {
	const { Vy = 0, Vz = 0 } = c.demand;
	const { y, z } = c.shear.resistances;
	const asked = [
		{ V: Vz, along: z, axis: 'z' as const },
		{ V: Vy, along: y, axis: 'y' as const }
	].filter(({ V, along }) => V !== 0 && along !== null);
	return {
		checks: asked.map(({ V, along, axis }) =>
			simpleCheck(
				c.context.model,
				c.name,
				`shear along ${axis}`,
				shearClause(c, along!),
				Math.abs(V),
				along!.resistance
			)
		),
		constraints: asked.flatMap(({ V, along, axis }) =>
			shearConstraint(c, Math.abs(V), along!, axis)
		)
	};
}

const shearClause = (c: DemandCase, { buckling }: AxisShear): string =>
	buckling === null ? clauseOf(c.context.model.code.standard, 'shear') : 'EN 1993-1-5 5.2(1)';

/** Where the flanges help to carry the shear, a moment takes that help away. */
function shearConstraint(
	c: DemandCase,
	V: number,
	{ buckling, resistance, plastic }: AxisShear,
	axis: 'y' | 'z'
): Constraint[] {
	if (buckling === null || buckling.Vbw >= V || buckling.Vbf === 0)
		return V > resistance ? [{ by: 'shear', use: () => V / resistance, most: 0 }] : [];
	const model = { ...c.context.model, workings: null };
	const use = (moment: number) => {
		const bent = { ...c.demand, My: moment * c.direction.y, Mz: moment * c.direction.z };
		return V / (shearResistances(model, true, bent)[axis]?.resistance ?? plastic);
	};
	return [{ by: 'shear', use, most: null }];
}

/** More than any moment, so that 7.1 tells its own moments. */
const beyondAll = 1e300;

/** Bending with shear in a web that may buckle, EN 1993-1-5 7.1, beside N. */
export function webConstraint(
	c: DemandCase
): { constraint: Constraint; checks: ResistanceCheck[]; reduced: ReducedFigures } | null {
	const { shear, direction, effects, size, context } = c;
	if (!shear.buckled || direction.y === 0) return null;
	const sense = direction.y < 0 ? 'minusMy' : 'plusMy';
	const { z } = shear.resistances;
	const [V, N] = [c.demand.Vz ?? 0, effects.N];
	const found = webShearInteraction(context.model, sense, { M: beyondAll, V, N }, z);
	if (found === null) return null;
	const { Mf, Mpl, eta3 } = found;
	const lost = (1 - Mf / Mpl) * (2 * eta3 - 1) ** 2;
	const most = Math.max(Mf, Mpl * (1 - lost));
	const M = size * Math.abs(direction.y);
	const own = webShearInteraction(context.model, sense, { M, V, N }, z, c.name);
	return {
		constraint: {
			by: 'web-shear',
			use: (moment) => {
				const My = moment * Math.abs(direction.y);
				return My < Mf ? 0 : My / Mpl + lost;
			},
			most: most / Math.abs(direction.y)
		},
		checks: own === null ? [] : [webCheck(c, own)],
		reduced: reducedByWeb(c, sense, most)
	};
}

const webCheck = (
	c: DemandCase,
	{ value, limit, clause }: { value: number; limit: number; clause: string }
): ResistanceCheck => ({
	demand: c.name,
	name: 'bending with shear in the web',
	clause,
	value,
	limit,
	utilisation: value / limit
});

function reducedByWeb(c: DemandCase, sense: 'plusMy' | 'minusMy', most: number): ReducedFigures {
	if (c.effects.N !== 0 || singleSense(c.direction) === null) return {};
	const { value } = c.context.bending(sense, c.classified);
	return value === null ? {} : { MyVRd: Math.min(value, most) };
}
