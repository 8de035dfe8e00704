import type { HistoryPicture } from '$lib/engine/response/history/history-picture';
import type { DepthPart, PartStress, YieldedBand } from './stress-profile';

/** Levels nearer than this share of the depth are the same edge. */
const sameLevel = 1e-6;

/**
 * Stress over the depth of every part as its history left it: one entry for each stretch of steel that
 * the cut through the part meets, from its top down.
 */
export function historyStresses(
	parts: readonly DepthPart[],
	{ lines, yielded }: Pick<HistoryPicture, 'lines' | 'yielded'>
): PartStress[] {
	const levels = parts.flatMap(({ top, bottom }) => [top, bottom]);
	const size = Math.max(...levels) - Math.min(...levels);
	const snapped = (level: number) =>
		levels.find((edge) => Math.abs(edge - level) < sameLevel * size) ?? level;
	return lines.flatMap(({ part: name, points }) => {
		const part = parts.find((one) => one.name === name);
		if (!part || points.length < 2) return [];
		const knots = points
			.map(({ distance, stress }) => ({ depth: snapped(distance), stress }))
			.reverse();
		const [top, bottom] = [knots[0]!.depth, knots.at(-1)!.depth];
		const bands = yielded
			.filter((one) => one.part === name && one.to > bottom && one.from < top)
			.map(({ sense, from, to }) => ({ sense, top: snapped(to), bottom: snapped(from) }));
		return [{ part: { ...part, top, bottom }, knots, yielded: joinedBands(bands), past: true }];
	});
}

/** Bands that touch, of one sense, as one. */
function joinedBands(bands: readonly YieldedBand[]): YieldedBand[] {
	const out: YieldedBand[] = [];
	for (const band of [...bands].sort((a, b) => b.top - a.top)) {
		const last = out.at(-1);
		const near = sameLevel * Math.max(Math.abs(band.top), Math.abs(band.bottom));
		if (last && last.sense === band.sense && last.bottom - band.top <= near)
			out[out.length - 1] = { ...last, bottom: Math.min(last.bottom, band.bottom) };
		else out.push(band);
	}
	return out;
}

/** Levels at which the stress turns from rising to falling over the depth: where a figure is worth its place. */
export function stressTurns(stresses: readonly PartStress[]): number[] {
	return stresses.flatMap(({ knots }) =>
		knots.slice(1, -1).flatMap(({ depth, stress }, at) => {
			const [before, after] = [knots[at]!.stress, knots[at + 2]!.stress];
			return (stress - before) * (after - stress) < 0 ? [depth] : [];
		})
	);
}
