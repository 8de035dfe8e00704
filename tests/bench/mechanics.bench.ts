/**
 * The mechanics at their dearest, each against a stated baseline in the same run: a plain analysis, one
 * plain state, or equal strips over the depth that come within 1e-3 of the exact moment.
 */
import { frameAt } from '../../src/lib/engine/geometry/frame';
import { profileOf, widthAt } from '../../src/lib/engine/geometry/profile';
import { historyOf } from '../../src/lib/engine/response/history/history';
import { bendingFrom } from '../../src/lib/engine/response/history/history-bending';
import { interactionCurve } from '../../src/lib/engine/response/interaction';
import { bending } from '../../src/lib/engine/response/respond';
import { analyse } from '../../src/lib/engine/rules/analyse';
import { plateStretches } from '../../src/lib/engine/section/plates/stretches';
import type { PreparedSection } from '../../src/lib/engine/section/prepared';
import { numericalTorsion } from '../../src/lib/engine/section/torsion/numerical';
import { fortyPlates, hybridGirder, ipe300, prepared } from './sections';
import { ms, printTable, timed } from './table';

const path = { axisAngle: 0, transverse: 'moment-zero', N: 0 } as const;
const rolled = prepared(ipe300);
const girder = prepared(hybridGirder);
const plates = prepared(fortyPlates);

/** The same object would answer from what it has kept. */
const fresh = (section: PreparedSection): PreparedSection => ({ ...section });
const bent = (section: PreparedSection, N = 0) => bending(fresh(section), { ...path, N });

const analysis = timed(() => analyse(fresh(rolled)), { batch: 20 }).median;
const plainState = timed(() => bent(rolled).atCurvature(0.01), { batch: 20 }).median;
const [ofAnalysis, ofState] = ['a plain analysis', 'bending prepared and one plain state'];

/** Twelve straight lines each way, rounded like stainless steel. */
const points = Array.from({ length: 12 }, (_, i) => {
	const strain = 0.001 * (i + 1) ** 1.4;
	return [strain, 400 * (1 - Math.exp(-strain * 500))] as const;
});
const lines = prepared({
	...ipe300,
	grade: { fy: 300, law: { type: 'curve', tension: points, beyond: 'flat' } }
});
const curvatures = Array.from({ length: 200 }, (_, i) => (i + 1) * 5e-4);

function stress(strain: number): number {
	const size = Math.abs(strain);
	let [e0, s0] = [0, 0];
	for (const [e1, s1] of points) {
		if (size <= e1) return Math.sign(strain) * (s0 + ((size - e0) / (e1 - e0)) * (s1 - s0));
		[e0, s0] = [e1, s1];
	}
	return Math.sign(strain) * s0;
}

function stripMoment(levels: readonly number[], areas: readonly number[], curvature: number) {
	let sum = 0;
	for (let i = 0; i < levels.length; i++)
		sum += stress(curvature * 1e-3 * levels[i]!) * areas[i]! * levels[i]!;
	return sum * 1e-6;
}

function stripsOf(count: number) {
	const loops = lines.parts.flatMap(({ region }) => region.loops);
	const profile = profileOf(loops, frameAt(lines.gross.centroid, 0));
	const thick = (profile.high - profile.low) / count;
	const levels = Array.from({ length: count }, (_, i) => profile.low + (i + 0.5) * thick);
	return { levels, areas: levels.map((level) => widthAt(profile, level) * thick) };
}

/** So many strips that the worst moment of the curve is within 1e-3. */
function stripsWithin() {
	const exact = bent(lines);
	for (let count = 128; count < 1e5; count *= 2) {
		const made = stripsOf(count);
		const within = curvatures.every((k) => {
			const moment = exact.momentAt(k);
			return (
				moment === null || Math.abs(stripMoment(made.levels, made.areas, k) / moment - 1) < 1e-3
			);
		});
		if (within) return made;
	}
	throw new Error('equal strips do not come near the exact moments');
}
const strips = stripsWithin();
const stripCurve = timed(() => curvatures.map((k) => stripMoment(strips.levels, strips.areas, k)), {
	rounds: 8
}).median;

function stressed(section: PreparedSection) {
	const history = historyOf(section, 'rolled');
	if (!history.ok) throw new Error(history.error.message);
	return history.value;
}

function reversed(section: PreparedSection) {
	let history = stressed(section);
	for (const curvatureRatio of [1.5, -1.5]) {
		const next = bendingFrom(history, path).after({ curvatureRatio });
		if (next === null) throw new Error('a reversal is not reached');
		history = next;
	}
	return history;
}
const [locked, turned] = [stressed(rolled), reversed(rolled)];

const row = (
	[what, run]: readonly [string, () => unknown],
	[baseline, base]: readonly [string, number],
	aim = '',
	batch = 1
) => {
	const { median, p95 } = timed(() => void run(), { batch, rounds: 30 });
	const ratio = (median / base).toPrecision(2);
	return [what, ms(median), ms(p95), `${ratio}× ${baseline}`, aim];
};
const perAnalysis = [ofAnalysis, analysis] as const;
const perState = [ofState, plainState] as const;
const interaction = (section: PreparedSection, plane: 'N-My' | 'My-Mz') => () =>
	interactionCurve(fresh(section), { limit: 'plastic', plane });

printTable(
	`Mechanics; plain analysis of IPE 300 ${ms(analysis)}, bending prepared and one state ${ms(plainState)}`,
	['what', 'median', '95th', 'of its baseline', 'aim'],
	[
		row(['interaction N–My, 72 points, IPE', interaction(rolled, 'N-My')], perState, '< 2 ms'),
		row(['interaction My–Mz, 72 points, IPE', interaction(rolled, 'My-Mz')], perState, '< 2 ms'),
		row(['interaction N–My, hybrid girder', interaction(girder, 'N-My')], perState, '< 2 ms'),
		row(['interaction My–Mz, hybrid girder', interaction(girder, 'My-Mz')], perState, '< 2 ms'),
		row(
			[
				'state of given N and moment across two axes, IPE',
				() => bending(fresh(rolled), { ...path, axisAngle: 20, N: -200 }).atMoment(60)
			],
			perState
		),
		row(
			[
				'200-point curve, law of 12 lines',
				() => {
					const own = bent(lines);
					return curvatures.map((k) => own.momentAt(k));
				}
			],
			[`${strips.levels.length} strips`, stripCurve]
		),
		row(['numerical torsion, IPE', () => numericalTorsion(rolled)], perAnalysis, '< 150 ms'),
		row(['40 plates: numerical torsion', () => numericalTorsion(plates)], perAnalysis),
		row(['40 plates: prepare', () => prepared(fortyPlates)], perAnalysis, '< 2 ms'),
		row(['40 plates: stretches', () => plateStretches(fortyPlates)], perAnalysis),
		row(['40 plates: analyse', () => analyse(fresh(plates))], perAnalysis),
		row(['40 plates: one state', () => bent(plates).atCurvature(0.01)], perState),
		row(
			[
				'one state with residual stress',
				() => bendingFrom(locked, path).at({ curvatureRatio: 1.5 })
			],
			perState
		),
		row(
			[
				'one state after two reversals',
				() => bendingFrom(turned, path).at({ curvatureRatio: 1.2 })
			],
			perState
		)
	]
);
