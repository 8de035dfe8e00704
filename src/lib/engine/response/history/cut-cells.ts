import { cutAlong } from '../../geometry/cut';
import type { Edge } from '../../geometry/boundary';
import type { Layer } from '../../material/layers';
import { boxSpread, cellOf, fallOf, spreadOver, type Cell } from './cell';
import { fieldSum, shifted, type LinearField } from './linear-field';

/** Cuts nearer to an edge of a cell than this share of the section's reach are not made. */
const sliver = 1e-11;

/**
 * The cells as a strain plane leaves them: cut along every line at which a layer begins to yield, with
 * the plastic strain of what yields brought up to date. Within each new cell every layer is either
 * elastic or at its limit, so that the stress is linear.
 */
export function strainedCells(
	cells: readonly Cell[],
	layersOfPart: readonly (readonly Layer[])[],
	strain: LinearField,
	reach: number
): Cell[] {
	return cells.flatMap((cell) => {
		const layers = layersOfPart[cell.part]!;
		let pieces: readonly Cell[] = [cell];
		for (let k = 0; k < layers.length; k++) {
			pieces = pieces.flatMap((piece) => yieldedPieces(piece, k, layers[k]!, strain, reach));
		}
		return pieces;
	});
}

/** Steel that a layer leaves stretched to its limit, elastic, and crushed to its limit. */
function yieldedPieces(
	cell: Cell,
	k: number,
	{ tension, compression }: Layer,
	strain: LinearField,
	reach: number
): readonly Cell[] {
	const elastic = fieldSum(strain, cell.plastic[k]!, -1);
	const rough = boxSpread(cell.box, elastic);
	if (rough.most <= tension && rough.least >= -compression) return [cell];
	const stretched = shifted(strain, -tension);
	const crushed = shifted(strain, compression);
	const { least, most } = spreadOver(cell, elastic);
	const { frame, size } = fallOf(elastic);
	const margin = sliver * reach * size;
	if (least >= tension - margin) return [withPlastic(cell, k, stretched)];
	if (most <= -compression + margin) return [withPlastic(cell, k, crushed)];
	const tolerance = sliver * 0.1 * reach;
	const cut = (edges: readonly Edge[], limit: number) =>
		cutAlong(edges, frame, (elastic.c - limit) / size, tolerance);
	let rest: readonly Edge[] = cell.edges;
	const out: (Cell | null)[] = [];
	const piece = (edges: readonly Edge[], plastic: LinearField) =>
		out.push(cellOf(cell.part, edges, replaced(cell.plastic, k, plastic)));
	if (most > tension + margin) {
		const { below, above } = cut(rest, tension);
		piece(below, stretched);
		rest = above;
	}
	if (least < -compression - margin) {
		const { below, above } = cut(rest, -compression);
		piece(above, crushed);
		rest = below;
	}
	if (rest === cell.edges) return [cell];
	piece(rest, cell.plastic[k]!);
	return out.filter((made): made is Cell => made !== null);
}

const replaced = (list: readonly LinearField[], at: number, value: LinearField) =>
	list.map((own, i) => (i === at ? value : own));

const withPlastic = (cell: Cell, k: number, plastic: LinearField): Cell => ({
	...cell,
	plastic: replaced(cell.plastic, k, plastic)
});

/** Stress in a cell under a strain plane that none of its layers yields under, N/mm². */
export function stressField(
	{ plastic }: Cell,
	layers: readonly Layer[],
	strain: LinearField
): LinearField {
	let [c, y, z] = [0, 0, 0];
	for (let k = 0; k < layers.length; k++) {
		const [{ modulus }, own] = [layers[k]!, plastic[k]!];
		c += modulus * (strain.c - own.c);
		y += modulus * (strain.y - own.y);
		z += modulus * (strain.z - own.z);
	}
	return { c, y, z };
}
