import type { Point } from '$lib/engine/geometry/boundary';
import type { Plate } from '$lib/engine/section/definition';
import { turnedRectangle } from '$lib/engine/section/plates/placing';
import type { PlateStretch } from '$lib/engine/section/plates/stretches';
import type { LabelWish } from '$lib/drawing/placed-labels';

type Place = (point: Point) => { x: number; y: number } | null;
type Length = (millimetres: number) => string;

/** More plates than this are named when pointed at only. */
const mostNamed = 14;
/** Letters of a name on the drawing. */
const mostLetters = 16;

const shortName = (name: string): string =>
	name.length > mostLetters ? `${name.slice(0, mostLetters - 1).trimEnd()}…` : name;

/** Names of plates on the drawing, the selected one with its size, larger plates first. */
export function plateWishes(
	plates: readonly Plate[],
	selected: string | null,
	place: Place,
	length: Length
): LabelWish[] {
	const bySize = [...plates].sort((p, q) => q.width * q.thickness - p.width * p.thickness);
	return bySize.flatMap((plate) => {
		const at = place(namePoint(plate));
		if (!at) return [];
		const must = plate.name === selected;
		if (!must && plates.length > mostNamed) return [];
		const size = `${length(plate.width)} × ${length(plate.thickness)}`;
		return [
			{ key: plate.name, text: must ? `${plate.name} ${size}` : shortName(plate.name), ...at, must }
		];
	});
}

/** Share of the width that a name stands off the middle, where the axes and marks are. */
const offMiddle = 0.22;

function namePoint(plate: Plate): Point {
	const { along, centre } = turnedRectangle(plate);
	const off = offMiddle * plate.width;
	return { y: centre.y + off * along.y, z: centre.z + off * along.z };
}

/** Clear widths of stretches: “c 117, outstand”. */
export const stretchWishes = (
	stretches: readonly PlateStretch[],
	place: Place,
	length: Length
): LabelWish[] =>
	stretches.flatMap(({ id, type, from, to }) => {
		const at = place({ y: (from.y + to.y) / 2, z: (from.z + to.z) / 2 });
		const c = length(Math.hypot(to.y - from.y, to.z - from.z));
		return at ? [{ key: `c ${id}`, text: `c ${c}, ${type}`, ...at }] : [];
	});
