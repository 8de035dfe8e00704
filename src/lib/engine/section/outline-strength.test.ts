import { describe, expect, it } from 'vitest';
import { plasticMoment } from '../response/plastic';
import { bending } from '../response/respond';
import type { OutlineSection, Ring, SectionDefinition } from './definition';
import { prepareSection } from './prepare';

const rectangle = (left: number, low: number, right: number, high: number): Ring => [
	[left, low],
	[right, low],
	[right, high],
	[left, high]
];

function prepared(definition: SectionDefinition) {
	const result = prepareSection(definition);
	if (!result.ok) throw new Error(result.error.map(({ message }) => message).join(' '));
	return result.value;
}
const about = (axisAngle: number, N = 0) =>
	({ axisAngle, transverse: 'curvature-zero', N }) as const;
const outline = (regions: OutlineSection['regions'], grade = 355): OutlineSection => ({
	kind: 'outline',
	grade,
	...(regions ? { regions } : {})
});

describe('an outline with a hole', () => {
	const tube = outline([
		{ outer: rectangle(0, 0, 200, 300), holes: [rectangle(10, 20, 190, 280)] }
	]);
	// closed forms of the hollow rectangle, mm
	const inertia = (200 * 300 ** 3 - 180 * 260 ** 3) / 12;
	const plastic = (200 * 300 ** 2 - 180 * 260 ** 2) / 4;

	it('has the closed forms of the hollow rectangle', () => {
		const { gross } = prepared(tube);
		expect(gross.secondMomentY / inertia).toBeCloseTo(1, 12);
		expect(gross.plasticModulusY / plastic).toBeCloseTo(1, 12);
		const bent = bending(prepared(tube), about(0));
		expect(bent.firstYield.moment! / ((355 * inertia) / 150 / 1e6)).toBeCloseTo(1, 10);
		expect(plasticMoment(prepared(tube), about(0)).moment! / ((355 * plastic) / 1e6)).toBeCloseTo(
			1,
			10
		);
	});

	it('bends as the box of the same sizes, axial force and turned axis included', () => {
		const box = prepared({
			kind: 'box',
			h: 300,
			b: 200,
			tw: 10,
			tfTop: 20,
			tfBottom: 20,
			webGap: 180,
			grade: 355
		});
		for (const path of [about(0, -500), about(35, 800), about(90)]) {
			const [one, other] = [bending(prepared(tube), path), bending(box, path)];
			expect(one.firstYield.moment! / other.firstYield.moment!).toBeCloseTo(1, 9);
			const curvature = 2 * other.firstYield.curvature!;
			const [a, b] = [one.atCurvature(curvature), other.atCurvature(curvature)];
			expect(a.moment! / b.moment!).toBeCloseTo(1, 9);
			expect(a.yieldedShare! - b.yieldedShare!).toBeCloseTo(0, 9);
		}
	});
});

describe('an outline of two grades', () => {
	const [b, h] = [100, 200];
	const halves = outline([
		{ outer: rectangle(0, 0, b, h / 2), grade: 235 },
		{ outer: rectangle(0, h / 2, b, h), grade: 460 }
	]);

	it('yields first in the weaker half', () => {
		const first = bending(prepared(halves), about(0)).firstYield.moment!;
		expect(first / ((235 * b * h ** 2) / 6 / 1e6)).toBeCloseTo(1, 10);
	});

	it('has its full plastic axis where the forces balance', () => {
		// axis at depth x below the top: 460 x = 460 (h/2 − x) + 235 h/2, levers measured from the axis
		const [low, high] = [235, 460];
		const x = ((high + low) * (h / 2)) / (2 * high);
		const above = (high * b * x ** 2) / 2;
		const between = (high * b * (h / 2 - x) ** 2) / 2;
		const below = low * b * (h / 2) * (h / 2 - x + h / 4);
		const moment = plasticMoment(prepared(halves), about(0)).moment!;
		expect(moment / ((above + between + below) / 1e6)).toBeCloseTo(1, 10);
	});

	it('has the plain moment of each half about the axis that they share', () => {
		const moment = plasticMoment(prepared(halves), about(90)).moment!;
		const expected = ((235 + 460) * (h / 2) * b ** 2) / 4 / 1e6;
		expect(moment / expected).toBeCloseTo(1, 10);
	});

	it('approaches its full plastic moment as it is bent on', () => {
		const bent = bending(prepared(halves), about(0));
		const full = plasticMoment(prepared(halves), about(0)).moment!;
		const state = bent.atCurvature(200 * bent.firstYield.curvature!);
		expect(state.converged).toBe(true);
		expect(state.moment! / full).toBeGreaterThan(0.999);
		expect(state.moment! / full).toBeLessThanOrEqual(1 + 1e-12);
	});

	it('may fill the hole of one region with another, each with its own strength', () => {
		const cored = outline([
			{ outer: rectangle(0, 0, 100, 100), holes: [rectangle(30, 30, 70, 70)], grade: 460 },
			{ outer: rectangle(30, 30, 70, 70), grade: 235 }
		]);
		const moment = plasticMoment(prepared(cored), about(0)).moment!;
		const expected = (460 * (100 ** 3 - 40 ** 3) + 235 * 40 ** 3) / 4 / 1e6;
		expect(moment / expected).toBeCloseTo(1, 10);
		expect(prepared(cored).gross.area).toBeCloseTo(10_000, 9);
		expect(prepared(cored).contours).toHaveLength(1);
	});
});
