import { describe, expect, it } from 'vitest';
import type { Plate, PlatesSection } from '../definition';
import { placedPlates } from '../plates/placing';
import { prepareSection } from '../prepare';
import { numericalTorsion } from './numerical';
import { platesTorsion } from './plates';

const plate = (
	name: string,
	width: number,
	thickness: number,
	y: number,
	z: number,
	angle = 0
): Plate => ({ name, width, thickness, y, z, angle });

const section = (...plates: Plate[]): PlatesSection => ({ kind: 'plates', grade: 235, plates });

const torsion = (definition: PlatesSection) =>
	platesTorsion(definition, placedPlates(definition.plates));

function expectNear(value: number | null, expected: number, share = 1e-9): void {
	expect(value).not.toBeNull();
	expect(Math.abs(value! - expected)).toBeLessThan(share * Math.abs(expected));
}

/** Warping of walls across their own thickness is small against that of the mid-lines: t²/h² or so. */
const ownWarping = 2e-3;

describe('open profiles of plates (Timoshenko & Gere, Theory of Elastic Stability, table A-1)', () => {
	const [h, b, tf, tw] = [400, 200, 4, 3];

	it('I: Iw = tf b³h²/24, J = Σst³/3 less 0.105t⁴ at each free end, shear centre in the middle', () => {
		const i = section(
			plate('top', b, tf, 7, h / 2),
			plate('web', h - tf, tw, 7, 0, 90),
			plate('bottom', b, tf, 7, -h / 2)
		);
		const { torsionConstant, warpingConstant, shearCentre } = torsion(i);
		const own = (2 * b * tf ** 3 + (h - tf) * tw ** 3) / 3;
		expectNear(torsionConstant, own - 4 * 0.105 * tf ** 4);
		expectNear(warpingConstant, (tf * b ** 3 * h ** 2) / 24, ownWarping);
		expect(shearCentre!.y).toBeCloseTo(7, 9);
		expect(shearCentre!.z).toBeCloseTo(0, 9);
	});

	it('channel: e = 3b²tf/(6b tf + h tw), Iw = tf b³h²/12 · (3b tf + 2h tw)/(6b tf + h tw)', () => {
		// flanges end on the face of the web, so that their mid-lines run on to the web's
		const out = b - tw / 2;
		const channel = section(
			plate('web', h, tw, 0, 0, 90),
			plate('top', out, tf, tw / 2 + out / 2, h / 2 - tf / 2),
			plate('bottom', out, tf, tw / 2 + out / 2, -h / 2 + tf / 2)
		);
		const { warpingConstant, shearCentre } = torsion(channel);
		const d = h - tf;
		const e = (3 * b * b * tf) / (6 * b * tf + d * tw);
		expectNear(-shearCentre!.y, e, 1e-9);
		const shape = (3 * b * tf + 2 * d * tw) / (6 * b * tf + d * tw);
		expectNear(warpingConstant, ((tf * b ** 3 * d ** 2) / 12) * shape, ownWarping);
	});

	it('Z: Iw = b³h²/12 · (2tf(b² + bh + h²) + 3tw bh)/(2b + h)², walls of one thickness', () => {
		const t = 2;
		const z = section(
			plate('web', h - t, t, 0, 0, 90),
			plate('top', b + t / 2, t, (b - t / 2) / 2, h / 2),
			plate('bottom', b + t / 2, t, -(b - t / 2) / 2, -h / 2)
		);
		const { warpingConstant, shearCentre } = torsion(z);
		const shape = (2 * t * (b * b + b * h + h * h) + 3 * t * b * h) / (2 * b + h) ** 2;
		expectNear(warpingConstant, ((b ** 3 * h ** 2) / 12) * shape, ownWarping);
		expect(Math.hypot(shearCentre!.y, shearCentre!.z)).toBeLessThan(1e-6);
	});

	it('tee and cross warp only across their thickness: Iw = (tf³b³/4 + tw³d³)/36 (Seaburg & Carter)', () => {
		const tee = section(plate('flange', b, tf, 0, 0), plate('web', h, tw, 0, -h / 2 - tf / 2, 90));
		const { warpingConstant, shearCentre } = torsion(tee);
		expectNear(warpingConstant, ((tf * b) ** 3 / 4 + (tw * (h + tf / 2)) ** 3) / 36, 1e-6);
		expect(Math.hypot(shearCentre!.y, shearCentre!.z)).toBeLessThan(1e-6);
	});

	it('mono-symmetric I: the shear centre divides the depth in the inverse ratio of the flanges’ second moments', () => {
		const i = section(
			plate('top', 300, tf, 0, h / 2),
			plate('web', h - tf, tw, 0, 0, 90),
			plate('bottom', 150, tf, 0, -h / 2)
		);
		// 300³ : 150³ = 8 : 1
		expectNear(torsion(i).shearCentre!.z + h / 2, (h * 8) / 9, 1e-3);
	});
});

describe('a corner of plates counts once in the mid-lines', () => {
	// flanges 0..b with the web between them: the flanges end flush with the web's outer face
	const channelOf = (t: number) =>
		section(
			plate('top', 100, t, 50, 100 - t / 2),
			plate('bottom', 100, t, 50, -100 + t / 2),
			plate('web', 200 - 2 * t, t, t / 2, 0, 90)
		);

	it.each([0.5, 2, 4, 8])(
		'channel 200×100×%d: e = 3b²/(6b + h), Iw = tb³h²/12 · (3b + 2h)/(6b + h) of the mid-lines',
		(t) => {
			const [b, h] = [100 - t / 2, 200 - t];
			const { warpingConstant, shearCentre } = torsion(channelOf(t));
			expectNear(t / 2 - shearCentre!.y, (3 * b * b) / (6 * b + h), 1e-9);
			const primary = ((t * b ** 3 * h ** 2) / 12) * ((3 * b + 2 * h) / (6 * b + h));
			expectNear(warpingConstant, primary, 3 * (t / b) ** 2);
		}
	);

	it.each([2, 4, 8])(
		'and comes within 1 %% of the solid walls, solved by elements: t = %d',
		(t) => {
			const prepared = prepareSection(channelOf(t));
			if (!prepared.ok) throw new Error('not prepared');
			const solved = numericalTorsion(prepared.value);
			if (!('torsionConstant' in solved)) throw new Error('not solved');
			const { warpingConstant, shearCentre } = torsion(channelOf(t));
			expectNear(warpingConstant, solved.warpingConstant!, 1e-2);
			expectNear(shearCentre!.y - t / 2, solved.shearCentre!.y - t / 2, 1e-2);
		}
	);

	it('angle of thin plates: the shear centre where the mid-lines meet', () => {
		const { shearCentre } = torsion(
			section(plate('flat', 100, 2, 50, 1), plate('upright', 98, 2, 1, 51, 90))
		);
		expect(shearCentre!.y).toBeCloseTo(1, 9);
		expect(shearCentre!.z).toBeCloseTo(1, 9);
	});

	it('walls too thick for mid-lines, and stubs shorter than the wall is thick, leave warping to the elements', () => {
		const thick = torsion(channelOf(12));
		expect(thick.torsionConstant).not.toBeNull();
		expect(thick).toMatchObject({ warpingConstant: null, shearCentre: null });
		const stub = section(
			plate('top', 103, 4, 48.5, 98),
			plate('bottom', 100, 4, 50, -98),
			plate('web', 192, 4, 2, 0, 90)
		);
		expect(torsion(stub)).toMatchObject({ warpingConstant: null, shearCentre: null });
	});
});

describe('closed profiles of plates', () => {
	const box = (b: number, h: number, tf: number, tw: number) =>
		section(
			plate('top', b + tw, tf, 0, h / 2),
			plate('bottom', b + tw, tf, 0, -h / 2),
			plate('left', h - tf, tw, -b / 2, 0, 90),
			plate('right', h - tf, tw, b / 2, 0, 90)
		);

	it('box: J = 4A²/∮ds/t of the mid-lines (Bredt 1896) and the walls’ own Σbt³/3', () => {
		const [b, h, tf, tw] = [300, 500, 8, 6];
		const own = (2 * (b + tw) * tf ** 3 + 2 * (h - tf) * tw ** 3) / 3;
		const bredt = (4 * (b * h) ** 2) / ((2 * b) / tf + (2 * h) / tw);
		expectNear(torsion(box(b, h, tf, tw)).torsionConstant, bredt + own, 1e-5);
	});

	it('box: Iw from corners warping by b/2 · (h/2 − ψ/tf), ψ = 2A/∮ds/t (Vlasov, closed profiles)', () => {
		const [b, h, tf, tw] = [300, 500, 4, 2];
		const flow = (2 * b * h) / ((2 * b) / tf + (2 * h) / tw);
		const corner = (b / 2) * (h / 2 - flow / tf);
		const expected = (corner ** 2 * (2 * b * tf + 2 * h * tw)) / 3;
		expectNear(torsion(box(b, h, tf, tw)).warpingConstant, expected, ownWarping);
	});

	it('two cells: J = 4 Aᵀ M⁻¹ A of the flow matrix (Megson, Aircraft Structures)', () => {
		const [a, b, h, t] = [300, 150, 200, 2];
		const web = (name: string, y: number) => plate(name, h - t, t, y, h / 2, 90);
		const two = section(
			plate('bottom', a + b + t, t, (a + b) / 2, 0),
			plate('top', a + b + t, t, (a + b) / 2, h),
			web('left', 0),
			web('middle', a),
			web('right', a + b)
		);
		const [A1, A2] = [a * h, b * h];
		const [m11, m12, m22] = [(2 * (a + h)) / t, -h / t, (2 * (b + h)) / t];
		const cells =
			(4 * (m22 * A1 * A1 - 2 * m12 * A1 * A2 + m11 * A2 * A2)) / (m11 * m22 - m12 * m12);
		const own = two.plates.reduce((sum, one) => sum + (one.width * one.thickness ** 3) / 3, 0);
		expectNear(torsion(two).torsionConstant, cells + own, 1e-5);
	});

	it('a wall split in two changes nothing', () => {
		const whole = box(300, 500, 8, 6);
		const [top, ...others] = whole.plates as [Plate, ...Plate[]];
		const halves = [-1, 1].map((side) =>
			plate(`top${side}`, top.width / 2, top.thickness, (side * top.width) / 4, top.z)
		);
		const [one, two] = [torsion(whole), torsion(section(...halves, ...others))];
		expectNear(two.torsionConstant, one.torsionConstant!);
		expectNear(two.warpingConstant, one.warpingConstant!);
		expect(two.shearCentre!.z).toBeCloseTo(one.shearCentre!.z, 6);
	});
});

describe('where thin walls do not hold nothing is given', () => {
	const flat = plate('a', 100, 10, 0, 0);
	const none = { torsionConstant: null, warpingConstant: null, shearCentre: null };

	it('a stocky plate', () => {
		const stocky = section(flat, plate('b', 40, 10, 0, -25, 90));
		expect(torsion(stocky)).toEqual(none);
	});

	it('a cover plate face to face', () => {
		expect(torsion(section(flat, plate('cover', 80, 10, 0, 10)))).toEqual(none);
	});

	it('pieces apart: only the sum of their torsion constants', () => {
		const apart: PlatesSection = { ...section(flat, plate('b', 100, 10, 0, 50)), tied: true };
		expect(torsion(apart)).toEqual({
			...none,
			torsionConstant: 2 * ((100 * 10 ** 3) / 3 - 0.21 * 10 ** 4)
		});
	});

	it('a seam that is not joined keeps a box open', () => {
		const joins = [
			{ a: 'bottom', b: 'left' },
			{ a: 'bottom', b: 'right' },
			{ a: 'top', b: 'left' }
		];
		const plates = [
			plate('bottom', 306, 8, 0, 0),
			plate('top', 306, 8, 0, 500),
			plate('left', 492, 6, -150, 250, 90),
			plate('right', 492, 6, 150, 250, 90)
		];
		const open = torsion({ ...section(...plates), joins });
		// free: four ends of the flanges, one of the right web
		const lost = 0.105 * (4 * 8 ** 4 + 6 ** 4);
		expectNear(open.torsionConstant, (2 * 306 * 8 ** 3 + 2 * 492 * 6 ** 3) / 3 - lost);
	});
});
