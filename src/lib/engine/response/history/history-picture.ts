import type { Edge, Loop } from '../../geometry/boundary';
import { extentAcross } from '../../geometry/bounds';
import { chainedLoops } from '../../geometry/chained';
import { stretchesAt, type Stretch } from '../../geometry/slice';
import { frameAt, pointIn } from '../../geometry/frame';
import type { StressLine } from '../yield-fronts';
import { edgesAbout } from '../../geometry/edges-about';
import type { Cell } from './cell';
import { stressField } from './cut-cells';
import type { History } from './history';
import { yieldSense } from './history-report';
import type { LinearField } from './linear-field';

/** Steel of one part that stands at its yield strength; loops in the definition's own coordinates. */
export interface YieldedArea {
	part: string;
	sense: 'tension' | 'compression';
	loops: Loop[];
}

/** Steel at its yield strength along the cut of one part, from the lower to the upper distance, mm. */
export interface YieldedStretch {
	part: string;
	sense: 'tension' | 'compression';
	from: number;
	to: number;
}

/** Stress in the present state of a history, seen along the normal of an axis. */
export interface HistoryPicture {
	/** Direction of the axis, degrees from y; the normal points to its left (up, for 0). */
	angle: number;
	/** One line for every stretch of steel that a cut along the normal meets; a jump of stress is two points at one distance. */
	lines: StressLine[];
	yielded: YieldedStretch[];
	areas: YieldedArea[];
}

/**
 * What a screen draws of a history: the stress of every part along one cut, and the steel at yield.
 * The cut runs along the normal of the neutral axis (or of an axis at `angle` degrees) through the middle
 * of each part, or through its wall where that meets more steel. Distances from the gross centroid, mm.
 */
export function historyPicture(
	history: History,
	angle = directionOf(history.strain)
): HistoryPicture {
	const { section, cells, layers, strain } = history;
	const ofPart = section.parts.map((_, part) => cells.filter((cell) => cell.part === part));
	const cuts = section.parts.map((_, part) =>
		partCut(history, part, ofPart[part]!, (angle * Math.PI) / 180)
	);
	return {
		angle,
		lines: cuts.flatMap(({ lines }, part) =>
			lines.map((points) => ({ part: section.parts[part]!.name, points }))
		),
		yielded: cuts.flatMap(({ yielded }) => yielded),
		areas: cells.flatMap((cell): YieldedArea[] => {
			const sense = yieldSense(cell, layers[cell.part]![0]!, strain);
			if (!sense) return [];
			const { y, z } = section.gross.centroid;
			const edges = edgesAbout([cell.edges], { y: -y, z: -z });
			return [{ part: section.parts[cell.part]!.name, sense, loops: chainedLoops(edges) }];
		})
	};
}

/** Direction of the neutral axis of a strain plane, degrees in (−90, 90]; 0 without curvature. */
function directionOf({ y, z }: LinearField): number {
	if (y === 0 && z === 0) return 0;
	const degrees = (Math.atan2(y, -z) * 180) / Math.PI;
	return degrees - 180 * Math.ceil((degrees - 90) / 180);
}

function partCut({ section, layers, strain }: History, part: number, cells: Cell[], angle: number) {
	const { name, region, thickness } = section.parts[part]!;
	const edges = edgesAbout(region.loops, section.gross.centroid);
	const along = cutThrough(edges, thickness, angle);
	const frame = frameAt({ y: 0, z: 0 }, angle);
	const yielded: YieldedStretch[] = [];
	const found = cells.flatMap((cell) => {
		const stress = stressField(cell, layers[part]!, strain);
		const sense = yieldSense(cell, layers[part]![0]!, strain);
		const stretches = stretchesAt(cell.edges, angle, along);
		if (sense) yielded.push(...stretches.map(([from, to]) => ({ part: name, sense, from, to })));
		return stretches.map((stretch) =>
			stretch.map((distance) => {
				const at = pointIn(frame, along, distance);
				return { distance, strain: valueAt(strain, at), stress: valueAt(stress, at) };
			})
		);
	});
	return { lines: joined(found.sort((a, b) => a[0]!.distance - b[0]!.distance)), yielded };
}

const valueAt = ({ c, y, z }: LinearField, at: { y: number; z: number }): number =>
	c + y * at.y + z * at.z;

/** Where a part is cut: through its middle, or half its thickness in from its side, whichever meets more steel. */
function cutThrough(edges: readonly Edge[], thickness: number, angle: number): number {
	const { low, high } = extentAcross([edges], frameAt({ y: 0, z: 0 }, angle - Math.PI / 2));
	const middle = (low + high) / 2;
	const wall = Math.min(low + thickness / 2, middle);
	const steel = (along: number) =>
		stretchesAt(edges, angle, along).reduce((sum, [from, to]: Stretch) => sum + to - from, 0);
	return steel(wall) > steel(middle) * (1 + 1e-9) ? wall : middle;
}

type Points = StressLine['points'];

/** Neighbouring stretches as one line; points in which nothing changes are left out. */
function joined(stretches: readonly Points[]): Points[] {
	const lines: Points[] = [];
	for (const [from, to] of stretches as readonly [Points[0], Points[0]][]) {
		const line = lines.at(-1);
		const end = line?.at(-1);
		const same = 1e-9 * Math.max(Math.abs(from!.distance), Math.abs(to!.distance));
		if (!line || !end || from!.distance - end.distance > same) lines.push([from!, to!]);
		else if (Math.abs(from!.stress - end.stress) > 1e-6) line.push(from!, to!);
		else line.push(to!);
	}
	return lines;
}
