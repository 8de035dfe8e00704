import { describe, expect, it } from 'vitest';
import { part, rectangle, sectionOf, steel } from '../test-sections';
import type { BendingPath, ResponseState } from '../state';
import { cycleStates, type Reversals } from './cycle';
import { historyOf, type History } from './history';
import { bendingFrom } from './history-bending';

/*
 * Independent calculation: the section in 20,000 strips, each with its own plastic strain and back stress,
 * returned to its yield surface one strip at a time (kinematic hardening, H = E·Eh/(E − Eh)).
 */
interface Strip {
	z: number;
	area: number;
	plastic: number;
	back: number;
}

const [E, fy, Eh] = [210_000, 300, 3000];

function strips(): Strip[] {
	const pieces = [
		{ from: 0, to: 20, width: 240 },
		{ from: 20, to: 320, width: 10 },
		{ from: 320, to: 335, width: 180 }
	];
	return pieces.flatMap(({ from, to, width }) => {
		const count = Math.round((20_000 * (to - from)) / 335);
		const depth = (to - from) / count;
		return Array.from({ length: count }, (_, i) => ({
			...{ z: from + (i + 0.5) * depth, area: width * depth, plastic: 0, back: 0 }
		}));
	});
}

const hardening = (slope: number) => (E * slope) / (E - slope);

function returned({ plastic, back }: Strip, strain: number, H: number) {
	const trial = E * (strain - plastic);
	const over = Math.abs(trial - back) - fy;
	if (over <= 0) return { stress: trial, plastic, back, dissipated: 0 };
	const slip = (Math.sign(trial - back) * over) / (E + H);
	return {
		stress: trial - E * slip,
		plastic: plastic + slip,
		back: back + H * slip,
		dissipated: fy * Math.abs(slip)
	};
}

function stripSection(slope: number) {
	const all = strips();
	const H = hardening(slope);
	const area = all.reduce((sum, strip) => sum + strip.area, 0);
	const centre = all.reduce((sum, { z, area: a }) => sum + z * a, 0) / area;
	const force = (e0: number, curvature: number) =>
		all.reduce(
			(sum, s) => sum + s.area * returned(s, e0 - curvature * (s.z - centre), H).stress,
			0
		);
	let dissipated = 0;
	return {
		/** Bends on to a curvature (1/mm) at N = 0, in one step; N·mm, N/mm². */
		bend(curvature: number) {
			let [low, high] = [-0.05, 0.05];
			while (high - low > 1e-14) {
				const middle = (low + high) / 2;
				if (force(middle, curvature) < 0) low = middle;
				else high = middle;
			}
			const e0 = (low + high) / 2;
			let moment = 0;
			const stresses = all.map((s) => {
				const after = returned(s, e0 - curvature * (s.z - centre), H);
				Object.assign(s, { plastic: after.plastic, back: after.back });
				dissipated += after.dissipated * s.area;
				moment -= after.stress * s.area * (s.z - centre);
				return after.stress;
			});
			return { moment, stresses, dissipated };
		}
	};
}

const lopsided = (law: { type: 'bilinear'; Eh: number }) =>
	sectionOf(
		part('bottom', rectangle(-120, 0, 240, 20), steel(fy, { E, law })),
		part('web', rectangle(-5, 20, 10, 300), steel(fy, { E, law })),
		part('top', rectangle(-90, 320, 180, 15), steel(fy, { E, law }))
	);

const straight: BendingPath = { axisAngle: 0, transverse: 'moment-zero', N: 0 };

function fresh(slope: number): History {
	const history = historyOf(lopsided({ type: 'bilinear', Eh: slope }));
	if (!history.ok) throw new Error(history.error.code);
	return history.value;
}

function legsOf(history: History, reversals: Reversals, points: number) {
	const states: ResponseState[] = [];
	const steps = cycleStates(history, straight, reversals, points);
	let step = steps.next();
	for (; !step.done; step = steps.next()) states.push(step.value);
	return { states, left: step.value };
}

describe('a cycle of a section with unequal flanges', () => {
	const reversals = [4e-5, -3e-5, 2e-5, -5e-5];

	it.each([0, Eh])('agrees with 20,000 strips at every reversal (hardening slope %d)', (slope) => {
		const { states } = legsOf(fresh(slope), { curvatures: reversals.map((k) => k * 1e3) }, 1);
		const independent = stripSection(slope);
		reversals.forEach((curvature, i) => {
			const { moment, stresses } = independent.bend(curvature);
			expect(states[i]!.moment! / (moment * 1e-6)).toBeCloseTo(1, 6);
			const most = stresses.reduce((a, c) => Math.max(a, c), -Infinity);
			// the strips stop half a strip short of the surface
			expect(Math.abs(states[i]!.extremes!.stressMax / most - 1)).toBeLessThan(1e-4);
		});
	});

	it('leaves the residual stresses of the strips when it is released', () => {
		const { left } = legsOf(fresh(Eh), { curvatures: [40, -30].map((k) => k / 1e3) }, 1);
		const bent = bendingFrom(left!, straight);
		const released = bent.atMoment(0);
		const independent = stripSection(Eh);
		independent.bend(4e-5);
		independent.bend(-3e-5);
		const { moment, stresses } = independent.bend(released.curvature! * 1e-3);
		expect(Math.abs(moment * 1e-6)).toBeLessThan(1e-6 * 500);
		const [first, last] = [stresses[0]!, stresses.at(-1)!];
		const after = bent.after({ moment: 0 })!;
		const own = (z: number) => stressAtLevel(after, z);
		expect(Math.abs(own(335 / 20_000 / 2) - first)).toBeLessThan(1e-6 * fy);
		expect(Math.abs(own(335 - 335 / 20_000 / 2) - last)).toBeLessThan(1e-6 * fy);
	});

	it('does as much work around a closed loop as its fibres dissipate', () => {
		const history = legsOf(fresh(0), { curvatures: [0.05, -0.05, 0.05] }, 1).left!;
		const points = 1500;
		let work = 0;
		let present = history;
		for (const [from, to] of [
			[0.05, -0.05],
			[-0.05, 0.05]
		] as const) {
			const bent = bendingFrom(present, straight);
			const step = (to - from) / points;
			for (let i = 0; i < points; i++) {
				// Simpson's rule
				const [a, b, c] = [0, 0.5, 1].map((x) => bent.momentAt(from + (i + x) * step)!);
				work += (step * (a! + 4 * b! + c!)) / 6;
			}
			present = bent.after({ curvature: to })!;
		}
		const independent = stripSection(0);
		for (const curvature of [5e-5, -5e-5]) independent.bend(curvature);
		const { dissipated: before } = independent.bend(5e-5);
		independent.bend(-5e-5);
		const { dissipated } = independent.bend(5e-5);
		// kNm/m = kN = 1000 N·mm/mm
		expect((work * 1e3) / (dissipated - before)).toBeCloseTo(1, 6);
	});

	it('settles into a loop whose cells do not grow', () => {
		const turns = Array.from({ length: 40 }, (_, i) => (i % 2 === 0 ? 0.05 : -0.05));
		const few = legsOf(fresh(Eh), { curvatures: turns.slice(0, 6) }, 1).left!;
		const many = legsOf(fresh(Eh), { curvatures: turns }, 1).left!;
		expect(many.cells.length).toBeLessThan(few.cells.length + 10);
	});
});

/** Stress at a height of the section above, from the cells' own layers. */
function stressAtLevel({ section, cells, layers, strain }: History, z: number): number {
	const at = z - section.gross.centroid.z;
	const cell = cells.find(({ box }) => box.bottom <= at && at <= box.top)!;
	return layers[cell.part]!.reduce((sum, { modulus }, k) => {
		const own = cell.plastic[k]!;
		return sum + modulus * (strain.c - own.c + (strain.z - own.z) * at);
	}, 0);
}
