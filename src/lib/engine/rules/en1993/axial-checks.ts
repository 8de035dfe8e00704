import type { ResistanceCheck } from '../result';
import { simpleCheck } from './check-workings';
import type { DemandCase } from './demand-case';
import { clauseOf } from './edition';
import { shearedMechanics } from './moment-shear';
import { sumUseOfAxial } from './normal-rules';
import { shearedAxial, shearLosses } from './shear-state';

/** The check of N by itself, and the force (kN, a size) that it leaves where nothing bends. */
export interface AxialChecks {
	readonly checks: ResistanceCheck[];
	readonly countable: number | null;
}

/** N against its resistance, 6.2.3 or 6.2.4; beside high shear that of 6.2.10. */
export function axialChecks(c: DemandCase): AxialChecks {
	const { N } = c.effects;
	const limit = N === 0 ? null : axialLimit(c);
	if (limit === null) return { checks: [], countable: null };
	const { model } = c.context;
	const topic = c.shear.high ? 'bendingShearAxial' : N < 0 ? 'compression' : 'tension';
	const name = `${N < 0 ? 'compression' : 'tension'}${c.shear.high ? ' beside shear' : ''}`;
	const check = simpleCheck(
		model,
		c.name,
		name,
		clauseOf(model.code.standard, topic),
		Math.abs(N),
		limit
	);
	const use = Math.max(check.utilisation, sumUseOfAxial(c));
	return { checks: [check], countable: Math.abs(N) / use };
}

/** kN, design; shear takes its areas away. */
function axialLimit(c: DemandCase): number | null {
	const { context, classified, effects, shear } = c;
	const { value } = context.axial(effects.N, classified);
	if (value === null || !shear.high) return value;
	const { model } = context;
	const { kind } = model.section.definition;
	if (classified.overall <= 2 && !kind.endsWith('hollow'))
		return Math.max(
			Math.min(value, shearedAxial(model, shearedMechanics(model, shearLosses(shear)))),
			leastLeft * value
		);
	return value * Math.max(1 - Math.max(shear.rhoY, shear.rhoZ), leastLeft);
}

/** Where shear takes all strength this share stands for nothing, so that figures stay finite. */
const leastLeft = 1e-9;
