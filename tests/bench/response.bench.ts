/**
 * One strain plane and a 200-point moment–curvature of a rolled I with root radii, against equal
 * strips over the depth (width at mid-strip, number doubled until the moment is within 1e-5 of the
 * exact one). Both are given their preparation: the strips their widths, the engine its profile.
 */
import { frameAt } from '../../src/lib/engine/geometry/frame';
import { profileOf, widthAt } from '../../src/lib/engine/geometry/profile';
import { bending } from '../../src/lib/engine/response/respond';
import { mechanicsOf } from '../../src/lib/engine/response/law-groups';
import { planeForces } from '../../src/lib/engine/response/plane-forces';
import { prepareSection } from '../../src/lib/engine/section/prepare';
import { ms, printTable, timed } from './table';

const prepared = prepareSection({
	kind: 'i',
	h: 300,
	b: 150,
	tw: 7.1,
	tf: 10.7,
	r: 15,
	fabrication: 'rolled',
	grade: 'S355'
});
if (!prepared.ok) throw new Error(JSON.stringify(prepared.error));
const section = prepared.value;
const mechanics = mechanicsOf(section);
const profiles = mechanics.profiles(0);
const bent = bending(section, { axisAngle: 0, transverse: 'moment-zero', N: 0 });
const unit = bent.firstYield.curvature!;
const { fy, E } = section.parts[0]!.material;

/** Equal strips: levels and areas. */
function strips(count: number) {
	const loops = section.parts.flatMap(({ region }) => region.loops);
	const profile = profileOf(loops, frameAt(section.gross.centroid, 0));
	const thick = (profile.high - profile.low) / count;
	const levels = new Float64Array(count);
	const areas = new Float64Array(count);
	for (let i = 0; i < count; i++) {
		levels[i] = profile.low + (i + 0.5) * thick;
		areas[i] = widthAt(profile, levels[i]!) * thick;
	}
	return { levels, areas };
}

function stripMoment({ levels, areas }: ReturnType<typeof strips>, curvature: number): number {
	let moment = 0;
	for (let i = 0; i < levels.length; i++) {
		const elastic = -E * curvature * levels[i]!;
		const stress = elastic > fy ? fy : elastic < -fy ? -fy : elastic;
		moment -= stress * areas[i]! * levels[i]!;
	}
	return moment / 1e6;
}

function stripsWithin(curvatures: readonly number[]) {
	const exact = curvatures.map((k) => bent.momentAt(k)!);
	for (let count = 64; ; count *= 2) {
		const made = strips(count);
		const worst = Math.max(
			...curvatures.map((k, i) => Math.abs(stripMoment(made, k / 1e3) / exact[i]! - 1))
		);
		if (worst < 1e-5) return made;
	}
}

const plane = 2 * unit;
const planeStrips = stripsWithin([plane]);
const curve = Array.from({ length: 200 }, (_, i) => ((i + 1) / 20) * unit);
const curveStrips = stripsWithin(curve);

let sink = 0;
const exactPlane = timed(
	() => (sink += planeForces(mechanics.groups, profiles, 0, plane / 1e3).M),
	{
		batch: 2000
	}
);
const roughPlane = timed(() => (sink += stripMoment(planeStrips, plane / 1e3)), { batch: 20 });
const exactCurve = timed(
	() => {
		const fresh = bending(section, { axisAngle: 0, transverse: 'moment-zero', N: 0 });
		for (const k of curve) sink += fresh.momentAt(k)!;
	},
	{ batch: 5 }
);
const roughCurve = timed(() => {
	for (const k of curve) sink += stripMoment(curveStrips, k / 1e3);
});
const report = timed(() => (sink += bent.atCurvature(plane).moment!), { batch: 200 });
if (!Number.isFinite(sink)) throw new Error('a moment is missing');

printTable(
	'Response of IPE 300, S355 (median)',
	['what', 'exact', 'equal strips', 'strips needed', 'ratio'],
	[
		[
			'one strain plane',
			ms(exactPlane.median),
			ms(roughPlane.median),
			String(planeStrips.levels.length),
			`${(roughPlane.median / exactPlane.median).toFixed(0)}×`
		],
		[
			'200-point moment–curvature, from the prepared section',
			ms(exactCurve.median),
			ms(roughCurve.median),
			String(curveStrips.levels.length),
			`${(roughCurve.median / exactCurve.median).toFixed(0)}×`
		],
		['one whole state (resultants, neutral axis, yielded share)', ms(report.median), '', '', '']
	]
);
