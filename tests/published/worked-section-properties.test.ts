import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { fullPlastic } from '$lib/engine/response/plastic';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { prepareSection } from '$lib/engine/section/prepare';
import type { PreparedSection } from '$lib/engine/section/prepared';

interface WorkedExample {
	id: string;
	source: string;
	expected: Record<string, number>;
	tolerance: Record<string, 'exact' | { abs?: number; rel?: number }>;
}

const examples = JSON.parse(
	readFileSync('tests/published/worked-examples.json', 'utf8')
) as WorkedExample[];

function built(definition: SectionDefinition): PreparedSection {
	const result = prepareSection(definition);
	if (result.ok) return result.value;
	throw new Error(result.error.map(({ message }) => message).join(' '));
}

/** Holds our figures against the example's, each within the tolerance stated with it. */
function hold(id: string, ours: Record<string, number>): void {
	const example = examples.find((candidate) => candidate.id === id);
	if (!example) throw new Error(`No worked example ${id}.`);
	for (const [name, value] of Object.entries(ours)) {
		const expected = example.expected[name] ?? Number.NaN;
		const tolerance = example.tolerance[name];
		const allowed =
			tolerance === 'exact' || !tolerance
				? 1e-9 * expected
				: (tolerance.abs ?? 0) + (tolerance.rel ?? 0) * expected;
		expect(Math.abs(value - expected), `${id} ${name}: ${value}`).toBeLessThanOrEqual(allowed);
	}
}

const inch = 25.4;
const ksi = (1000 * 4.4482216152605) / inch ** 2;
const kipInch = 4.4482216152605 * 25.4e-3;

describe('section properties of worked examples', () => {
	it('SP02: IPE 500 (ArcelorMittal catalogue)', () => {
		const { gross } = built({
			kind: 'i',
			h: 500,
			b: 200,
			tw: 10.2,
			tf: 16,
			r: 21,
			fabrication: 'rolled',
			grade: 235
		});
		hold('SP02', {
			A: gross.area / 1e2,
			Iy: gross.secondMomentY / 1e4,
			Wel_y: gross.elasticModulusYTop / 1e3,
			Wpl_y: gross.plasticModulusY / 1e3
		});
	});

	it('SP05, SP06: hot-finished tubes with the nominal radii (EN 10210-2)', () => {
		const tube = (h: number, b: number, t: number) =>
			built({ kind: 'rectangular-hollow', h, b, t, fabrication: 'hot-finished', grade: 235 }).gross;
		const square = tube(200, 200, 10);
		hold('SP05', {
			A: square.area / 1e2,
			I: square.secondMomentY / 1e4,
			Wel: square.elasticModulusYTop / 1e3,
			Wpl: square.plasticModulusY / 1e3
		});
		const flat = tube(200, 100, 16);
		hold('SP06', { A: flat.area / 1e2, Wpl: flat.plasticModulusY / 1e3 });
	});

	it('SP07: CHS 219.1 × 10 (EN 10210-2)', () => {
		const { gross } = built({ kind: 'circular-hollow', d: 219.1, t: 10, grade: 235 });
		hold('SP07', {
			A: gross.area / 1e2,
			I: gross.secondMomentY / 1e4,
			Wel: gross.elasticModulusYTop / 1e3,
			Wpl: gross.plasticModulusY / 1e3
		});
	});
});

describe('shape factors and plastic moments of worked examples', () => {
	it('PT04: rectangle', () => {
		const { gross } = built({ kind: 'flat', b: 40, h: 100, grade: 235 });
		hold('PT04', { shape_factor: gross.plasticModulusY / gross.elasticModulusYTop });
	});

	it('PT07: square bent about a diagonal', () => {
		const diamond = built({
			kind: 'plates',
			grade: 235,
			plates: [{ name: 'bar', width: 50, thickness: 50, y: 0, z: 0, angle: 45 }]
		});
		hold('PT07', {
			shape_factor: diamond.gross.plasticModulusY / diamond.gross.elasticModulusYTop
		});
	});

	it('PT10: wide-flange shape (Hibbeler)', () => {
		const { gross } = built({
			kind: 'i',
			h: 10 * inch,
			b: 8 * inch,
			tf: 0.5 * inch,
			tw: 0.5 * inch,
			fabrication: 'welded',
			grade: 36 * ksi
		});
		const inKipInch = (modulus: number) => (modulus * 36 * ksi) / 1e6 / kipInch;
		hold('PT10', {
			I_in4: gross.secondMomentY / inch ** 4,
			My_kipin: inKipInch(gross.elasticModulusYTop),
			Mp_kipin: inKipInch(gross.plasticModulusY),
			shape_factor: gross.plasticModulusY / gross.elasticModulusYTop
		});
	});

	it('MS01: plastic tee, flange at the top (Hibbeler)', () => {
		const tee = built({
			kind: 'tee',
			h: 135,
			b: 100,
			tf: 15,
			tw: 15,
			fabrication: 'welded',
			grade: 250
		});
		const { plasticY, plasticNeutralAxisZ } = fullPlastic(tee);
		hold('MS01', { pna_from_bottom: plasticNeutralAxisZ ?? Number.NaN, Mp_kNm: plasticY });
	});

	it('MS02: unequal flanges (Beer & Johnston)', () => {
		const i = built({
			kind: 'i',
			h: 120,
			b: 100,
			tf: 20,
			tw: 20,
			bBottom: 60,
			tfBottom: 20,
			fabrication: 'welded',
			grade: 240
		});
		const { plasticY, plasticNeutralAxisZ } = fullPlastic(i);
		hold('MS02', {
			A_mm2: i.gross.area,
			pna_below_top: 120 - (plasticNeutralAxisZ ?? Number.NaN),
			Mp_kNm: plasticY
		});
	});

	it('MS03: tee whose plastic axis lies at the junction (McCormac & Csernak)', () => {
		const tee = built({
			kind: 'tee',
			h: 7.5 * inch,
			b: 8 * inch,
			tf: 1.5 * inch,
			tw: 2 * inch,
			fabrication: 'welded',
			grade: 50 * ksi
		});
		const { gross } = tee;
		const kipFoot = 12 * kipInch;
		hold('MS03', {
			ybar_from_top: (7.5 * inch - gross.centroid.z) / inch,
			I_in4: gross.secondMomentY / inch ** 4,
			S_in3: gross.elasticModulusYBottom / inch ** 3,
			My_kipft: (gross.elasticModulusYBottom * 50 * ksi) / 1e6 / kipFoot,
			Z_in3: gross.plasticModulusY / inch ** 3,
			Mp_kipft: fullPlastic(tee).plasticY / kipFoot,
			shape_factor: gross.plasticModulusY / gross.elasticModulusYBottom
		});
	});
});
