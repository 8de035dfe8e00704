import type { Note } from '../../result';
import type { DemandCase } from './demand-case';
import type { PlateElement } from './elements/element';
import type { EnModel } from './model';
import { plateGirderOf } from './plate-girder';
import type { AxisShear } from './shear-resistance';

/**
 * What the rules for girders would ask of free plates and cannot be told of them, unless they stand as an
 * upright web between level flanges: bending with shear in a web that buckles (7.1) and flange-induced
 * buckling (8) of EN 1993-1-5. Where either may matter nothing is counted.
 */
export function platesGaps(c: DemandCase): Note[] {
	const { model } = c.context;
	const { definition } = model.section;
	if (definition.kind !== 'plates' || plateGirderOf(definition) !== null) return [];
	return [...webShearGap(c), ...flangeGap(c)];
}

function webShearGap({ name, demand, shear }: DemandCase): Note[] {
	const { Vy = 0, Vz = 0 } = demand;
	const { y, z } = shear.resistances;
	const counts = (V: number, axis: AxisShear | null) =>
		axis?.buckling && Math.abs(V) > 0.5 * axis.buckling.Vbw;
	if (!counts(Vy, y) && !counts(Vz, z)) return [];
	return [
		{
			code: 'web-shear-not-built',
			message: `The shear of ${name} is more than half of what a plate resists that may buckle in shear. How much moment stands beside it is known only for an upright web between two level flanges.`,
			clause: 'EN 1993-1-5 7.1(1)'
		}
	];
}

/** k of EN 1993-1-5 8(1) for a plastic moment without rotation of a hinge. */
const plasticFactor = 0.4;

function flangeGap({ name, context: { model }, direction, size, effects }: DemandCase): Note[] {
	if (size === 0 && effects.N !== 0) return [];
	const { elements } = model;
	if (elements.kind !== 'plates') return [];
	const webs = elements.plates.filter(
		(plate) =>
			plate.type === 'internal' &&
			((direction.y !== 0 && rises(plate)) || (direction.z !== 0 && !rises(plate)))
	);
	if (webs.every((web) => isStout(model, web))) return [];
	return [
		{
			code: 'flange-induced-not-built',
			message: `Under ${name} a compressed plate may buckle into the plate that holds it. That is checked only for an upright web between two level flanges; here a plate held at both edges is too slender to be sure of it.`,
			clause: 'EN 1993-1-5 8(1)'
		}
	];
}

const rises = ({ from, to }: PlateElement): boolean =>
	Math.abs(to.z - from.z) >= Math.abs(to.y - from.y);

/** Whether a web is within its limit even with every other plate as its compression flange. */
function isStout({ section, strengths }: EnModel, { c, t, part }: PlateElement): boolean {
	const { definition, gross } = section;
	if (definition.kind !== 'plates') return true;
	const { width } = definition.plates.find(({ name }) => name === part) ?? { width: c };
	const web = c * t;
	const others = Math.max(gross.area - web, 0);
	const most = plasticFactor * (strengths.modulus / strengths.most) * Math.sqrt(web / others);
	return Math.max(width, c) / t <= most;
}
