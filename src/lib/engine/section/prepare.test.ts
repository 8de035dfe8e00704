import { describe, expect, it } from 'vitest';
import { regionMoments } from '../geometry/moments';
import type { SectionDefinition } from './definition';
import { prepareSection } from './prepare';
import type { PreparedSection } from './prepared';

const rolledI: SectionDefinition = {
	kind: 'i',
	h: 300,
	b: 150,
	tw: 7.1,
	tf: 10.7,
	r: 15,
	fabrication: 'rolled',
	grade: 'S355'
};

const definitions: SectionDefinition[] = [
	rolledI,
	{ ...rolledI, r: 0 },
	{ ...rolledI, kind: 'i', bBottom: 220, tfBottom: 16, fabrication: 'welded', weldLeg: 8 },
	{ kind: 'tee', h: 150, b: 150, tw: 7.1, tf: 10.7, r: 15, fabrication: 'rolled', grade: 'S275' },
	{
		kind: 'channel',
		h: 200,
		b: 75,
		tw: 8.5,
		tf: 11.5,
		r: 11.5,
		rToe: 6,
		flangeSlopePercent: 8,
		grade: 'S235'
	},
	{ kind: 'channel', h: 200, b: 75, tw: 8.5, tf: 11.5, grade: 'S235' },
	{ kind: 'angle', h: 100, b: 75, t: 10, r: 10, rToe: 5, grade: 'S235' },
	{ kind: 'angle', h: 100, b: 75, t: 10, grade: 'S235' },
	{
		kind: 'rectangular-hollow',
		h: 200,
		b: 100,
		t: 10,
		ro: 15,
		ri: 10,
		fabrication: 'hot-finished',
		grade: 'S355'
	},
	{
		kind: 'rectangular-hollow',
		h: 200,
		b: 100,
		t: 10,
		ro: 0,
		fabrication: 'cold-formed',
		grade: 'S355'
	},
	{ kind: 'circular-hollow', d: 219.1, t: 10, grade: 'S355' },
	{
		kind: 'box',
		h: 800,
		b: 500,
		bBottom: 460,
		tw: 12,
		tfTop: 20,
		tfBottom: 25,
		webGap: 400,
		grade: 'S355'
	},
	{ kind: 'flat', b: 20, h: 100, grade: 'S235' },
	{ kind: 'round', d: 60, grade: 'S235' }
];

function prepared(definition: SectionDefinition): PreparedSection {
	const result = prepareSection(definition);
	if (!result.ok) throw new Error(result.error.map(({ message }) => message).join(' '));
	return result.value;
}

describe('a prepared section', () => {
	it.each(definitions.map((definition) => [definition.kind, definition] as const))(
		'has the same moments summed over its parts as within its contours (%s)',
		(_, definition) => {
			const { parts, contours } = prepared(definition);
			const whole = regionMoments({ loops: contours });
			const pieces = parts.map(({ region }) => regionMoments(region));
			for (const key of ['area', 'firstY', 'firstZ', 'secondY', 'secondZ', 'product'] as const) {
				const sum = pieces.reduce((total, piece) => total + piece[key], 0);
				expect(Math.abs(sum / whole[key] - 1)).toBeLessThan(1e-12);
			}
		}
	);

	it.each(definitions.map((definition) => [definition.kind, definition] as const))(
		'starts at the lower left corner of its bounding box (%s)',
		(_, definition) => {
			const { bounds, gross } = prepared(definition);
			expect(bounds.left).toBeCloseTo(0, 12);
			expect(bounds.bottom).toBeCloseTo(0, 12);
			expect(bounds.right).toBeCloseTo(gross.width, 10);
			expect(bounds.top).toBeCloseTo(gross.height, 10);
		}
	);

	it('adds (1 − π/4) r² of area for each root radius of an I', () => {
		const [round, sharp] = [prepared(rolledI), prepared({ ...rolledI, r: 0 })];
		const fillets = 4 * (1 - Math.PI / 4) * 15 ** 2;
		expect(round.gross.area - sharp.gross.area).toBeCloseTo(fillets, 9);
	});

	it('takes the strength of the thickest part throughout a rolled shape', () => {
		const thick: SectionDefinition = { ...rolledI, tf: 20 };
		expect(prepared(thick).parts.map(({ material }) => material.fy)).toEqual([345, 345, 345]);
		const welded = prepared({ ...rolledI, kind: 'i', tf: 20, fabrication: 'welded' });
		expect(welded.parts.map(({ material }) => material.fy)).toEqual([345, 355, 345]);
	});

	it('lets a part with its own grade go by its own thickness', () => {
		const hybrid = prepared({ ...rolledI, tf: 20, partGrades: { web: 'S235' } });
		expect(hybrid.parts.map(({ material }) => material.fy)).toEqual([345, 235, 345]);
	});

	it('paints the outside of a tube only', () => {
		const tube = prepared({ kind: 'circular-hollow', d: 100, t: 10, grade: 235 });
		expect(tube.gross.perimeter).toBeCloseTo(100 * Math.PI, 10);
	});

	it('gives no warping constant for a closed box and says why', () => {
		const tube = prepared(definitions[8]!);
		expect(tube.gross.warpingConstant).toBeNull();
		expect(tube.notes.map(({ code }) => code)).toContain('torsion-not-covered');
	});

	it('takes the nominal corner radii of the product standard when a tube gives none', () => {
		const given = prepared(definitions[8]!);
		const assumed = prepared({
			kind: 'rectangular-hollow',
			h: 200,
			b: 100,
			t: 10,
			fabrication: 'hot-finished',
			grade: 'S355'
		});
		expect(assumed.gross.area).toBe(given.gross.area);
		expect(assumed.notes.map(({ code }) => code)).toContain('corner-radii-assumed');
	});

	it('keeps bolt holes and says that they are not deducted', () => {
		const holed = prepared({ ...rolledI, boltHoles: [{ part: 'web', diameter: 22, count: 2 }] });
		expect(holed.notes.map(({ code }) => code)).toContain('bolt-holes-not-deducted');
	});
});
