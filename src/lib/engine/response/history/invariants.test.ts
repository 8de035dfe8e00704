import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Plate } from '../../section/definition';
import { prepareSection } from '../../section/prepare';
import type { BendingPath, ResponseState } from '../state';
import { historyOf, type History } from './history';
import { bendingFrom } from './history-bending';

/** An I of plates: unequal flanges, joined evenly, so that the pattern of welding covers it. */
interface Recipe {
	top: readonly [number, number];
	web: readonly [number, number];
	foot: readonly [number, number];
}

/** Where the plates stand: turned about the origin (degrees), mirrored in z, moved, scaled. */
interface Place {
	turn?: number;
	mirror?: boolean;
	move?: number;
	scale?: number;
}

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const recipe: fc.Arbitrary<Recipe> = fc.record({
	top: fc.tuple(between(80, 300), between(8, 40)),
	web: fc.tuple(between(5, 20), between(150, 700)),
	foot: fc.tuple(between(80, 300), between(8, 40))
});

function historyAt({ top, web, foot }: Recipe, { turn = 0, mirror, move = 0, scale = 1 }: Place) {
	const radians = (turn * Math.PI) / 180;
	const [c, s] = [Math.cos(radians), Math.sin(radians)];
	const flip = mirror ? -1 : 1;
	const plate = (
		name: string,
		width: number,
		thickness: number,
		z: number,
		angle: number
	): Plate => ({
		...{ name, width: width * scale, thickness: thickness * scale, angle: angle + turn },
		y: -s * z * flip * scale + move,
		z: c * z * flip * scale - move / 3
	});
	const section = prepareSection({
		...{ kind: 'plates', grade: 355 },
		plates: [
			plate('web', web[1], web[0], 0, 90),
			plate('top', top[0], top[1], web[1] / 2 + top[1] / 2, 0),
			plate('foot', foot[0], foot[1], -web[1] / 2 - foot[1] / 2, 0)
		]
	});
	if (!section.ok) throw new Error(section.error[0]?.message);
	const history = historyOf(section.value, 'welded');
	if (!history.ok) throw new Error(history.error.message);
	return history.value;
}

interface Asked {
	axisAngle: number;
	transverse: 'moment-zero' | 'curvature-zero';
	share: number;
	curvatures: readonly [number, number];
}

const asked: fc.Arbitrary<Asked> = fc.record({
	axisAngle: between(-180, 180),
	transverse: fc.constantFrom('moment-zero' as const, 'curvature-zero' as const),
	share: between(-0.4, 0.4),
	curvatures: fc.tuple(between(-6, 6), between(-6, 6))
});

/** Bends there and back and releases; curvatures in multiples of fy/(E · size). */
function bentAndReleased(history: History, { axisAngle, transverse, share, curvatures }: Asked) {
	const { squash } = history.mechanics;
	const path: BendingPath = { axisAngle, transverse, N: (share * squash) / 1e3 };
	const unit = (355 / 210_000 / sizeOf(history)) * 1e3;
	let present = history;
	const states: ResponseState[] = [];
	for (const ratio of curvatures) {
		const bent = bendingFrom(present, path);
		states.push(bent.atCurvature(ratio * unit));
		present = bent.after({ curvature: ratio * unit })!;
	}
	const bent = bendingFrom(present, path);
	states.push(bent.atMoment(0));
	return { states, path, unit, after: bent.after({ moment: 0 })! };
}

/** Largest radius of gyration, mm: the same however the section is turned. */
const sizeOf = ({ section: { gross } }: History) => Math.sqrt(gross.secondMomentU / gross.area);

const momentUnit = (history: History) => (history.mechanics.squash * sizeOf(history)) / 1e6;

function expectSame(a: History, aAsked: Asked, b: History, bAsked: Asked) {
	const [left, right] = [bentAndReleased(a, aAsked), bentAndReleased(b, bAsked)];
	left.states.forEach((state, i) => {
		const other = right.states[i]!;
		expect(other.converged).toBe(state.converged);
		if (!state.converged) return;
		expect(other.moment! / momentUnit(b)).toBeCloseTo(state.moment! / momentUnit(a), 8);
		expect(other.curvature! / right.unit).toBeCloseTo(state.curvature! / left.unit, 6);
		expect(other.extremes!.stressMax).toBeCloseTo(state.extremes!.stressMax, 4);
		expect(other.extremes!.stressMin).toBeCloseTo(state.extremes!.stressMin, 4);
	});
}

describe('a welded section bent about any axis, back and released', () => {
	it('is in equilibrium at every state, and its two resultants add up to N and the moment', () => {
		fc.assert(
			fc.property(recipe, asked, (r, a) => {
				const history = historyAt(r, {});
				const { squash, reach } = history.mechanics;
				const { states, path } = bentAndReleased(history, a);
				for (const state of states) {
					expect(state.converged).toBe(true);
					expect((Math.abs(state.N! - path.N) * 1e3) / squash).toBeLessThan(1e-9);
					const sum = (state.compression?.force ?? 0) + (state.tension?.force ?? 0);
					expect((Math.abs(sum - path.N) * 1e3) / squash).toBeLessThan(1e-9);
					const { centroid } = history.section.gross;
					const My = [state.compression, state.tension].reduce(
						(total, one) => total - (one ? (one.force * (one.z - centroid.z)) / 1e3 : 0),
						0
					);
					expect((Math.abs(My - state.My!) * 1e6) / squash / reach).toBeLessThan(1e-9);
				}
				const released = states.at(-1)!;
				expect((Math.abs(released.moment!) * 1e6) / squash / reach).toBeLessThan(1e-9);
				const across =
					released.Mz! * Math.cos((a.axisAngle * Math.PI) / 180) -
					released.My! * Math.sin((a.axisAngle * Math.PI) / 180);
				if (a.transverse === 'moment-zero')
					expect((Math.abs(across) * 1e6) / squash / reach).toBeLessThan(1e-9);
				expect(released.extremes!.stressMax).toBeLessThan(355 * (1 + 1e-9));
				expect(released.extremes!.stressMin).toBeGreaterThan(-355 * (1 + 1e-9));
			}),
			{ numRuns: 60 }
		);
	});

	it('does not change when it is turned with its axis', () => {
		fc.assert(
			fc.property(recipe, asked, between(-170, 170), (r, a, turn) => {
				const turned = { ...a, axisAngle: a.axisAngle + turn };
				expectSame(historyAt(r, {}), a, historyAt(r, { turn }), turned);
			}),
			{ numRuns: 25 }
		);
	});

	it('does not change when it is moved or scaled', () => {
		fc.assert(
			fc.property(
				recipe,
				asked,
				between(-1e4, 1e4),
				fc.constantFrom(1e-2, 30),
				(r, a, move, scale) => {
					expectSame(historyAt(r, {}), a, historyAt(r, { move }), a);
					expectSame(historyAt(r, {}), a, historyAt(r, { scale }), a);
				}
			),
			{ numRuns: 15 }
		);
	});

	it('mirrors when it is mirrored', () => {
		fc.assert(
			fc.property(recipe, asked, (r, a) => {
				const mirrored = { ...a, axisAngle: 180 - a.axisAngle };
				expectSame(historyAt(r, {}), a, historyAt(r, { mirror: true }), mirrored);
			}),
			{ numRuns: 25 }
		);
	});
});
