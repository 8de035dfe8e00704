import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Edge, Point } from '../geometry/boundary';
import { acrossOf, frameAt } from '../geometry/frame';
import type { Part, PreparedSection } from '../section/prepared';
import { stressAt } from '../material/laws';
import { bending } from './respond';
import { plasticMoment } from './plastic';
import { circle, part, rectangle, sectionOf, steel } from './test-sections';
import type { BendingPath } from './state';

/** A lopsided hybrid section: two flanges out of line with the web, and a bar with a hole. */
interface Recipe {
	flange: [number, number, number];
	web: [number, number];
	foot: [number, number, number];
	bar: number;
	grades: [number, number, number, number];
}

const size = fc.double({ min: 8, max: 120, noNaN: true });
const strength = fc.double({ min: 180, max: 700, noNaN: true });
const recipe: fc.Arbitrary<Recipe> = fc.record({
	flange: fc.tuple(size, size, fc.double({ min: -50, max: 50, noNaN: true })),
	web: fc.tuple(
		fc.double({ min: 4, max: 30, noNaN: true }),
		fc.double({ min: 50, max: 500, noNaN: true })
	),
	foot: fc.tuple(size, size, fc.double({ min: -50, max: 50, noNaN: true })),
	bar: fc.double({ min: 5, max: 60, noNaN: true }),
	grades: fc.tuple(strength, strength, strength, strength)
});

function build({ flange, web, foot, bar, grades }: Recipe): Part[] {
	const [fw, ft, fo] = flange;
	const [tw, hw] = web;
	const [bw, bt, bo] = foot;
	const centre = { y: fo + fw / 2 + bar + 3, z: hw };
	return [
		part('top', rectangle(fo - fw / 2, hw, fw, ft), steel(grades[0])),
		part('web', rectangle(-tw / 2, 0, tw, hw), steel(grades[1])),
		part('foot', rectangle(bo - bw / 2, -bt, bw, bt), steel(grades[2])),
		part('bar', { loops: [circle(centre, bar), circle(centre, bar * 0.4, true)] }, steel(grades[3]))
	];
}

type Map = (point: Point) => Point;

/** Moves every edge; `turn` in radians, `mirror` reverses the winding. */
function mapped(
	parts: Part[],
	map: Map,
	{ turn = 0, scale = 1, mirror = false } = {}
): PreparedSection {
	const edge = (e: Edge): Edge => {
		if (e.kind === 'line') {
			const [from, to] = [map(e.from), map(e.to)];
			return mirror ? { kind: 'line', from: to, to: from } : { kind: 'line', from, to };
		}
		const centre = map(e.centre);
		const radius = e.radius * scale;
		if (!mirror) return { ...e, centre, radius, start: e.start + turn };
		return { ...e, centre, radius, start: Math.PI - (e.start + e.sweep) };
	};
	return sectionOf(
		...parts.map((p) => ({
			...p,
			region: {
				loops: p.region.loops.map((loop) => {
					const edges = loop.map(edge);
					return mirror ? edges.reverse() : edges;
				})
			}
		}))
	);
}

const paths = fc.record({
	axisAngle: fc.double({ min: -180, max: 180, noNaN: true }),
	transverse: fc.constantFrom('moment-zero' as const, 'curvature-zero' as const),
	share: fc.double({ min: -0.6, max: 0.6, noNaN: true }),
	ratio: fc.double({ min: 0.2, max: 12, noNaN: true })
});

function pathOf(parts: Part[], { axisAngle, transverse, share }: Asked): BendingPath {
	const squash = parts.reduce((sum, p) => {
		const { area } = sectionOf(p).gross;
		return sum + area * p.material.fy;
	}, 0);
	return { axisAngle, transverse, N: (share * squash) / 1e3 };
}

type Asked = {
	axisAngle: number;
	transverse: 'moment-zero' | 'curvature-zero';
	share: number;
	ratio: number;
};

/** Moment at a curvature over first yield, and the full plastic moment: what must not change. */
function figures(section: PreparedSection, path: BendingPath, ratio: number) {
	const bent = bending(section, path);
	const { curvature } = bent.firstYield;
	const state = curvature === null ? null : bent.atCurvature(ratio * curvature);
	if (state && !state.converged) throw new Error('not converged');
	return {
		curvature,
		first: bent.firstYield.moment,
		moment: state?.moment ?? null,
		yielded: state?.yieldedShare ?? null,
		plastic: plasticMoment(section, path).moment
	};
}

function expectSame(
	a: ReturnType<typeof figures>,
	b: ReturnType<typeof figures>,
	scale: number,
	momentScale: number
) {
	const near = (x: number | null, y: number | null, unit: number) => {
		if (x === null || y === null) expect(x).toBe(y);
		else expect(Math.abs(x - y) / unit).toBeLessThan(2e-9);
	};
	near(a.first, b.first, momentScale);
	near(a.moment, b.moment, momentScale);
	near(a.plastic, b.plastic, momentScale);
	near(a.yielded, b.yielded, 1);
	if (a.curvature !== null && b.curvature !== null)
		expect(Math.abs(a.curvature / b.curvature / scale - 1)).toBeLessThan(1e-9);
}

const momentScale = (parts: Part[]) => {
	const section = sectionOf(...parts);
	const { height, width, area } = section.gross;
	return (area * Math.hypot(height, width) * 200) / 1e6;
};

const runs = { numRuns: 150 };

describe('what a section does', () => {
	it('does not change when it is moved', () => {
		fc.assert(
			fc.property(recipe, paths, fc.double({ min: -9e5, max: 9e5, noNaN: true }), (r, asked, d) => {
				const parts = build(r);
				const path = pathOf(parts, asked);
				const moved = mapped(parts, ({ y, z }) => ({ y: y + d, z: z - d / 3 }));
				expectSame(
					figures(sectionOf(...parts), path, asked.ratio),
					figures(moved, path, asked.ratio),
					1,
					momentScale(parts)
				);
			}),
			runs
		);
	});

	it('turns with it', () => {
		fc.assert(
			fc.property(
				recipe,
				paths,
				fc.double({ min: -180, max: 180, noNaN: true }),
				(r, asked, degrees) => {
					const parts = build(r);
					const path = pathOf(parts, asked);
					const turn = (degrees * Math.PI) / 180;
					const [c, s] = [Math.cos(turn), Math.sin(turn)];
					const turned = mapped(parts, ({ y, z }) => ({ y: c * y - s * z, z: s * y + c * z }), {
						turn
					});
					expectSame(
						figures(sectionOf(...parts), path, asked.ratio),
						figures(turned, { ...path, axisAngle: path.axisAngle + degrees }, asked.ratio),
						1,
						momentScale(parts)
					);
				}
			),
			runs
		);
	});

	it('is mirrored with it (left for right: the axis turns from θ to −θ)', () => {
		fc.assert(
			fc.property(recipe, paths, (r, asked) => {
				const parts = build(r);
				const path = pathOf(parts, asked);
				const mirrored = mapped(parts, ({ y, z }) => ({ y: -y, z }), { mirror: true });
				expectSame(
					figures(sectionOf(...parts), path, asked.ratio),
					figures(mirrored, { ...path, axisAngle: -path.axisAngle }, asked.ratio),
					1,
					momentScale(parts)
				);
			}),
			runs
		);
	});

	it.each([1e-6, 1e6])('scales by the cube of its size (%d)', (k) => {
		fc.assert(
			fc.property(recipe, paths, (r, asked) => {
				const parts = build(r);
				const path = pathOf(parts, asked);
				const scaled = mapped(parts, ({ y, z }) => ({ y: k * y, z: k * z }), { scale: k });
				const big = figures(scaled, { ...path, N: path.N * k * k }, asked.ratio);
				const cube = (value: number | null) => (value === null ? null : value / k ** 3);
				expectSame(
					figures(sectionOf(...parts), path, asked.ratio),
					{ ...big, first: cube(big.first), moment: cube(big.moment), plastic: cube(big.plastic) },
					k,
					momentScale(parts)
				);
			}),
			runs
		);
	});

	it('does not change when a part is split in two', () => {
		fc.assert(
			fc.property(
				recipe,
				paths,
				fc.double({ min: 0.05, max: 0.95, noNaN: true }),
				(r, asked, at) => {
					const parts = build(r);
					const [tw, hw] = r.web;
					const halves = [
						part('web a', rectangle(-tw / 2, 0, tw, hw * at), steel(r.grades[1])),
						part('web b', rectangle(-tw / 2, hw * at, tw, hw * (1 - at)), steel(r.grades[1]))
					];
					const path = pathOf(parts, asked);
					const split = sectionOf(parts[0]!, ...halves, parts[2]!, parts[3]!);
					expectSame(
						figures(sectionOf(...parts), path, asked.ratio),
						figures(split, path, asked.ratio),
						1,
						momentScale(parts)
					);
				}
			),
			runs
		);
	});
});

describe('every returned state', () => {
	it('is in equilibrium and agrees with independent strips', () => {
		fc.assert(
			fc.property(recipe, paths, (r, asked) => {
				const parts = build(r);
				const section = sectionOf(...parts);
				const path = pathOf(parts, asked);
				const bent = bending(section, path);
				if (bent.firstYield.curvature === null) return;
				const state = bent.atCurvature(asked.ratio * bent.firstYield.curvature);
				expect(state.converged).toBe(true);
				const squash = parts.reduce((s, p) => s + sectionOf(p).gross.area * p.material.fy, 0) / 1e3;
				expect(Math.abs(state.N! - path.N) / squash).toBeLessThan(1e-9);
				const pair = (state.compression?.force ?? 0) + (state.tension?.force ?? 0);
				expect(Math.abs(pair - state.N!) / squash).toBeLessThan(1e-9);
				const scale = momentScale(parts);
				if (path.transverse === 'moment-zero') {
					const angle = (path.axisAngle * Math.PI) / 180;
					const across = -state.My! * Math.sin(angle) + state.Mz! * Math.cos(angle);
					expect(Math.abs(across) / scale).toBeLessThan(1e-9);
				}
				const strips = stripForces(parts, section, state.e0!, state.ky! / 1e3, state.kz! / 1e3);
				expect(Math.abs(strips.N - state.N!) / squash).toBeLessThan(2e-3);
				expect(Math.abs(strips.My - state.My!) / scale).toBeLessThan(2e-3);
				expect(Math.abs(strips.Mz - state.Mz!) / scale).toBeLessThan(2e-3);
			}),
			{ numRuns: 60 }
		);
	});

	it('has a tangent moment that its neighbours confirm', () => {
		fc.assert(
			fc.property(recipe, paths, (r, asked) => {
				const parts = build(r);
				const bent = bending(sectionOf(...parts), pathOf(parts, asked));
				if (bent.firstYield.curvature === null) return;
				const k = asked.ratio * bent.firstYield.curvature;
				const [a, m, b] = [0.999, 1, 1.001].map((f) => bent.momentAt(k * f)!) as [
					number,
					number,
					number
				];
				expect(b).toBeGreaterThanOrEqual(m - 1e-9 * Math.abs(m));
				expect(m).toBeGreaterThanOrEqual(a - 1e-9 * Math.abs(m));
			}),
			runs
		);
	});
});

/** Crude sums over small cells, written only for this comparison. */
function stripForces(parts: Part[], section: PreparedSection, e0: number, ky: number, kz: number) {
	const { centroid } = section.gross;
	const frame = frameAt(centroid, 0);
	const sum = { N: 0, My: 0, Mz: 0 };
	const cell = (p: Part, y: number, z: number, area: number) => {
		const v = acrossOf(frame, { y, z });
		const u = y - centroid.y;
		const stress = stressAt(p.material.law, e0 - ky * v + kz * u);
		sum.N += (stress * area) / 1e3;
		sum.My -= (stress * v * area) / 1e6;
		sum.Mz += (stress * u * area) / 1e6;
	};
	const n = 150;
	for (const p of parts) {
		const first = p.region.loops[0]![0]!;
		if (first.kind === 'arc') {
			for (let i = 0; i < n; i++) {
				const radius = first.radius * (0.4 + (0.6 * (i + 0.5)) / n);
				for (let j = 0; j < n; j++) {
					const t = (2 * Math.PI * (j + 0.5)) / n;
					const area = ((radius * first.radius * 0.6) / n) * ((2 * Math.PI) / n);
					cell(
						p,
						first.centre.y + radius * Math.cos(t),
						first.centre.z + radius * Math.sin(t),
						area
					);
				}
			}
			continue;
		}
		const { bounds: b } = sectionOf(p);
		const [dy, dz] = [(b.right - b.left) / n, (b.top - b.bottom) / n];
		for (let i = 0; i < n; i++)
			for (let j = 0; j < n; j++)
				cell(p, b.left + (i + 0.5) * dy, b.bottom + (j + 0.5) * dz, dy * dz);
	}
	return sum;
}
