import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	interactionCurve,
	type InteractionPoint,
	type InteractionRequest
} from '../../src/lib/engine/response/interaction';
import { interactionWith } from '../../src/lib/engine/response/interaction-factors';
import {
	circle,
	part,
	rectangle,
	sectionOf,
	steel
} from '../../src/lib/engine/response/test-sections';
import type { Part, PreparedSection } from '../../src/lib/engine/section/prepared';

const curve = (section: PreparedSection, request: InteractionRequest) => {
	const answer = interactionCurve(section, request);
	if (!answer.ok) throw new Error(answer.error.message);
	return answer.value.points;
};

const [fy, b, h] = [250, 40, 120];
const plasticY = (fy * b * h ** 2) / 4e6;

describe('rectangle (closed forms, any text on plastic design)', () => {
	it('unequal strengths: N and M from where the neutral axis lies', () => {
		const fyc = 180;
		const section = sectionOf(part('bar', rectangle(0, 0, b, h), steel(fy, { fyc })));
		for (const { N, My } of curve(section, { limit: 'plastic', plane: 'N-My' })) {
			const stretched = (N * 1e3 + fyc * b * h) / ((fy + fyc) * b);
			const moment = ((fy + fyc) * b * stretched * (h - stretched)) / 2e6;
			expect(Math.abs(My) / plasticY).toBeCloseTo(moment / plasticY, 11);
		}
	});
});

describe('circles', () => {
	it('bends alike about every axis under N', () => {
		const tube = sectionOf(
			part(
				'wall',
				{ loops: [circle({ y: 0, z: 0 }, 60), circle({ y: 0, z: 0 }, 50, true)] },
				steel(fy)
			)
		);
		for (const limit of ['plastic', 'first-yield'] as const) {
			const sizes = curve(tube, { limit, plane: 'My-Mz', N: 300 }).map(({ My, Mz }) =>
				Math.hypot(My, Mz)
			);
			for (const size of sizes) expect(size / sizes[0]!).toBeCloseTo(1, 11);
		}
	});
});

/** Lopsided hybrid sections of rectangles, with unequal strengths in both senses. */
interface Box {
	left: number;
	bottom: number;
	width: number;
	height: number;
	fy: number;
	fyc: number;
}
const size = fc.double({ min: 8, max: 120, noNaN: true });
const strength = fc.double({ min: 180, max: 700, noNaN: true });
const boxes: fc.Arbitrary<Box[]> = fc
	.tuple(size, size, size, size, size, size, fc.array(strength, { minLength: 6, maxLength: 6 }))
	.map(([w, hw, fw, ft, bw, bt, s]) => [
		{ left: 0, bottom: 0, width: w / 8, height: 4 * hw, fy: s[0]!, fyc: s[1]! },
		{ left: -fw / 3, bottom: 4 * hw, width: fw, height: ft / 4, fy: s[2]!, fyc: s[3]! },
		{ left: 0, bottom: -bt / 4, width: bw, height: bt / 4, fy: s[4]!, fyc: s[5]! }
	]);
const partsOf = (list: readonly Box[]): Part[] =>
	list.map(({ left, bottom, width, height, ...s }, i) =>
		part(`p${i}`, rectangle(left, bottom, width, height), steel(s.fy, { fyc: s.fyc }))
	);
const requests = fc.record({
	limit: fc.constantFrom('first-yield' as const, 'plastic' as const),
	plane: fc.constantFrom('N-My' as const, 'N-Mz' as const, 'My-Mz' as const)
});

const scales = (points: readonly InteractionPoint[]) => {
	const most = (of: (p: InteractionPoint) => number) =>
		Math.max(...points.map((p) => Math.abs(of(p)))) || 1;
	return { N: most((p) => p.N), My: most((p) => p.My), Mz: most((p) => p.Mz) };
};

describe('random hybrid sections', () => {
	it('have convex curves', () => {
		fc.assert(
			fc.property(boxes, requests, (list, asked) => {
				const points = curve(sectionOf(...partsOf(list)), { ...asked, points: 60 });
				const s = scales(points);
				const flat = points.map(({ N, My, Mz }) =>
					asked.plane === 'N-My'
						? [N / s.N, My / s.My]
						: asked.plane === 'N-Mz'
							? [N / s.N, Mz / s.Mz]
							: [My / s.My, Mz / s.Mz]
				);
				const around = [...flat, flat[1]!];
				for (let i = 2; i < around.length; i++) {
					const [p, q, r] = [around[i - 2]!, around[i - 1]!, around[i]!];
					const turn = (q[0]! - p[0]!) * (r[1]! - q[1]!) - (q[1]! - p[1]!) * (r[0]! - q[0]!);
					expect(turn).toBeGreaterThan(-1e-11);
				}
			}),
			{ numRuns: 40, interruptAfterTimeLimit: 3000 }
		);
	});

	it('meet their curves when a demand on them grows in proportion by 1', () => {
		fc.assert(
			fc.property(boxes, requests, (list, asked) => {
				const section = sectionOf(...partsOf(list));
				for (const point of curve(section, { ...asked, points: 12 })) {
					const factors = interactionWith(section, point);
					const factor = asked.limit === 'plastic' ? factors.plastic : factors.firstYield;
					expect(factor).toBeCloseTo(1, 8);
					const half = interactionWith(section, {
						N: 2 * point.N,
						My: 2 * point.My,
						Mz: 2 * point.Mz
					});
					expect(asked.limit === 'plastic' ? half.plastic : half.firstYield).toBeCloseTo(0.5, 8);
				}
			}),
			{ numRuns: 8, interruptAfterTimeLimit: 3000 }
		);
	});

	it('are turned, mirrored and scaled with their curves', () => {
		const turns = fc.double({ min: -180, max: 180, noNaN: true });
		fc.assert(
			fc.property(boxes, requests, turns, (list, asked, degrees) => {
				const parts = partsOf(list);
				const points = curve(sectionOf(...parts), { ...asked, points: 12 });
				const of = (section: PreparedSection, p: InteractionPoint) => {
					const factors = interactionWith(section, p);
					return asked.limit === 'plastic' ? factors.plastic : factors.firstYield;
				};
				const [c, s] = [Math.cos((degrees * Math.PI) / 180), Math.sin((degrees * Math.PI) / 180)];
				const turned = mapped(parts, (y, z) => [c * y - s * z, s * y + c * z]);
				const mirrored = mapped(parts, (y, z) => [-y, z], true);
				const scaled = mapped(parts, (y, z) => [1e-3 * y, 1e-3 * z]);
				for (const { N, My, Mz } of points) {
					expect(of(turned, { N, My: c * My - s * Mz, Mz: s * My + c * Mz })).toBeCloseTo(1, 8);
					expect(of(mirrored, { N, My, Mz: -Mz })).toBeCloseTo(1, 8);
					expect(of(scaled, { N: N * 1e-6, My: My * 1e-9, Mz: Mz * 1e-9 })).toBeCloseTo(1, 8);
				}
			}),
			{ numRuns: 4, interruptAfterTimeLimit: 3000 }
		);
	});

	it('reach first yield where Navier’s stress meets a strength', () => {
		fc.assert(
			fc.property(boxes, requests, (list, { plane }) => {
				const section = sectionOf(...partsOf(list));
				for (const point of curve(section, { limit: 'first-yield', plane, points: 24 }))
					expect(navierUse(list, section, point)).toBeCloseTo(1, 10);
			}),
			{ numRuns: 40, interruptAfterTimeLimit: 3000 }
		);
	});

	it('lie on the plastic surface of independent cells: no block does less work, one does as little', () => {
		fc.assert(
			fc.property(boxes, requests, (list, { plane }) => {
				const section = sectionOf(...partsOf(list));
				const points = curve(section, { limit: 'plastic', plane, points: 241 });
				for (let i = 20; i < 240; i += 73)
					expect(Math.abs(leastSpareWork(list, section, points[i]!))).toBeLessThan(1e-3);
			}),
			{ numRuns: 4, interruptAfterTimeLimit: 3000 }
		);
	});

	it('lie on it at corners of the curve too, where neighbours tell no direction', () => {
		const list: Box[] = [
			{ left: 0, bottom: 0, width: 1, height: 32, fy: 572.5, fyc: 540.2 },
			{ left: -8 / 3, bottom: 32, width: 8, height: 2, fy: 422.3, fyc: 218.6 },
			{ left: 0, bottom: -2, width: 10, height: 2, fy: 180, fyc: 700 }
		];
		const section = sectionOf(...partsOf(list));
		for (const plane of ['N-My', 'N-Mz', 'My-Mz'] as const) {
			const points = curve(section, { limit: 'plastic', plane, points: 241 });
			for (let i = 20; i < 240; i += 73)
				expect(Math.abs(leastSpareWork(list, section, points[i]!))).toBeLessThan(1e-3);
		}
	});
});

function mapped(
	parts: readonly Part[],
	map: (y: number, z: number) => [number, number],
	mirror = false
): PreparedSection {
	const point = ({ y, z }: { y: number; z: number }) => {
		const [my, mz] = map(y, z);
		return { y: my, z: mz };
	};
	return sectionOf(
		...parts.map((p) => {
			const loops = p.region.loops.map((loop) => {
				const edges = loop.map((edge) => {
					if (edge.kind === 'arc') throw new Error('rectangles only');
					const [from, to] = [point(edge.from), point(edge.to)];
					return mirror
						? ({ kind: 'line', from: to, to: from } as const)
						: ({ kind: 'line', from, to } as const);
				});
				return mirror ? edges.reverse() : edges;
			});
			return { ...p, region: { loops } };
		})
	);
}

/** Greatest stress over strength by σ = N/A + bending about both axes with the product of inertia. */
function navierUse(list: readonly Box[], { gross }: PreparedSection, p: InteractionPoint): number {
	const { area, centroid, secondMomentY: Iy, secondMomentZ: Iz, productYZ: Iyz } = gross;
	const [My, Mz] = [p.My * 1e6, p.Mz * 1e6];
	const determinant = Iy * Iz - Iyz * Iyz;
	// My = Iy·ky − Iyz·kz, Mz = Iz·kz − Iyz·ky (times E)
	const ky = (My * Iz + Mz * Iyz) / determinant;
	const kz = (Mz * Iy + My * Iyz) / determinant;
	let use = 0;
	for (const { left, bottom, width, height, ...s } of list)
		for (const y of [left, left + width])
			for (const z of [bottom, bottom + height]) {
				const stress = (p.N * 1e3) / area - ky * (z - centroid.z) + kz * (y - centroid.y);
				use = Math.max(use, stress / s.fy, -stress / s.fyc);
			}
	return use;
}

/**
 * Least work of all cells at their strength less that of the point, as a share of the former, over all
 * strain planes: 0 for a point on the surface, less outside, more inside. The cells' midpoints give a
 * little less work than the steel: 1/40² of a plate's depth at most.
 */
function leastSpareWork(
	list: readonly Box[],
	{ gross: { centroid, height, width } }: PreparedSection,
	p: InteractionPoint
): number {
	const n = 40;
	const reach = Math.max(height, width) / 2;
	const cells = list.flatMap((box) =>
		Array.from({ length: n * n }, (_, i) => ({
			y: box.left + (((i % n) + 0.5) / n) * box.width - centroid.y,
			z: box.bottom + ((Math.floor(i / n) + 0.5) / n) * box.height - centroid.z,
			area: (box.width * box.height) / (n * n),
			fy: box.fy,
			fyc: box.fyc
		}))
	);
	const spare = (turn: number, tilt: number) => {
		const e0 = Math.sin(tilt);
		const ky = (Math.cos(tilt) * Math.cos(turn)) / reach;
		const kz = (Math.cos(tilt) * Math.sin(turn)) / reach;
		let work = 0;
		for (const cell of cells) {
			const strain = e0 - ky * cell.z + kz * cell.y;
			work += cell.area * (strain > 0 ? cell.fy * strain : -cell.fyc * strain);
		}
		return 1 - (e0 * p.N * 1e3 + ky * p.My * 1e6 + kz * p.Mz * 1e6) / work;
	};
	let best = { spare: Infinity, turn: 0, tilt: 0 };
	const tried = (turn: number, tilt: number) => {
		const own = spare(turn, tilt);
		const better = own < best.spare;
		if (better) best = { spare: own, turn, tilt };
		return better;
	};
	for (let i = 0; i < 48; i++)
		for (let j = 0; j < 24; j++)
			tried((i * Math.PI) / 24, ((j + 0.5) * Math.PI) / 24 - Math.PI / 2);
	const ways = [-1, 0, 1].flatMap((a) => [-1, 0, 1].map((b) => [a, b] as const));
	for (let step = 0.1; step > 1e-5; step /= 2) {
		let from = best;
		while (ways.some(([a, b]) => tried(from.turn + a * step, from.tilt + b * step))) from = best;
	}
	return best.spare;
}
