import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from './definition';
import { prepareSection } from './prepare';

function messages(definition: SectionDefinition): string[] {
	const result = prepareSection(definition);
	return result.ok ? [] : result.error.map(({ path, message }) => `${path}: ${message}`);
}

const welded = {
	kind: 'i',
	fabrication: 'welded',
	h: 1000,
	b: 600,
	tw: 6,
	tf: 8,
	grade: 'S355'
} as const;
const box = {
	kind: 'box',
	h: 800,
	b: 450,
	tw: 12,
	tfTop: 20,
	tfBottom: 25,
	webGap: 400,
	grade: 'S355'
} as const;
const tee = {
	kind: 'tee',
	fabrication: 'welded',
	h: 150,
	b: 150,
	tw: 8,
	tf: 12,
	grade: 'S355'
} as const;

/** A throat of the thicker joined plate at most (common practice, no source): leg √2 times that. */
describe('a fillet weld', () => {
	it('may not be thicker in its throat than the thicker plate that it joins: 8√2 = 11.3137 mm', () => {
		expect(messages({ ...welded, weldLeg: 400 })).toEqual([
			'weldLeg: Weld leg 400 mm must not be more than √2 times the thicker joined plate, 11.3137 mm.'
		]);
		expect(messages({ ...welded, weldLeg: 11.4 })).toHaveLength(1);
		expect(messages({ ...welded, weldLeg: 11.3 })).toEqual([]);
	});

	it('is held at each flange by the plates that meet there', () => {
		// Thin bottom flange on a thin web: 8√2, though the top flange is 40 mm.
		expect(messages({ ...welded, tf: 40, tfBottom: 8, weldLeg: 12 })).toEqual([
			'weldLeg: Weld leg 12 mm must not be more than √2 times the thicker joined plate, 11.3137 mm.'
		]);
	});

	it('is refused by the throat where the throat was given', () => {
		expect(messages({ ...welded, weldThroat: 9 })).toEqual([
			'weldThroat: Weld throat 9 mm (leg 12.7279 mm) must not be more than √2 times the thicker joined plate, 11.3137 mm.'
		]);
		expect(messages({ ...welded, weldThroat: 8 })).toEqual([]);
	});

	it('must find room on the flange and on the web', () => {
		expect(messages({ ...welded, b: 20, weldLeg: 8 })).toEqual([
			'weldLeg: Weld leg 8 mm must not be more than the flange outstand, 7 mm.'
		]);
		expect(messages({ ...welded, h: 30, weldLeg: 8 })).toEqual([
			'weldLeg: Weld leg 8 mm must not be more than half the clear web depth, 7 mm.'
		]);
	});

	it('is held alike in boxes and tees', () => {
		// Outstand (450 − 400 − 24)/2 = 13; 20√2 = 28.2843 at the thinner flange.
		expect(messages({ ...box, weldLeg: 13 })).toEqual([]);
		expect(messages({ ...box, weldLeg: 14 })).toEqual([
			'weldLeg: Weld leg 14 mm must not be more than the flange outstand, 13 mm.'
		]);
		expect(messages({ ...box, b: 600, weldLeg: 29 })).toEqual([
			'weldLeg: Weld leg 29 mm must not be more than √2 times the thicker joined plate, 28.2843 mm.'
		]);
		expect(messages({ ...tee, weldLeg: 17 })).toEqual([
			'weldLeg: Weld leg 17 mm must not be more than √2 times the thicker joined plate, 16.9706 mm.'
		]);
		expect(messages({ ...tee, b: 30, weldLeg: 12 })).toEqual([
			'weldLeg: Weld leg 12 mm must not be more than the flange outstand, 11 mm.'
		]);
	});

	it('changes nothing in a box whose flanges end flush with the webs', () => {
		expect(messages({ ...box, b: 424, weldLeg: 6 })).toEqual([]);
	});

	it('is not asked of a rolled section, which has none', () => {
		expect(messages({ ...welded, fabrication: 'rolled', weldLeg: 100 })).toEqual([]);
	});
});
