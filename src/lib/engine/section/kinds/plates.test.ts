import { describe, expect, it } from 'vitest';
import type { Plate, PlatesSection } from '../definition';
import { prepareSection } from '../prepare';
import type { PreparedSection } from '../prepared';

const plate = (
	name: string,
	width: number,
	thickness: number,
	y: number,
	z: number,
	angle = 0
): Plate => ({
	name,
	width,
	thickness,
	y,
	z,
	angle
});
const plates = (...list: Plate[]): PlatesSection => ({
	kind: 'plates',
	grade: 'S355',
	plates: list
});

const girder = plates(
	plate('top', 300, 20, 0, 410),
	plate('web', 800, 10, 0, 0, 90),
	plate('bottom', 300, 20, 0, -410)
);

function prepared(definition: PlatesSection): PreparedSection {
	const result = prepareSection(definition);
	if (!result.ok) throw new Error(result.error.map(({ message }) => message).join(' '));
	return result.value;
}

function messages(definition: PlatesSection): string[] {
	const result = prepareSection(definition);
	return result.ok ? [] : result.error.map(({ path, message }) => `${path}: ${message}`);
}

/** The girder moved and turned about the origin, degrees. */
const placed = (definition: PlatesSection, dy: number, dz: number, turn: number): PlatesSection => {
	const [cosine, sine] = [Math.cos((turn * Math.PI) / 180), Math.sin((turn * Math.PI) / 180)];
	return {
		...definition,
		plates: definition.plates.map((one) => ({
			...one,
			y: dy + one.y * cosine - one.z * sine,
			z: dz + one.y * sine + one.z * cosine,
			angle: one.angle + turn
		}))
	};
};

describe('free plates', () => {
	it('make the same girder as the welded I of the same sizes', () => {
		const i = prepareSection({
			kind: 'i',
			h: 840,
			b: 300,
			tw: 10,
			tf: 20,
			fabrication: 'welded',
			grade: 'S355'
		});
		const { gross } = prepared(girder);
		expect(i.ok && i.value.gross.secondMomentY).toBeCloseTo(gross.secondMomentY, 3);
		expect(i.ok && i.value.gross.perimeter).toBeCloseTo(gross.perimeter, 9);
	});

	it('merge into one outline without the inner joints', () => {
		expect(prepared(girder).contours).toHaveLength(1);
		expect(prepared(girder).contours[0]).toHaveLength(12);
	});

	it('keep their shape and their joints when moved and turned', () => {
		const turned = prepared(placed(girder, 12_345, -678, 37));
		expect(turned.contours).toHaveLength(1);
		expect(turned.contours[0]).toHaveLength(12);
		expect(turned.gross.secondMomentU / prepared(girder).gross.secondMomentY).toBeCloseTo(1, 10);
	});

	it('draw the inside of a box as a hole and paint the outside only', () => {
		const box = prepared(
			plates(
				plate('top', 300, 20, 0, 210),
				plate('left', 400, 10, -145, 0, 90),
				plate('right', 400, 10, 145, 0, 90),
				plate('bottom', 300, 20, 0, -210)
			)
		);
		expect(box.contours).toHaveLength(2);
		expect(box.gross.perimeter).toBeCloseTo(2 * (300 + 440), 9);
	});

	it('lose nothing far from the origin', () => {
		const far = prepared(placed(girder, 9e5, -9e5, 0)).gross;
		const near = prepared(girder).gross;
		expect(far.secondMomentY / near.secondMomentY).toBeCloseTo(1, 10);
		expect(far.plasticModulusZ / near.plasticModulusZ).toBeCloseTo(1, 10);
	});

	it('may be a hundredth of a millimetre a kilometre from the origin', () => {
		const { gross } = prepared(plates(plate('speck', 0.01, 0.01, 1e6, 1e6)));
		// a coordinate there is known to 1.2e-10 mm: 1e-8 of the size
		expect(gross.area / 1e-4).toBeCloseTo(1, 7);
	});

	it('may be very unlike in size', () => {
		const { gross } = prepared(
			plates(plate('wide', 100_000, 0.01, 0, 0), plate('stub', 0.01, 0.01, 0, 0.01))
		);
		expect(gross.area / 1000.0001).toBeCloseTo(1, 12);
	});

	it('join where a corner stands on an edge', () => {
		const leaning = plate('leaning', 100, 10, 0, (100 + 10) / 2 / Math.SQRT2 + 5, 45);
		expect(messages(plates(plate('base', 400, 10, 0, 0), leaning))).toEqual([]);
	});

	it('go by their own thickness and grade', () => {
		const mixed = prepared({
			...girder,
			plates: girder.plates.map((one) => (one.name === 'web' ? { ...one, grade: 'S235' } : one))
		});
		expect(mixed.parts.map(({ material }) => material.fy)).toEqual([345, 235, 345]);
	});
});

describe('free plates that cannot be', () => {
	it('overlap: both are named, and by how much', () => {
		const [top, web, bottom] = girder.plates as [Plate, Plate, Plate];
		expect(messages(plates({ ...top, z: 407 }, web, bottom))).toEqual([
			'plates.1: Plates “top” and “web” overlap by 3 mm.'
		]);
	});

	it('lie apart: the pieces are named, with the gap', () => {
		const [top, web, bottom] = girder.plates as [Plate, Plate, Plate];
		const apart = plates({ ...top, z: 412 }, web, bottom);
		expect(messages(apart)[0]).toContain(
			'Plates “top” and “web”, “bottom” are not connected: the gap is 2 mm.'
		);
		expect(messages({ ...apart, tied: true })).toEqual([]);
		expect(prepared({ ...apart, tied: true }).notes.map(({ code }) => code)).toContain(
			'pieces-tied-by-intent'
		);
	});

	it('are named twice, or have no size, or lie nowhere', () => {
		expect(messages(plates(plate('a', 10, 10, 0, 0), plate('a', 10, 10, 10, 0)))).toEqual([
			'plates.1.name: Two plates are called “a”.'
		]);
		expect(messages(plates(plate('a', 10, 0, 0, 0)))[0]).toBe(
			'plates.0.thickness: Plate “a”: thickness must be greater than 0.'
		);
		expect(messages(plates(plate('a', 10, 10, Number.NaN, 0)))[0]).toBe(
			'plates.0.y: Plate “a”: y must be a number.'
		);
		expect(messages(plates(plate('a', 10, 10, 2e6, 0)))[0]).toContain(
			'plates.0.y: Plate “a”: y must be within'
		);
	});

	it('are joined by a join that names no plate, or two that do not touch', () => {
		const named = { ...girder, joins: [{ a: 'top', b: 'webb' }] };
		expect(messages(named)).toEqual(['joins.0.b: There is no plate “webb” to join.']);
		const far = { ...girder, joins: [{ a: 'top', b: 'bottom' }] };
		expect(messages(far)[0]).toBe(
			'joins.0: Plates “top” and “bottom” are to be joined but do not touch.'
		);
	});

	it('are left out by joins that are given', () => {
		const some = { ...girder, joins: [{ a: 'top', b: 'web' }] };
		expect(messages(some)[0]).toContain('are not connected: no join connects them');
	});
});
