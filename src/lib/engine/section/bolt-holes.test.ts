import { describe, expect, it } from 'vitest';
import type { BoltHoles, SectionDefinition } from './definition';
import { prepareSection } from './prepare';

function messages(definition: SectionDefinition): string[] {
	const result = prepareSection(definition);
	return result.ok ? [] : result.error.map(({ path, message }) => `${path}: ${message}`);
}

const beam = {
	kind: 'i',
	h: 300,
	b: 150,
	tw: 7.1,
	tf: 10.7,
	r: 15,
	fabrication: 'rolled',
	grade: 'S355'
} as const;

const drilled = (...boltHoles: BoltHoles[]) => messages({ ...beam, boltHoles });

describe('bolt holes', () => {
	it('must leave some of the width of their part', () => {
		expect(drilled({ part: 'topFlange', diameter: 160, count: 2 })).toEqual([
			'boltHoles.0.diameter: Bolt holes in topFlange take 320 mm, and must leave some of its width 150 mm.'
		]);
		expect(drilled({ part: 'topFlange', diameter: 75, count: 2 })).toHaveLength(1);
		expect(drilled({ part: 'topFlange', diameter: 74, count: 2 })).toEqual([]);
	});

	it('are added up over the rows of one part, and no further', () => {
		const [top, bottom] = ['topFlange', 'bottomFlange'].map((part) => ({
			part,
			diameter: 40,
			count: 2
		})) as [BoltHoles, BoltHoles];
		expect(drilled(top, bottom)).toEqual([]);
		expect(drilled(top, bottom, top)).toEqual([
			'boltHoles.0.diameter: Bolt holes in topFlange take 160 mm, and must leave some of its width 150 mm.'
		]);
	});

	it('are held against the clear depth of a web, and the wall of a tube round its middle', () => {
		expect(drilled({ part: 'web', diameter: 100, count: 2 })).toEqual([]);
		expect(drilled({ part: 'web', diameter: 100, count: 3 })).toHaveLength(1);
		const tube = (count: number): SectionDefinition => ({
			kind: 'circular-hollow',
			d: 110,
			t: 10,
			grade: 'S355',
			boltHoles: [{ part: 'wall', diameter: 22, count }]
		});
		// π · 100 = 314 mm of wall.
		expect(messages(tube(14))).toEqual([]);
		expect(messages(tube(15))).toHaveLength(1);
	});

	it('are held against the width of a plate however it is turned', () => {
		const plate = { name: 'flap', width: 100, thickness: 10, y: 0, z: 0, angle: 45 };
		const plates = (diameter: number): SectionDefinition => ({
			kind: 'plates',
			plates: [plate],
			grade: 'S355',
			boltHoles: [{ part: 'flap', diameter, count: 1 }]
		});
		expect(messages(plates(99))).toEqual([]);
		expect(messages(plates(101))).toHaveLength(1);
	});
});
