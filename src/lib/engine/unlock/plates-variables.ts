import type { Plate, PlatesSection } from '../section/definition';
import { plateStretches, type PlateStretch } from '../section/plates/stretches';
import type { PlateStock } from './plate-stock';
import { around, thicker, variable, type Variable } from './variable';

/**
 * Of free plates: the width of an outstand at its free side, and the thickness about the middle. What
 * would run into another plate or leave it is refused when the section is built.
 */
export function platesVariables(definition: PlatesSection, stock: PlateStock): Variable[] {
	const { stretches } = plateStretches(definition);
	if (stretches === null) return [];
	return definition.plates.flatMap((plate, at) => [
		...widths(plate, at, stretches, stock),
		variable<PlatesSection>(
			plate.name,
			'thickness',
			plate.thickness,
			thicker(stock, plate.thickness),
			(section, thickness) => withPlate(section, at, { thickness })
		)
	]);
}

function widths(
	plate: Plate,
	at: number,
	stretches: readonly PlateStretch[],
	stock: PlateStock
): Variable[] {
	const own = stretches.filter(
		({ plates, type }) => type === 'outstand' && plates.length === 1 && plates[0] === plate.name
	);
	const sides = [...new Set(own.map((stretch) => freeSide(plate, stretch)))];
	if (sides.length === 0) return [];
	const side = sides.length === 1 ? sides[0]! : 0;
	const runs = around(plate.width, stock.widthStep);
	return [
		variable<PlatesSection>(plate.name, 'width', plate.width, runs, (section, width) => {
			const now = section.plates[at]!;
			const [y, z] = direction(now);
			const by = (side * (width - now.width)) / 2;
			return withPlate(section, at, { width, y: now.y + by * y, z: now.z + by * z });
		})
	];
}

/** +1 where the free tip lies along the plate's direction, −1 where against it. */
function freeSide(plate: Plate, { from, to }: PlateStretch): 1 | -1 {
	const [y, z] = direction(plate);
	return (to.y - from.y) * y + (to.z - from.z) * z > 0 ? 1 : -1;
}

const direction = ({ angle }: Plate): [number, number] => {
	const radians = (angle * Math.PI) / 180;
	return [Math.cos(radians), Math.sin(radians)];
};

const withPlate = (section: PlatesSection, at: number, change: Partial<Plate>): PlatesSection => ({
	...section,
	plates: section.plates.map((plate, i) => (i === at ? { ...plate, ...change } : plate))
});
