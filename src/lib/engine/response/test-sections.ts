import type { Loop, Point, Region } from '../geometry/boundary';
import { loopBounds, loopLength } from '../geometry/bounds';
import { lawOf } from '../material/laws';
import type { LawDefinition, Material } from '../material/material';
import { grossProperties } from '../section/gross';
import type { Part, PreparedSection } from '../section/prepared';

/** Bare sections for tests of the mechanics, made without the section kinds. */

export const steel = (
	fy: number,
	{ E = 210_000, fyc = fy, law }: { E?: number; fyc?: number; law?: LawDefinition } = {}
): Material => {
	const made = lawOf(law, { E, fy, fyc, fu: fy * 1.3 });
	if (!made.ok) throw new Error(made.error);
	return { grade: String(fy), fy, fyc, fu: fy * 1.3, E, density: 7850, law: made.value };
};

export const polygon = (...corners: [number, number][]): Loop =>
	corners.map(([y, z], i) => {
		const [nextY, nextZ] = corners[(i + 1) % corners.length]!;
		return { kind: 'line', from: { y, z }, to: { y: nextY, z: nextZ } };
	});

export const rectangle = (left: number, bottom: number, width: number, height: number): Region => ({
	loops: [
		polygon(
			[left, bottom],
			[left + width, bottom],
			[left + width, bottom + height],
			[left, bottom + height]
		)
	]
});

export const circle = (centre: Point, radius: number, hole = false): Loop => [
	{ kind: 'arc', centre, radius, start: 0, sweep: hole ? -2 * Math.PI : 2 * Math.PI }
];

export const part = (name: string, region: Region, material: Material): Part => ({
	name,
	region,
	material,
	thickness: 10
});

export function sectionOf(...parts: Part[]): PreparedSection {
	const contours = parts.flatMap(({ region }) => region.loops);
	return {
		definition: { kind: 'flat', b: 1, h: 1, grade: 1 },
		strengthBasis: 'product-standard',
		parts,
		contours,
		bounds: loopBounds(contours),
		gross: grossProperties(parts, {
			perimeter: contours.reduce((sum, loop) => sum + loopLength(loop), 0),
			torsionConstant: null,
			warpingConstant: null,
			shearCentre: null
		}),
		notes: []
	};
}
