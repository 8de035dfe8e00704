import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { bendingFrom } from '../../src/lib/engine/response/history/history-bending';
import { historyOf } from '../../src/lib/engine/response/history/history';
import { historyPicture } from '../../src/lib/engine/response/history/history-picture';
import { bending } from '../../src/lib/engine/response/respond';
import { prepareSection } from '../../src/lib/engine/section/prepare';
import type { SectionDefinition } from '../../src/lib/engine/section/definition';
import examples from './worked-examples.json';

const straight = { axisAngle: 0, transverse: 'moment-zero', N: 0 } as const;

const prepared = (definition: SectionDefinition) => {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error[0]?.message);
	return section.value;
};

const expectedOf = (id: string) => examples.find((example) => example.id === id)!.expected;

describe('Beer & Johnston, Concept Application 4.6: residual stresses of the bar of 4.5 (PT02, from memory)', () => {
	const history = historyOf(
		prepared({ kind: 'flat', b: 50, h: 120, grade: { fy: 240, E: 200_000 } })
	);
	if (!history.ok) throw new Error(history.error.message);
	const loaded = bendingFrom(history.value, straight).after({ moment: 36.8 })!;
	const released = bendingFrom(loaded, straight).after({ moment: 0 })!;
	const { points } = historyPicture(released).lines[0]!;

	it('keeps 66.7 N/mm² at the surfaces: tension where it was compressed', () => {
		expect(expectedOf('PT02')).toMatchObject({ residual_top: 66.7, residual_core_edge: 35.5 });
		expect(Math.abs(points.at(-1)!.stress - 66.7)).toBeLessThan(0.1);
		expect(Math.abs(points[0]!.stress + 66.7)).toBeLessThan(0.1);
	});

	it('keeps 35.5 N/mm² at the edges of the elastic core, 40 mm from the middle', () => {
		const edge = points.find(({ distance }) => Math.abs(distance - 40) < 0.05)!;
		expect(Math.abs(edge.stress + 35.5)).toBeLessThan(0.1);
	});

	it('stays bent with a radius of 225 m', () => {
		const { curvature } = bendingFrom(released, straight).atMoment(0);
		expect(Math.abs(1 / curvature! / 225 - 1)).toBeLessThan(0.005);
	});
});

describe('Beer & Johnston, Sample Problem 4.5: built-up I 12 × 16 in (PT03, from memory)', () => {
	const [inch, ksi] = [25.4, 6.894757293];
	const kipInch = 0.112984829;
	const section = prepared({
		...{ kind: 'i', fabrication: 'welded', h: 16 * inch, b: 12 * inch },
		...{ tf: inch, tw: 0.75 * inch, grade: { fy: 50 * ksi, E: 29_000 * ksi } }
	});
	const history = historyOf(section);
	if (!history.ok) throw new Error(history.error.message);
	const bent = bendingFrom(history.value, straight);

	it('first yields at 9525 kip·in and has plastic flanges at 10 230', () => {
		expect(expectedOf('PT03')).toMatchObject({ My_kipin: 9525, M_flanges_plastic: 10230 });
		expect(Math.abs(bent.firstYield.moment! / kipInch / 9525 - 1)).toBeLessThan(1e-3);
		// the fronts reach the inner faces of the flanges, 7 of 8 in from the middle
		const state = bent.atCurvature((bent.firstYield.curvature! * 8) / 7);
		expect(Math.abs(state.moment! / kipInch / 10230 - 1)).toBeLessThan(1e-3);
	});

	it('keeps what superposition leaves after release: M y/I less than yield, κ − M/EI', () => {
		const curvature = (bent.firstYield.curvature! * 8) / 7;
		const { moment } = bent.atCurvature(curvature);
		const released = bendingFrom(bent.after({ curvature })!, straight).atMoment(0);
		const inertia = section.gross.secondMomentY;
		expect(
			released.curvature! / (curvature - (moment! * 1e9) / (29_000 * ksi * inertia))
		).toBeCloseTo(1, 8);
		const surface = 50 * ksi - (moment! * 1e6 * 8 * inch) / inertia;
		const kept = historyPicture(
			bendingFrom(bent.after({ curvature })!, straight).after({ moment: 0 })!
		);
		const bottom = kept.lines.find(({ part }) => part === 'bottomFlange')!.points[0]!;
		expect(bottom.stress).toBeCloseTo(surface, 8);
	});
});

interface Row {
	designation: string;
	definition: SectionDefinition & { kind: 'i' };
}

function catalogueRows(file: string): Row[] {
	const [, ...lines] = readFileSync(`data/${file}`, 'utf8').trim().split('\n');
	return lines.map((line) => {
		const [designation = '', , h, b, tw, tf, r] = line.split(',');
		const sizes = { h: Number(h), b: Number(b), tw: Number(tw), tf: Number(tf), r: Number(r) };
		return { designation, definition: { kind: 'i', fabrication: 'rolled', grade: 355, ...sizes } };
	});
}

describe('residual stresses of rolled I shapes (ECCS 33, from memory)', () => {
	const rows = [...catalogueRows('en10365/i.csv'), ...catalogueRows('en10365/ub-uc.csv')];

	it('are in equilibrium, plate by plate and as a whole, for every shape of the catalogues', () => {
		expect(rows.length).toBeGreaterThan(150);
		for (const { designation, definition } of rows) {
			const section = prepared(definition);
			const history = historyOf(section, 'rolled');
			if (!history.ok) throw new Error(designation);
			const state = bendingFrom(history.value, straight).atPlane({ e0: 0, ky: 0, kz: 0 });
			const squash = (section.gross.area * 355) / 1e3;
			expect(Math.abs(state.N!), designation).toBeLessThan(1e-9 * squash);
			const lever = section.gross.height / 1e3;
			expect(Math.abs(state.My!), designation).toBeLessThan(1e-9 * squash * lever);
			expect(Math.abs(state.Mz!), designation).toBeLessThan(1e-9 * squash * lever);
			const peak = (definition.h / definition.b <= 1.2 ? 0.5 : 0.3) * 235;
			expect(state.extremes!.stressMax, designation).toBeCloseTo(peak, 8);
			expect(state.extremes!.stressMin, designation).toBeCloseTo(-peak, 8);
		}
	});

	it('bring first yield down to (fy − peak) Wel, and leave the full plastic moment', () => {
		for (const { designation, definition } of rows.filter((_, i) => i % 12 === 0)) {
			const section = prepared(definition);
			const history = historyOf(section, 'rolled');
			if (!history.ok) throw new Error(designation);
			const bent = bendingFrom(history.value, straight);
			const peak = (definition.h / definition.b <= 1.2 ? 0.5 : 0.3) * 235;
			const modulus = section.gross.elasticModulusYTop;
			expect(bent.firstYield.moment!, designation).toBeCloseTo(((355 - peak) * modulus) / 1e6, 6);
			expect(bent.plasticMoment).toBe(bending(section, straight).plasticMoment);
			const far = bent.momentAt(3000 * bent.firstYield.curvature!)!;
			expect(far / bent.plasticMoment!, designation).toBeCloseTo(1, 5);
			const without = bending(section, straight).momentAt(2 * bent.firstYield.curvature!)!;
			expect(bent.momentAt(2 * bent.firstYield.curvature!)!).toBeLessThan(without);
		}
	});
});
