import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../section/definition';
import type { Demand } from '../rules/result';
import { unlocked, type UnlockRequest } from './unlock';

/** Welded girder with class 3 flanges: c/t 9.25 over the class 2 limit 8.25 (S355 at 20 mm: fy 345). */
const girder: SectionDefinition = {
	kind: 'i',
	fabrication: 'welded',
	h: 940,
	b: 400,
	tw: 14,
	tf: 20,
	weldLeg: 8,
	grade: 'S355'
};
const stock = {
	thicknesses: [8, 10, 12, 14, 16, 20, 25, 30, 40],
	widthStep: 50,
	depthStep: 50,
	stiffenerStep: 250
};

const asked = (definition: SectionDefinition, demands: Demand[] = []): UnlockRequest => ({
	girder: { definition, stiffeners: null },
	stock,
	code: {},
	demands,
	strengthBasis: 'product-standard'
});

const found = (definition: SectionDefinition, demands?: Demand[]) => {
	const result = unlocked(asked(definition, demands));
	if (!result) throw new Error('The section of this test cannot be built.');
	return result;
};

const sized = (options: ReturnType<typeof found>['options'], field: string) =>
	options.find(({ changes }) => changes.length === 1 && changes[0]?.field === field);

describe('unlocking a class 3 girder', () => {
	const { goal, options } = found(girder);

	it('asks for a better class', () => expect(goal).toBe('class'));

	it('offers the narrower flange with less steel', () => {
		const option = sized(options, 'b');
		expect(option?.changes[0]).toMatchObject({ part: 'flanges', from: 400, to: 350 });
		// 2 × 50 × 20 mm² of steel less at 7850 kg/m³
		expect(option?.addedMass).toBeCloseTo(-15.7, 6);
		expect(option?.class).toBe(2);
		// fy 345 on the flanges, 355 on the web: 345·350·20·920 + 355·14·900²/4, by hand
		expect(option?.MyRd).toBeCloseTo(3228.3, 0);
	});

	it('offers the next flange thickness of the stock, the web left as it is', () => {
		const option = sized(options, 'tf');
		expect(option?.changes[0]).toMatchObject({ part: 'flanges', from: 20, to: 25 });
		expect(option?.girder.definition).toMatchObject({ h: 950, tf: 25 });
		expect(option?.addedMass).toBeCloseTo(31.4, 6);
		// 345·400·25·925 + 355·14·900²/4, by hand
		expect(option?.MyRd).toBeCloseTo(4197.7, 0);
	});

	it('puts the least added steel first', () => {
		const added = options.map(({ addedMass }) => addedMass);
		expect(added).toEqual([...added].sort((a, b) => a - b));
	});

	it('never touches a grade or a weld', () => {
		for (const { girder: proposed } of options)
			expect(proposed.definition).toMatchObject({ grade: 'S355', weldLeg: 8 });
	});

	it('counts more after each than before', () => {
		for (const option of options) expect(option.countable).toBeGreaterThan(3110);
	});
});

describe('unlocking under demands', () => {
	it('makes an unmet demand met by the lightest change', () => {
		const { goal, options } = found(girder, [{ name: 'A', My: 3300 }]);
		expect(goal).toBe('demand');
		expect(options.length).toBeGreaterThan(0);
		for (const { utilisation } of options) expect(utilisation).toBeLessThanOrEqual(1);
	});

	it('never makes a demand fail that was met', () => {
		const { options } = found(girder, [{ name: 'A', My: 3100 }]);
		for (const { utilisation } of options) expect(utilisation).toBeLessThanOrEqual(1);
	});

	it('takes two changes where no single one is enough', () => {
		const { options } = found(girder, [{ name: 'A', My: 9500 }]);
		for (const { changes, utilisation } of options) {
			expect(changes).toHaveLength(2);
			expect(utilisation).toBeLessThanOrEqual(1);
		}
	});
});

describe('sections with nothing to unlock', () => {
	it('a class 1 girder says so', () => {
		const { goal, options, notes } = found({ ...girder, tf: 40, h: 980, tw: 20 });
		expect([goal, options]).toEqual([null, []]);
		expect(notes[0]?.code).toBe('nothing-locked');
	});

	it('a rolled shape comes as it is', () => {
		const rolled: SectionDefinition = {
			kind: 'i',
			fabrication: 'rolled',
			h: 600,
			b: 300,
			tw: 8,
			tf: 12,
			r: 0,
			grade: 460
		};
		expect(found(rolled).notes[0]?.code).toBe('comes-as-it-is');
	});
});

describe('unlocking free plates', () => {
	const plates: SectionDefinition = {
		kind: 'plates',
		grade: 'S355',
		plates: [
			{ name: 'top', width: 400, thickness: 20, y: 200, z: 930, angle: 0 },
			{ name: 'web', width: 900, thickness: 16, y: 200, z: 470, angle: 90 },
			{ name: 'bottom', width: 400, thickness: 20, y: 200, z: 10, angle: 0 }
		],
		joins: [
			{ a: 'top', b: 'web', weldLeg: 8 },
			{ a: 'bottom', b: 'web', weldLeg: 8 }
		]
	};

	it('never thickens a plate into what stands on it', () => {
		for (const { changes } of found(plates).options)
			expect(changes.some(({ part, field }) => field === 'thickness' && part !== 'web')).toBe(
				false
			);
	});
});

describe('a search in fine steps', () => {
	it('proposes nothing that weighs more than twice the girder', () => {
		const fine = { ...stock, thicknesses: [20, 25, 30, 40, 60, 80], widthStep: 10 };
		const result = unlocked({ ...asked(girder), stock: fine });
		const before = result?.before.gross.mass ?? 0;
		expect(result?.options.length).toBeGreaterThan(1);
		for (const { mass } of result?.options ?? []) expect(mass).toBeLessThanOrEqual(2 * before);
	});
});
