import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../../section/definition';
import { prepareSection } from '../../section/prepare';
import { shearAreasOf } from './shear-area';
import { shearResistances } from './shear-resistance';
import { testModel } from './test-model';

function areas(definition: SectionDefinition, eta = 1.2) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	return shearAreasOf(section.value, eta);
}

const grade = 355;
const rolled = {
	kind: 'i',
	fabrication: 'rolled',
	h: 300,
	b: 150,
	tw: 7.1,
	tf: 10.7,
	grade
} as const;

describe('shear areas, EN 1993-1-1:2005 6.2.6(3)', () => {
	it('rolled I: never less than η hw tw, and η counts there only', () => {
		// r = 0: A − 2btf + tw tf = 7.1·278.6 + 7.1·10.7 = 2054.03 against η·1978.06
		expect(areas(rolled, 1.2).z!.area).toBeCloseTo(1.2 * 7.1 * 278.6, 8);
		expect(areas(rolled, 1).z!.area).toBeCloseTo(7.1 * 289.3, 8);
		const channel = { kind: 'channel', h: 300, b: 100, tw: 9, tf: 16.5, r: 15, grade } as const;
		expect(areas(channel, 1.2).z!.area).toBe(areas(channel, 1).z!.area);
	});

	it('a rolled channel takes (tw + r), an I (tw + 2r)', () => {
		// fillets: (1 − π/4)r² each, two of the channel, four of the I
		const fillet = (1 - Math.PI / 4) * 15 * 15;
		const i = areas({ ...rolled, r: 15 }, 1).z!.area;
		expect(i).toBeCloseTo(7.1 * 278.6 + 4 * fillet + 37.1 * 10.7, 6);
		const channel = areas({ kind: 'channel', h: 300, b: 100, tw: 9, tf: 16.5, r: 15, grade });
		expect(channel.z!.area).toBeCloseTo(9 * 267 + 2 * fillet + 24 * 16.5, 6);
		expect(channel.y!.area).toBeCloseTo(2 * 100 * 16.5, 8);
	});

	it('tees: A − btf + (tw + 2r)tf/2 rolled, tw(h − tf/2) welded', () => {
		const tee = { kind: 'tee', h: 150, b: 150, tw: 7, tf: 11, grade } as const;
		const fillet = (1 - Math.PI / 4) * 15 * 15;
		const { z } = areas({ ...tee, fabrication: 'rolled', r: 15 });
		expect(z!.area).toBeCloseTo(7 * 139 + 2 * fillet + (37 * 11) / 2, 6);
		expect(areas({ ...tee, fabrication: 'welded' }).z!.area).toBeCloseTo(7 * 144.5, 9);
	});

	it('welded I and box: η Σ hw tw along the webs, the flanges alone across', () => {
		const i = areas({ kind: 'i', fabrication: 'welded', h: 540, b: 200, tw: 10, tf: 20, grade });
		expect(i.z!.area).toBeCloseTo(1.2 * 500 * 10, 9);
		expect(i.y!.area).toBeCloseTo(2 * 200 * 20, 9);
		const box = areas({
			kind: 'box',
			h: 540,
			b: 400,
			tw: 10,
			tfTop: 20,
			tfBottom: 20,
			webGap: 340,
			grade
		});
		expect(box.z!.area).toBeCloseTo(1.2 * 2 * 500 * 10, 9);
		expect(box.y!.area).toBeCloseTo(2 * 400 * 20, 9);
	});

	it('tubes: A h/(b + h) and 2A/π', () => {
		const tube = { kind: 'circular-hollow', d: 200, t: 10, grade } as const;
		expect(areas(tube).z!.area).toBeCloseTo(2 * 190 * 10, 8);
	});

	it('bars by their whole area, angles by one leg, free plates by those along the force', () => {
		expect(areas({ kind: 'flat', b: 20, h: 100, grade }).z!.area).toBe(2000);
		expect(areas({ kind: 'round', d: 40, grade }).y!.area).toBeCloseTo(400 * Math.PI, 8);
		const angle = areas({ kind: 'angle', h: 100, b: 75, t: 10, grade });
		expect(angle.z!.area).toBeCloseTo(950, 9);
		expect(angle.y!.area).toBeCloseTo(700, 9);
		const plates = (turn: number): SectionDefinition => ({
			kind: 'plates',
			plates: [
				{ name: 'level', width: 200, thickness: 20, y: 0, z: 10, angle: 0 },
				{ name: 'upright', width: 300, thickness: 12, y: 0, z: 170, angle: turn }
			],
			tied: true,
			grade
		});
		expect(areas(plates(90)).z!.area).toBe(3600);
		expect(areas(plates(-90)).z!.area).toBe(3600);
		expect(areas(plates(90)).y!.area).toBe(4000);
		expect(areas(plates(75)).z).toBeNull();
	});
});

describe('shear resistance of plates with a free edge', () => {
	const tee = (h: number): SectionDefinition => ({
		kind: 'tee',
		fabrication: 'welded',
		h,
		b: 200,
		tw: 10,
		tf: 20,
		grade: 235
	});

	it('stops at 31ε√1.2 = 33.96 for the depth over thickness of a stem, with a note', () => {
		const on = shearResistances(testModel(tee(20 + 339.5)), true);
		expect(on.z!.resistance).toBeCloseTo((10 * (359.5 - 10) * 0.235) / Math.sqrt(3), 9);
		const over = shearResistances(testModel(tee(20 + 339.7)), true);
		expect(over.z).toBeNull();
		expect(over.notes.map(({ code }) => code)).toContain('shear-buckling-not-built');
	});

	it('says that the shear area of an angle is from practice', () => {
		const { notes } = shearResistances(
			testModel({ kind: 'angle', h: 90, b: 90, t: 9, grade: 235 }),
			true
		);
		expect(notes.map(({ code }) => code)).toContain('shear-area-from-practice');
	});
});
