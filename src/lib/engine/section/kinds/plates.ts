import { arrangementOf } from '../../geometry/arrangement';
import { closedLoop } from '../../geometry/loops';
import { connectedPieces } from '../../geometry/pieces';
import { cornersOf, plateGap, type TurnedRectangle } from '../../geometry/plate-contact';
import { mergedLoops } from '../../geometry/trace';
import { fail, ok, type Issue, type Note } from '../../result';
import { contactTolerance } from '../contact-tolerance';
import type { Plate, PlatesSection } from '../definition';
import type { ShapeResult } from '../shape';
import { millimetres } from '../sizes';
import { joinIssues, plateIssues } from './plate-fields';

/** Free plates: rectangles placed and turned freely, joined where they touch. */
export function platesShape(definition: PlatesSection): ShapeResult {
	const issues = plateIssues(definition);
	if (issues.length > 0) return fail(issues);
	const { plates } = definition;
	const boxes = plates.map(turnedRectangle);
	const tolerance = toleranceOf(plates, boxes);
	const placing = [
		...overlapIssues(plates, boxes, tolerance),
		...connectionIssues(definition, boxes, tolerance)
	];
	if (placing.length > 0) return fail(placing);
	const rings = boxes.map((box, owner) => ({ points: cornersOf(box), owner }));
	return ok({
		parts: plates.map((plate, i) => ({
			name: plate.name,
			region: { loops: [closedLoop(rings[i]!.points)] },
			thickness: Math.min(plate.width, plate.thickness),
			...(plate.grade === undefined ? {} : { grade: plate.grade })
		})),
		contours: mergedLoops(arrangementOf(rings, tolerance)),
		torsion: { torsionConstant: null, warpingConstant: null, shearCentre: null },
		oneThickness: false,
		notes: definition.tied ? tiedNotes(boxes, tolerance) : []
	});
}

function turnedRectangle({ width, thickness, y, z, angle }: Plate): TurnedRectangle {
	return {
		centre: { y, z },
		along: direction(angle),
		halfWidth: width / 2,
		halfThickness: thickness / 2
	};
}

/** Unit vector of an angle in degrees; exact at quarter turns. */
function direction(degrees: number) {
	const turned = ((degrees % 360) + 360) % 360;
	const quarters = [
		{ y: 1, z: 0 },
		{ y: 0, z: 1 },
		{ y: -1, z: 0 },
		{ y: 0, z: -1 }
	];
	const radians = (turned * Math.PI) / 180;
	return quarters[turned / 90] ?? { y: Math.cos(radians), z: Math.sin(radians) };
}

const toleranceOf = (plates: readonly Plate[], boxes: readonly TurnedRectangle[]): number =>
	contactTolerance(
		boxes.flatMap(cornersOf),
		Math.min(...plates.map(({ width, thickness }) => Math.min(width, thickness)))
	);

function* pairs(count: number): Generator<readonly [number, number]> {
	for (let i = 0; i < count; i++) for (let j = i + 1; j < count; j++) yield [i, j];
}

function overlapIssues(
	plates: readonly Plate[],
	boxes: readonly TurnedRectangle[],
	tolerance: number
): Issue[] {
	return [...pairs(plates.length)].flatMap(([i, j]) => {
		const gap = plateGap(boxes[i]!, boxes[j]!);
		if (gap >= -tolerance) return [];
		const message = `Plates “${plates[i]!.name}” and “${plates[j]!.name}” overlap by ${millimetres(-gap)}.`;
		return [{ path: `plates.${j}`, message }];
	});
}

function connectionIssues(
	definition: PlatesSection,
	boxes: readonly TurnedRectangle[],
	tolerance: number
): Issue[] {
	const { plates, joins, tied } = definition;
	const touches = ([i, j]: readonly [number, number]) =>
		plateGap(boxes[i]!, boxes[j]!) <= tolerance;
	if (tied) return [];
	const touching = [...pairs(plates.length)].filter(touches);
	const named = joins?.map(({ a, b }) => [indexOf(plates, a), indexOf(plates, b)] as const);
	const issues = joins ? joinIssues(definition, touching) : [];
	const pieces = connectedPieces(plates.length, named ?? touching);
	const [first, second] = pieces;
	if (issues.length > 0 || !first || !second) return issues;
	return [apartIssue(plates, boxes, first, pieces.slice(1), joins !== undefined)];
}

const indexOf = (plates: readonly Plate[], name: string): number =>
	plates.findIndex((plate) => plate.name === name);

function apartIssue(
	plates: readonly Plate[],
	boxes: readonly TurnedRectangle[],
	piece: readonly number[],
	others: readonly (readonly number[])[],
	joined: boolean
): Issue {
	const gapTo = (other: readonly number[]) =>
		Math.min(...piece.flatMap((i) => other.map((j) => plateGap(boxes[i]!, boxes[j]!))));
	const nearest = [...others].sort((a, b) => gapTo(a) - gapTo(b))[0]!;
	const names = (list: readonly number[]) => list.map((i) => `“${plates[i]!.name}”`).join(', ');
	const gap = Math.max(gapTo(nearest), 0);
	const why = joined && gap === 0 ? 'no join connects them' : `the gap is ${millimetres(gap)}`;
	return {
		path: `plates.${nearest[0]}`,
		message: `Plates ${names(piece)} and ${names(nearest)} are not connected: ${why}. Join them, or set tied when they act together by intent.`
	};
}

function tiedNotes(boxes: readonly TurnedRectangle[], tolerance: number): Note[] {
	const touching = [...pairs(boxes.length)].filter(
		([i, j]) => plateGap(boxes[i]!, boxes[j]!) <= tolerance
	);
	if (connectedPieces(boxes.length, touching).length < 2) return [];
	const message =
		'Separate pieces are taken to act together because the definition says they are tied; what ties them is not checked.';
	return [{ code: 'pieces-tied-by-intent', message }];
}
