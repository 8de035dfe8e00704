import { layersOf, type Layer } from '../../material/layers';
import { residualPattern, type ResidualPattern } from '../../material/residual/pattern';
import { fail, ok, type Note, type Result } from '../../result';
import type { PreparedSection } from '../../section/prepared';
import { mechanicsOf, type Mechanics } from '../law-groups';
import { edgesAbout } from '../../geometry/edges-about';
import { cellOf, type Cell } from './cell';
import { scaled, zeroField, type LinearField } from './linear-field';

/**
 * What a section has been through: its steel in cells with their plastic strain, and the strain plane
 * at which it stands. Immutable; every bending and release gives another.
 */
export interface History {
	readonly section: PreparedSection;
	readonly residual: ResidualPattern;
	readonly mechanics: Mechanics;
	/** Layers of the law of each part. */
	readonly layers: readonly (readonly Layer[])[];
	readonly cells: readonly Cell[];
	/** Strain plane of the present state, curvatures in 1/mm. */
	readonly strain: LinearField;
	/** How the section came from the mill or the shop, before anything was imposed. */
	readonly start: readonly Cell[];
}

/** More cells than this are not followed: the time for one state grows with them. */
export const mostCells = 2000;

const lawNote: Note = {
	code: 'law-not-unloaded',
	message:
		'The stress–strain law softens, drops to zero or has another modulus in compression than in tension: unloading and residual stress are not followed for it, and no state is given.'
};

const fineNote: Note = {
	code: 'history-too-fine',
	message: `Unloading and residual stress are followed up to ${mostCells} pieces of steel: this section has too many parts for a law of so many lines, and no state is given.`
};

/**
 * The section as it leaves the mill or the shop, at rest: free of stress (`none`) or with the residual
 * stresses of rolling or welding. Fails with a note where no published pattern covers the section or
 * its law cannot be unloaded.
 */
export function historyOf(
	section: PreparedSection,
	residual: ResidualPattern = 'none'
): Result<History, Note> {
	const layers: (readonly Layer[])[] = [];
	for (const { material } of section.parts) {
		const own = layersOf(material.law);
		if (!own) return fail(lawNote);
		layers.push(own);
	}
	if (layers.reduce((sum, own) => sum + own.length, 0) > mostCells) return fail(fineNote);
	const cells =
		residual === 'none' ? ok(freeCells(section, layers)) : lockedCells(section, residual, layers);
	if (!cells.ok) return cells;
	const mechanics = mechanicsOf(section);
	const start = cells.value;
	return ok({ section, residual, mechanics, layers, cells: start, strain: zeroField, start });
}

const everyLayer = (layers: readonly Layer[], field: LinearField) => layers.map(() => field);

function freeCells(section: PreparedSection, layers: readonly (readonly Layer[])[]): Cell[] {
	return section.parts.flatMap(({ region }, part) => {
		const edges = edgesAbout(region.loops, section.gross.centroid);
		return cellOf(part, edges, everyLayer(layers[part]!, zeroField)) ?? [];
	});
}

/** Residual stress σ at rest is a plastic strain −σ/E locked into every layer. */
function lockedCells(
	section: PreparedSection,
	residual: Exclude<ResidualPattern, 'none'>,
	layers: readonly (readonly Layer[])[]
): Result<Cell[], Note> {
	const pattern = residualPattern(section, residual);
	if (!pattern.ok) return pattern;
	return ok(
		pattern.value.flatMap(({ part, edges, stress }) => {
			const modulus = layers[part]!.reduce((sum, layer) => sum + layer.modulus, 0);
			return cellOf(part, edges, everyLayer(layers[part]!, scaled(stress, -1 / modulus))) ?? [];
		})
	);
}
