import { describe, expect, it } from 'vitest';
import { prepareSection } from '../prepare';
import { platePresets } from './presets';
import { plateStretches } from './stretches';

/** Worked out by hand from the default sizes: area in mm², and type, c and t of each stretch. */
const expected: Record<string, { area: number; stretches: string[] }> = {
	// flanges 2·250·16, web 568·10, covers 2·200·12; outstand (250 − 10)/2
	'i-with-cover-plates': {
		area: 8000 + 5680 + 4800,
		stretches: [
			'topCover: internal 200/12',
			'topFlange.left: outstand 120/16',
			'topFlange.right: outstand 120/16',
			'web: internal 568/10',
			'bottomFlange.left: outstand 120/16',
			'bottomFlange.right: outstand 120/16',
			'bottomCover: internal 200/12'
		]
	},
	// clear between webs 776; ribs at thirds: 776/3 − 6 at the webs, 776/3 − 12 in the middle
	'stiffened-box': {
		area: 2 * 800 * 16 + 2 * 968 * 12 + 4 * 120 * 12,
		stretches: [
			'topFlange: internal 252.667/16',
			'topFlange.2: internal 246.667/16',
			'topFlange.3: internal 252.667/16',
			'leftWeb: internal 968/12',
			'rightWeb: internal 968/12',
			'bottomFlange: internal 252.667/16',
			'bottomFlange.2: internal 246.667/16',
			'bottomFlange.3: internal 252.667/16',
			'topStiffener1.bottom: outstand 120/12',
			'bottomStiffener1.top: outstand 120/12',
			'topStiffener2.bottom: outstand 120/12',
			'bottomStiffener2.top: outstand 120/12'
		]
	},
	// (300 − 15)/2
	cruciform: {
		area: 300 * 15 + 285 * 15,
		stretches: [
			'upright.bottom: outstand 142.5/15',
			'upright.top: outstand 142.5/15',
			'left.left: outstand 142.5/15',
			'right.right: outstand 142.5/15'
		]
	},
	// web 200 − 2·11, flange 75 − 8
	'back-to-back-channels': {
		area: 2 * (200 * 8 + 2 * 67 * 11),
		stretches: ['left', 'right'].flatMap((side) => [
			`${side}Web: internal 178/8`,
			`${side}TopFlange.${side}: outstand 67/11`,
			`${side}BottomFlange.${side}: outstand 67/11`
		])
	},
	'back-to-back-angles': {
		area: 2 * (100 * 10 + 65 * 10),
		stretches: ['left', 'right'].flatMap((side) => [
			`${side}Upright.top: outstand 90/10`,
			`${side}Level.${side}: outstand 65/10`
		])
	},
	'built-tee': {
		area: 200 * 16 + 234 * 12,
		stretches: [
			'flange.left: outstand 94/16',
			'flange.right: outstand 94/16',
			'web.bottom: outstand 234/12'
		]
	},
	// flange over a web part 14 thick: (300 − 14)/2; under one 10 thick: (400 − 10)/2; web 1200 − 50
	'girder-with-thickened-web': {
		area: 300 * 20 + 400 * 30 + 300 * 14 + 850 * 10,
		stretches: [
			'topFlange.left: outstand 143/20',
			'topFlange.right: outstand 143/20',
			'web: internal 1150/10',
			'bottomFlange.left: outstand 195/30',
			'bottomFlange.right: outstand 195/30'
		]
	},
	zed: {
		area: 200 * 8 + 2 * 72 * 10,
		stretches: [
			'topFlange.right: outstand 72/10',
			'web: internal 180/8',
			'bottomFlange.left: outstand 72/10'
		]
	}
};

describe.each(platePresets)('the preset $title', ({ id, fields, section }) => {
	const definition = section({}, 'S355');

	it('prepares at its defaults, with the area of its plates', () => {
		const prepared = prepareSection(definition);
		expect(prepared.ok && prepared.value.gross.area).toBeCloseTo(expected[id]!.area, 6);
		expect(prepared.ok && prepared.value.bounds.bottom).toBeCloseTo(0, 9);
		const { left, right } = prepared.ok ? prepared.value.bounds : { left: 1, right: 1 };
		expect(left + right).toBeCloseTo(0, 9);
	});

	it('has the stretches that its sizes give', () => {
		const rows = plateStretches(definition).stretches!.map(({ id, type, from, to, thickness }) => {
			const c = Math.hypot(to.y - from.y, to.z - from.z);
			return `${id}: ${type} ${Number(c.toFixed(3))}/${thickness}`;
		});
		expect(rows.sort()).toEqual([...expected[id]!.stretches].sort());
	});

	it('has defaults within the limits of its fields', () => {
		for (const field of fields) {
			expect(field.default).toBeGreaterThanOrEqual(field.least);
			expect(field.default).toBeLessThanOrEqual(field.most);
		}
	});
});

describe('presets', () => {
	it('take the sizes that are given and keep the others', () => {
		const tee = platePresets.find(({ id }) => id === 'built-tee')!;
		const { plates } = tee.section({ b: 300 }, 'S235');
		expect(plates.map(({ width }) => width)).toEqual([300, 234]);
	});

	it('of pairs without a gap touch and are not tied', () => {
		for (const id of ['back-to-back-channels', 'back-to-back-angles']) {
			const definition = platePresets.find((one) => one.id === id)!.section({ gap: 0 }, 'S355');
			expect(definition.tied).toBeUndefined();
			expect(prepareSection(definition).ok).toBe(true);
		}
	});
});
