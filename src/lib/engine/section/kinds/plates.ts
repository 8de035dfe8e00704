import { arrangementOf } from '../../geometry/arrangement';
import { closedLoop } from '../../geometry/loops';
import { connectedPieces } from '../../geometry/pieces';
import { cornersOf } from '../../geometry/plate-contact';
import { mergedLoops } from '../../geometry/trace';
import { fail, ok, type Note } from '../../result';
import type { PlatesSection } from '../definition';
import { mendedIssues } from '../plates/mends';
import { placedPlates, type PlacedPlates } from '../plates/placing';
import { placingIssues } from '../plates/placing-issues';
import type { ShapeResult } from '../shape';
import { platesTorsion } from '../torsion/plates';
import { plateIssues } from './plate-fields';

/** Free plates: rectangles placed and turned freely, joined where they touch. */
export function platesShape(definition: PlatesSection): ShapeResult {
	const issues = plateIssues(definition);
	if (issues.length > 0) return fail(issues);
	const placed = placedPlates(definition.plates);
	const faults = placingIssues(definition, placed);
	if (faults.length > 0) return fail(mendedIssues(definition, placed, faults));
	const rings = placed.boxes.map((box, owner) => ({ points: cornersOf(box), owner }));
	return ok({
		parts: definition.plates.map((plate, i) => ({
			name: plate.name,
			region: { loops: [closedLoop(rings[i]!.points)] },
			thickness: Math.min(plate.width, plate.thickness),
			...(plate.grade === undefined ? {} : { grade: plate.grade })
		})),
		contours: mergedLoops(arrangementOf(rings, placed.tolerance)),
		torsion: platesTorsion(definition, placed),
		oneThickness: false,
		notes: definition.tied ? tiedNotes(placed) : []
	});
}

function tiedNotes({ boxes, touching }: PlacedPlates): Note[] {
	const pieces = connectedPieces(
		boxes.length,
		touching.map(({ a, b }) => [a, b] as const)
	);
	if (pieces.length < 2) return [];
	const message =
		'Separate pieces are taken to act together because the definition says they are tied; what ties them is not checked.';
	return [{ code: 'pieces-tied-by-intent', message }];
}
