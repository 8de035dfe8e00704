import type { Note } from '../../result';
import type { EnModel } from './model';
import { shearAreasOf, type ShearArea } from './shear-area';
import { epsilonOf } from './strengths';

/** Plastic shear resistances, kN; null with a note where shear buckling would have to be checked. */
export interface ShearResistances {
	readonly y: number | null;
	readonly z: number | null;
	readonly notes: Note[];
}

/** Vpl,Rd = Av fy/(√3 γM0), 6.2.6, where c/t keeps to 72 ε/η; a class 4 tube has none. */
export function shearResistances(model: EnModel, tubeHolds: boolean): ShearResistances {
	const areas = shearAreasOf(model.section, model.code.eta);
	if (areas === null || !tubeHolds) return { y: null, z: null, notes: [] };
	const notes = (['z', 'y'] as const).flatMap((axis) => bucklingNote(model, areas[axis], axis));
	return {
		y: shearResistance(model, areas.y),
		z: shearResistance(model, areas.z),
		notes
	};
}

function shearStrength({ section }: EnModel, { parts }: ShearArea): number {
	const strengths = section.parts
		.filter(({ name }) => parts.includes(name))
		.map(({ material }) => Math.min(material.fy, material.fyc));
	return Math.min(...strengths);
}

function bucklingLimit(model: EnModel, area: ShearArea): number {
	const strongest = Math.max(...area.parts.map((part) => model.strengths.of(part)));
	return (72 * epsilonOf(strongest, model.strengths.modulus)) / model.code.eta;
}

const buckles = (model: EnModel, area: ShearArea): boolean =>
	area.slenderness !== null && area.slenderness > bucklingLimit(model, area);

function shearResistance(model: EnModel, area: ShearArea): number | null {
	if (buckles(model, area)) return null;
	return (area.area * shearStrength(model, area) * 1e-3) / (Math.sqrt(3) * model.code.gammaM0);
}

function bucklingNote(model: EnModel, area: ShearArea, axis: 'y' | 'z'): Note[] {
	if (!buckles(model, area)) return [];
	const over = `${plain(area.slenderness)} is over ${plain(bucklingLimit(model, area))} (72ε/η)`;
	return [
		{
			code: 'shear-buckling-not-built',
			message: `Shear buckling of the ${area.plate} would have to be checked: depth over thickness ${over}. That check is not built yet, so V${axis} has no resistance.`,
			clause: 'EN 1993-1-1:2005 6.2.6(6)'
		}
	];
}

const plain = (value: number | null) => (value ?? 0).toFixed(1);
