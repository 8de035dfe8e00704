import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { bendingFrom } from '../../src/lib/engine/response/history/history-bending';
import { historyOf } from '../../src/lib/engine/response/history/history';
import { historyPicture } from '../../src/lib/engine/response/history/history-picture';
import { bending } from '../../src/lib/engine/response/respond';
import { prepareSection } from '../../src/lib/engine/section/prepare';
import type { SectionDefinition } from '../../src/lib/engine/section/definition';

const straight = { axisAngle: 0, transverse: 'moment-zero', N: 0 } as const;

const prepared = (definition: SectionDefinition) => {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error[0]?.message);
	return section.value;
};

describe('Beer & Johnston, Sample Problem 4.5: built-up I 12 × 16 in (PT03, from memory)', () => {
	const [inch, ksi] = [25.4, 6.894757293];
	const section = prepared({
		...{ kind: 'i', fabrication: 'welded', h: 16 * inch, b: 12 * inch },
		...{ tf: inch, tw: 0.75 * inch, grade: { fy: 50 * ksi, E: 29_000 * ksi } }
	});
	const history = historyOf(section);
	if (!history.ok) throw new Error(history.error.message);
	const bent = bendingFrom(history.value, straight);

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
