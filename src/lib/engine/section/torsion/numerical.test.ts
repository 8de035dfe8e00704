import { describe, expect, it } from 'vitest';
import type { Plate, Ring, SectionDefinition } from '../definition';
import { prepareSection } from '../prepare';
import { numericalTorsion, type NumericalTorsion } from './numerical';
import { withNumericalTorsion } from './with-numerical';

const grade = 235;

function prepared(definition: SectionDefinition) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	return section.value;
}

function solved(definition: SectionDefinition): NumericalTorsion {
	const torsion = numericalTorsion(prepared(definition));
	if (!('nodes' in torsion)) throw new Error(torsion.notes.map(({ message }) => message).join(' '));
	return torsion;
}

const codes = (notes: readonly { code: string }[]) => notes.map(({ code }) => code);

/** A lopsided channel with a stiffener. */
const ring: Ring = [
	[0, 0],
	[80, 0],
	[80, 10],
	[8, 10],
	[8, 140],
	[50, 140],
	[50, 120],
	[60, 120],
	[60, 152],
	[0, 152]
];
const outline = (outer: Ring): SectionDefinition => ({ kind: 'outline', outer, grade });
const moved = (change: (y: number, z: number) => readonly [number, number]) =>
	solved(outline(ring.map(([y, z]) => change(y, z))));

/** Two meshes of one shape differ by no more than their errors. */
const meshes = 2e-3;

function expectNear(value: number | null, expected: number, share = meshes): void {
	expect(value).not.toBeNull();
	expect(Math.abs(value! - expected)).toBeLessThan(share * Math.abs(expected));
}

describe('the numerical torsion solution', () => {
	const still = moved((y, z) => [y, z]);
	const [sy, sz] = [still.shearCentre!.y, still.shearCentre!.z];

	it('moves with the section', () => {
		const away = moved((y, z) => [y + 5000, z - 3000]);
		expectNear(away.torsionConstant, still.torsionConstant);
		expectNear(away.warpingConstant, still.warpingConstant!);
		expect(away.shearCentre!.y).toBeCloseTo(sy + 5000, 0);
		expect(away.shearCentre!.z).toBeCloseTo(sz - 3000, 0);
	});

	it.each([30, 90, 217])('turns with the section, %d°', (degrees) => {
		const [c, s] = [Math.cos((degrees * Math.PI) / 180), Math.sin((degrees * Math.PI) / 180)];
		const turned = moved((y, z) => [c * y - s * z, s * y + c * z]);
		expectNear(turned.torsionConstant, still.torsionConstant);
		expectNear(turned.warpingConstant, still.warpingConstant!);
		expect(turned.shearCentre!.y).toBeCloseTo(c * sy - s * sz, 0);
		expect(turned.shearCentre!.z).toBeCloseTo(s * sy + c * sz, 0);
	});

	it('is mirrored with the section', () => {
		const mirrored = moved((y, z) => [-y, z]);
		expectNear(mirrored.torsionConstant, still.torsionConstant);
		expectNear(mirrored.warpingConstant, still.warpingConstant!);
		expect(mirrored.shearCentre!.y).toBeCloseTo(-sy, 0);
	});

	it.each([1e-3, 1e3])('grows with the 4th and 6th power of the size, × %d', (scale) => {
		const scaled = moved((y, z) => [scale * y * 0.5, scale * z * 0.5]);
		expectNear(scaled.torsionConstant / (0.5 * scale) ** 4, still.torsionConstant);
		expectNear(scaled.warpingConstant! / (0.5 * scale) ** 6, still.warpingConstant!);
		expectNear(scaled.shearCentre!.z / (0.5 * scale), sz, 5e-3);
	});

	it('is the same every time', () => {
		expect(moved((y, z) => [y, z])).toEqual(still);
	});

	it('lies between its bounds', () => {
		const { torsionBelow, torsionAbove } = still.error;
		expect(torsionBelow).toBeLessThan(still.torsionConstant);
		expect(torsionAbove).toBeGreaterThan(still.torsionConstant);
		expect(torsionAbove / torsionBelow).toBeLessThan(1.005);
	});

	it('takes regions that touch along an edge as one', () => {
		const half = (z: number): Ring => [
			[0, z],
			[60, z],
			[60, z + 50],
			[0, z + 50]
		];
		const regions = [{ outer: half(0) }, { outer: half(50) }];
		const split = solved({ kind: 'outline', regions, grade });
		const whole = solved({ kind: 'flat', b: 60, h: 100, grade });
		expectNear(split.torsionConstant, whole.torsionConstant);
		expectNear(split.warpingConstant, whole.warpingConstant!, 5e-3);
	});
});

describe('what the solution says of pieces', () => {
	const square = (at: number): Ring => [
		[at, at],
		[at + 50, at],
		[at + 50, at + 50],
		[at, at + 50]
	];
	/** 0.140577 a⁴ (Timoshenko & Goodier, art. 109). */
	const one = 0.140577 * 50 ** 4;

	it('regions that touch at a point only are pieces apart', () => {
		const regions = [{ outer: square(0) }, { outer: square(50) }];
		const { torsionConstant, warpingConstant, shearCentre, notes } = solved({
			kind: 'outline',
			regions,
			grade
		});
		expectNear(torsionConstant, 2 * one);
		expect([warpingConstant, shearCentre]).toEqual([null, null]);
		expect(codes(notes)).toEqual(['torsion-separate-pieces']);
	});

	it('tied plates add up', () => {
		const bar = (name: string, y: number): Plate => ({
			...{ name, width: 50, thickness: 50, z: 0, angle: 0 },
			y
		});
		const section = prepared({
			...{ kind: 'plates', tied: true, grade },
			plates: [bar('a', 0), bar('b', 300)]
		});
		const { gross, torsion, notes } = withNumericalTorsion(section);
		expectNear(gross.torsionConstant, 2 * one);
		expect(gross.shearCentre).toBeNull();
		expect(torsion.handbook).toBeNull();
		expect(codes(notes)).toContain('torsion-separate-pieces');
		expect(codes(notes)).toContain('torsion-not-covered');
	});

	it('plates that touch without being joined are not solved', () => {
		const plate = (name: string, width: number, y: number, z: number, angle = 0): Plate => ({
			...{ name, width, thickness: 10, y, z, angle }
		});
		const section = prepared({
			kind: 'plates',
			grade,
			plates: [
				plate('bottom', 200, 0, 0),
				plate('left', 100, -80, 55, 90),
				plate('right', 100, 80, 55, 90),
				plate('top', 200, 0, 110)
			],
			joins: [
				{ a: 'bottom', b: 'left' },
				{ a: 'bottom', b: 'right' },
				{ a: 'left', b: 'top' }
			]
		});
		expect(codes(numericalTorsion(section).notes)).toEqual(['torsion-not-covered']);
		// the open profile by thin walls stays
		expect(withNumericalTorsion(section).torsion.numerical).toBeNull();
	});

	it('a cover plate face to face counts as one with its flange, and a note says so', () => {
		const plates = [
			{ name: 'flange', width: 200, thickness: 10, y: 0, z: 0, angle: 0 },
			{ name: 'cover', width: 200, thickness: 10, y: 0, z: 10, angle: 0 }
		];
		const lapped = solved({ kind: 'plates', plates, grade });
		expectNear(
			lapped.torsionConstant,
			solved({ kind: 'flat', b: 200, h: 20, grade }).torsionConstant
		);
		expect(codes(lapped.notes)).toEqual(['torsion-plates-lapped']);
	});

	it('parts of different stiffness are solved with one shear modulus, and a note says so', () => {
		const beside = square(0).map(([y, z]) => [y + 50, z] as const);
		const { notes } = solved({
			kind: 'outline',
			regions: [{ outer: square(0) }, { outer: beside, grade: { fy: 235, E: 70_000 } }],
			grade
		});
		expect(codes(notes)).toContain('torsion-one-modulus');
	});

	it('a rib of forty thin plates is solved on a mesh that stays small', () => {
		const ribs = Array.from({ length: 39 }, (_, i): Plate => ({
			...{ name: `rib${i}`, width: 300, thickness: 6, angle: 90 },
			...{ y: (i - 19) * 100, z: 155 }
		}));
		const deck: Plate = { name: 'deck', width: 4000, thickness: 10, y: 0, z: 0, angle: 0 };
		const plates = [deck, ...ribs];
		const { torsionConstant, nodes } = solved({ kind: 'plates', grade, plates });
		expectNear(torsionConstant, (4000 * 10 ** 3 + 39 * 300 * 6 ** 3) / 3, 2e-2);
		expect(nodes).toBeLessThan(12_000);
	});
});
