import { describe, expect, it } from 'vitest';
import type { Plate, PlateJoin, PlatesSection } from '../definition';
import { prepareSection } from '../prepare';
import { plateStretches, type PlateStretch } from './stretches';

/** Expected widths are worked out by hand from the sizes beside them. */

const plate = (
	name: string,
	width: number,
	thickness: number,
	y: number,
	z: number,
	angle = 0
): Plate => ({ name, width, thickness, y, z, angle });

const section = (plates: Plate[], joins?: PlateJoin[], tied?: true): PlatesSection => ({
	kind: 'plates',
	grade: 355,
	plates,
	...(joins ? { joins } : {}),
	...(tied ? { tied } : {})
});

const width = ({ from, to }: PlateStretch): number => Math.hypot(to.y - from.y, to.z - from.z);

/** id, type and clear width of every stretch. */
function rows(definition: PlatesSection) {
	expect(prepareSection(definition).ok).toBe(true);
	const { stretches } = plateStretches(definition);
	return stretches?.map((one) => [one.id, one.type, Number(width(one).toFixed(6))]) ?? null;
}

const codes = (definition: PlatesSection) =>
	plateStretches(definition).notes.map(({ code }) => code);

const girder = [
	plate('top', 300, 20, 0, 410),
	plate('web', 800, 10, 0, 0, 90),
	plate('bottom', 300, 20, 0, -410)
];

const box = [
	plate('top', 300, 20, 0, 210),
	plate('left', 400, 10, -145, 0, 90),
	plate('right', 400, 10, 145, 0, 90),
	plate('bottom', 300, 20, 0, -210)
];

describe('stretches of a girder', () => {
	it('are four outstands and one web', () => {
		expect(rows(section(girder))).toEqual([
			['top.left', 'outstand', 145],
			['top.right', 'outstand', 145],
			['web', 'internal', 800],
			['bottom.left', 'outstand', 145],
			['bottom.right', 'outstand', 145]
		]);
		expect(codes(section(girder))).toEqual([]);
	});

	it('run from root to tip, and from low to high, and name what holds them', () => {
		const [left, , web] = plateStretches(section(girder)).stretches!;
		expect(left).toMatchObject({
			thickness: 20,
			from: { y: -5, z: 410 },
			to: { y: -150, z: 410 },
			heldBy: ['web']
		});
		expect(web).toMatchObject({
			from: { y: 0, z: -400 },
			to: { y: 0, z: 400 },
			heldBy: ['bottom', 'top']
		});
	});

	it('begin at the toes of the welds that joins give', () => {
		const joins = [
			{ a: 'top', b: 'web', weldLeg: 8 },
			{ a: 'web', b: 'bottom', weldLeg: 6 }
		];
		expect(rows(section(girder, joins))).toEqual([
			['top.left', 'outstand', 137],
			['top.right', 'outstand', 137],
			['web', 'internal', 786],
			['bottom.left', 'outstand', 139],
			['bottom.right', 'outstand', 139]
		]);
	});
});

describe('stretches of a box', () => {
	it('are internal, from face to face', () => {
		expect(rows(section(box))).toEqual([
			['top', 'internal', 280],
			['left', 'internal', 400],
			['right', 'internal', 400],
			['bottom', 'internal', 280]
		]);
	});

	it('are not shortened by fillets within the cell, but outside it', () => {
		const wide = box.map((one) => (one.angle === 0 ? { ...one, width: 400 } : one));
		const joins = ['top', 'bottom'].flatMap((a) =>
			['left', 'right'].map((b) => ({ a, b, weldLeg: 6 }))
		);
		expect(rows(section(wide, joins))!.slice(0, 4)).toEqual([
			['top.left', 'outstand', 200 - 150 - 6],
			['top', 'internal', 280],
			['top.right', 'outstand', 200 - 150 - 6],
			['left', 'internal', 400]
		]);
	});

	it('are those of its panels where stiffeners stand, which are named', () => {
		// 10·(120³ − 10³)/3 = 5.8e6 mm⁴ about the mid-plane of the flange ≥ 3.66·20³·155 = 4.5e6
		const stiffened = section([...box, plate('rib', 110, 10, 20, 145, 90)]);
		const { stretches } = plateStretches(stiffened);
		expect(rows(stiffened)!.slice(0, 2)).toEqual([
			['top', 'internal', 155],
			['top.2', 'internal', 115]
		]);
		expect(stretches![0]!.stiffenedBy).toEqual(['rib']);
		expect(rows(stiffened)!.at(-1)).toEqual(['rib.bottom', 'outstand', 110]);
		expect(codes(stiffened)).toEqual(['stiffener-not-checked']);
	});

	it('pass over a stiffener that is too weak to hold its panel', () => {
		// 10·(35³ − 10³)/3 = 1.4e5 mm⁴ < 3.66·20³·155 = 4.5e6
		const stiffened = section([...box, plate('rib', 25, 10, 20, 187.5, 90)]);
		expect(rows(stiffened)![0]).toEqual(['top', 'internal', 280]);
		expect(codes(stiffened)).toEqual(['stiffener-too-weak']);
	});
});

describe('stretches of open shapes', () => {
	it('of an angle are its two legs', () => {
		const angle = [plate('upright', 90, 10, 5, 55, 90), plate('foot', 100, 10, 50, 5)];
		expect(rows(section(angle))).toEqual([
			['upright.top', 'outstand', 90],
			['foot.right', 'outstand', 90]
		]);
	});

	it('of a channel are a web between two flanges', () => {
		const channel = [
			plate('web', 180, 8, 4, 0, 90),
			plate('top', 75, 10, 37.5, 95),
			plate('bottom', 75, 10, 37.5, -95)
		];
		expect(rows(section(channel))).toEqual([
			['web', 'internal', 180],
			['top.right', 'outstand', 67],
			['bottom.right', 'outstand', 67]
		]);
	});

	it('of a cruciform are four outstands', () => {
		const cross = [
			plate('upright', 210, 10, 0, 0, 90),
			plate('left', 100, 10, -55, 0),
			plate('right', 100, 10, 55, 0)
		];
		expect(rows(section(cross))).toEqual([
			['upright.bottom', 'outstand', 100],
			['upright.top', 'outstand', 100],
			['left.left', 'outstand', 100],
			['right.right', 'outstand', 100]
		]);
	});

	it('of a lipped flange end at the lip when it is stiff, and at the tip when it is not', () => {
		const lipped = (lip: number) =>
			section([
				plate('flange', 200, 10, 100, 5),
				plate('web', 200, 10, 5, 110, 90),
				plate('lip', lip, 10, 195, 10 + lip / 2, 90)
			]);
		// about the mid-plane 10·((lip + 5)³ − 5³)/3 against 1.83·10³·180 = 3.3e5: 41.2 mm is just enough
		expect(rows(lipped(42))!.slice(0, 1)).toEqual([['flange', 'internal', 180]]);
		expect(rows(lipped(41))!.slice(0, 1)).toEqual([['flange.right', 'outstand', 190]]);
	});
});

describe('stretches of cover plates', () => {
	const cover = (by: number, y = 0) => plate('cover', by, 15, y, 427.5);

	it('are internal between the weld lines, and leave the flange as it is', () => {
		const covered = section([...girder, cover(250)]);
		expect(rows(covered)).toEqual([
			['top.left', 'outstand', 145],
			['top.right', 'outstand', 145],
			['web', 'internal', 800],
			['bottom.left', 'outstand', 145],
			['bottom.right', 'outstand', 145],
			['cover', 'internal', 250]
		]);
		expect(codes(covered)).toEqual(['lap-welds-assumed']);
	});

	it('stand out beyond the flange below from the toe of its weld', () => {
		const joins = [
			{ a: 'top', b: 'web' },
			{ a: 'bottom', b: 'web' },
			{ a: 'top', b: 'cover', weldLeg: 7 }
		];
		const covered = section([...girder, cover(360)], joins);
		expect(rows(covered)!.slice(-3)).toEqual([
			['cover.left', 'outstand', 23],
			['cover', 'internal', 300],
			['cover.right', 'outstand', 23]
		]);
		expect(codes(covered)).toEqual([]);
	});

	it('stand out on one side where they lap partly', () => {
		expect(rows(section([...girder, cover(250, 50)]))!.slice(-2)).toEqual([
			['cover', 'internal', 225],
			['cover.right', 'outstand', 25]
		]);
	});

	it('follow one upon another', () => {
		const stacked = section([...girder, cover(250), plate('second', 200, 15, 0, 442.5)]);
		expect(rows(stacked)!.at(-1)).toEqual(['second', 'internal', 200]);
	});

	it('that touch without a weld leave the section without stretches', () => {
		const joins = [
			{ a: 'top', b: 'web' },
			{ a: 'bottom', b: 'web' }
		];
		const loose = section([...girder, cover(250)], joins, true);
		expect(rows(loose)).toBeNull();
		expect(codes(loose)).toEqual(['stretch-not-clear', 'stretch-not-clear']);
	});

	it('over a flange spliced under them have no weld line at the splice', () => {
		const [, web, bottom] = girder as [Plate, Plate, Plate];
		const spliced = section([
			plate('topLeft', 150, 20, -75, 410),
			plate('topRight', 150, 20, 75, 410),
			web,
			bottom,
			cover(250)
		]);
		expect(rows(spliced)!.at(-1)).toEqual(['cover', 'internal', 250]);
		expect(rows(spliced)![0]).toEqual(['topLeft.left', 'outstand', 145]);
	});
});

describe('stretches of plates that follow each other', () => {
	it('are one wall, at the thickness of the thinner', () => {
		const [top, , bottom] = girder as [Plate, Plate, Plate];
		const thickened = section([
			top,
			plate('upper', 300, 14, 0, 250, 90),
			plate('lower', 500, 10, 0, -150, 90),
			bottom
		]);
		expect(rows(thickened)![2]).toEqual(['lower', 'internal', 800]);
		const web = plateStretches(thickened).stretches![2]!;
		expect([web.thickness, web.plates, web.heldBy]).toEqual([
			10,
			['lower', 'upper'],
			['bottom', 'top']
		]);
		expect(codes(thickened)).toEqual(['thinner-part-taken']);
	});

	it('do not change when a plate is cut in two along its length', () => {
		const [top, web, bottom] = girder as [Plate, Plate, Plate];
		const cut = section([
			plate('a', 90, 20, -105, 410),
			plate('b', 210, 20, 45, 410),
			{ ...web, name: 'w1', width: 300, z: -250 },
			{ ...web, name: 'w2', width: 500, z: 150 },
			bottom
		]);
		expect(rows(cut)!.map(([, type, c]) => [type, c])).toEqual(
			rows(section([top, web, bottom]))!.map(([, type, c]) => [type, c])
		);
	});
});

describe('stretches that are not clear', () => {
	it('of one plate alone are none', () => {
		expect(rows(section([plate('a', 200, 10, 0, 0)]))).toBeNull();
		expect(codes(section([plate('a', 200, 10, 0, 0)]))).toEqual(['stretch-not-clear']);
	});

	it('of two plates lying on each other are none', () => {
		expect(rows(section([plate('a', 200, 10, 0, 0), plate('b', 200, 10, 0, 10)]))).toBeNull();
	});

	it('where a corner stands on a face need a join that says so', () => {
		const leaning = [
			plate('base', 400, 10, 0, 0),
			plate('leaning', 100, 10, 0, (100 + 10) / 2 / Math.SQRT2 + 5, 45)
		];
		expect(rows(section(leaning))).toBeNull();
		expect(codes(section(leaning))).toContain('stretch-not-clear');
		// the corner stands (50 − 5)/√2 to the left of the middle
		const foot = 45 / Math.SQRT2;
		const welded = section(leaning, [{ a: 'base', b: 'leaning', weldLeg: 0 }]);
		expect(rows(welded)).toEqual([
			['base.left', 'outstand', Number((200 - foot).toFixed(6))],
			['base.right', 'outstand', Number((200 + foot).toFixed(6))],
			['leaning.right', 'outstand', 100]
		]);
	});

	it('of webs back to back are measured as if alone', () => {
		const channel = (name: string, side: number) => [
			plate(`${name}Web`, 180, 8, 4 * side, 0, 90),
			plate(`${name}Top`, 75, 10, 37.5 * side, 95),
			plate(`${name}Bottom`, 75, 10, 37.5 * side, -95)
		];
		const pair = section([...channel('left', -1), ...channel('right', 1)]);
		expect(rows(pair)![0]).toEqual(['leftWeb', 'internal', 180]);
		expect(codes(pair)).toContain('lap-not-counted');
	});
});
