import type { Note } from '../../result';
import type { Demand } from '../result';
import type { EnModel } from './model';
import { shearAreasOf, type ShearArea, type ShearPanel } from './shear-area';
import { panelBuckling, type PanelBuckling } from './shear-buckling';
import { flangeShare, type FlangeShare } from './shear-buckling-flange';
import { areaNotes, bucklingNotes, outsideNote } from './shear-notes';
import { explainShear } from './shear-workings';
import { epsilonOf } from './strengths';

/** Shear along which axis. */
export type ShearAxis = 'y' | 'z';

/** Shear buckling along one axis, EN 1993-1-5 clause 5; kN. Slenderness, kτ and χw are the most slender panel's. */
export interface ShearBuckling {
	readonly chiW: number;
	readonly slenderness: number;
	readonly kTau: number;
	readonly Vbw: number;
	readonly Vbf: number;
	readonly Vb: number;
}

/** Resistance to shear along one axis, kN, design. */
export interface AxisShear {
	/** mm² */
	readonly area: number;
	readonly shearArea: ShearArea;
	/** Vpl,Rd */
	readonly plastic: number;
	/** Null where no plate needs a check of shear buckling. */
	readonly buckling: ShearBuckling | null;
	/** The lesser of Vpl,Rd and Vb,Rd. */
	readonly resistance: number;
}

/** Null along an axis without a resistance; the notes say why. */
export interface ShearResistances {
	readonly y: AxisShear | null;
	readonly z: AxisShear | null;
	readonly notes: Note[];
}

/**
 * Shear resistances of 6.2.6 (2022: 8.2.6) with shear buckling by EN 1993-1-5 clause 5. With a demand the
 * flanges' part counts beside its My and N; without one it is left out. A class 4 tube has none.
 */
export function shearResistances(
	model: EnModel,
	tubeHolds: boolean,
	demand?: Demand,
	name = ''
): ShearResistances {
	if (!tubeHolds) return { y: null, z: null, notes: [] };
	const areas = shearAreasOf(model.section, model.code.eta);
	const notes: Note[] = [];
	const along = (axis: ShearAxis) =>
		axisShear(model, axis, areas[axis], notes, demand === undefined ? null : { demand, name });
	const [z, y] = [along('z'), along('y')];
	return { y, z, notes: [...notes, ...areaNotes(model, areas)] };
}

function axisShear(
	model: EnModel,
	axis: ShearAxis,
	area: ShearArea | null,
	notes: Note[],
	acting: { demand: Demand; name: string } | null
): AxisShear | null {
	const panels = area === null ? [] : panelsOf(model, area);
	const outside = area && panels.find((panel) => isOutside(model, panel));
	if (area === null || outside) {
		if (outside) notes.push(outsideNote(model, outside, panelLimit(model, outside), axis));
		return null;
	}
	const fy = shearStrength(model, area);
	const plastic = (area.area * fy * 1e-3) / (Math.sqrt(3) * model.code.gammaM0);
	const checked = panels
		.filter(({ support }) => support === 'both-edges')
		.map((panel) => panelBuckling(model, panel, fy));
	const share =
		acting && axis === 'z' && checked[0] && flangeShare(model, checked[0], acting.demand);
	const buckling = bucklingOf(checked, share || null);
	if (buckling) notes.push(...bucklingNotes(model, area));
	const resistance = buckling === null ? plastic : Math.min(plastic, buckling.Vb);
	explainShear(model, {
		axis,
		area,
		fy,
		plastic,
		checked,
		buckling,
		share: share || null,
		name: acting?.name ?? null,
		resistance
	});
	return { area: area.area, shearArea: area, plastic, buckling, resistance };
}

/** The least strength of the parts that the shear area lies in, N/mm². */
function shearStrength({ section }: EnModel, { shares }: ShearArea): number {
	let least = Infinity;
	for (const { name, material } of section.parts)
		if (shares[name] !== undefined) least = Math.min(least, material.fy, material.fyc);
	return least;
}

/** Free plates are held as their contacts say; every other kind knows its own panels. */
function panelsOf(
	{ section, elements }: EnModel,
	{ panels, shares }: ShearArea
): readonly ShearPanel[] {
	if (section.definition.kind !== 'plates' || elements.kind !== 'plates') return panels;
	const known = elements.plates.filter(({ part }) => shares[part] !== undefined);
	return known.map(({ part, type, c, t }) => ({
		part,
		depth: c,
		thickness: t,
		support: type === 'internal' ? 'both-edges' : 'one-edge'
	}));
}

/**
 * Shear buckling coefficient of a plate with one free edge: kv 1.2 of AISC 360-22 G3 for stems and legs;
 * EN 1993-1-5 has none. With it 31ε√kτ/η (η = 1) bounds the plates that need no check.
 */
const freeEdgeCoefficient = 1.2;

/** Depth over thickness up to which a panel that no rule covers is sure not to buckle. */
function panelLimit({ strengths, code }: EnModel, { part, support }: ShearPanel): number {
	const epsilon = epsilonOf(strengths.of(part), strengths.modulus);
	return support === 'tube'
		? (72 * epsilon) / code.eta
		: 31 * epsilon * Math.sqrt(freeEdgeCoefficient);
}

const isOutside = (model: EnModel, panel: ShearPanel): boolean =>
	panel.support !== 'both-edges' && panel.depth / panel.thickness > panelLimit(model, panel);

function bucklingOf(
	panels: readonly PanelBuckling[],
	share: FlangeShare | null
): ShearBuckling | null {
	if (!panels.some(({ needed }) => needed)) return null;
	const worst = panels.reduce((a, b) => (b.slenderness > a.slenderness ? b : a));
	const Vbw = panels.reduce((sum, panel) => sum + panel.Vbw, 0);
	const most = panels.reduce((sum, panel) => sum + panel.most, 0);
	const Vbf = share?.Vbf ?? 0;
	const { chiW, slenderness, kTau } = worst;
	return { chiW, slenderness, kTau, Vbw, Vbf, Vb: Math.min(Vbw + Vbf, most) };
}
