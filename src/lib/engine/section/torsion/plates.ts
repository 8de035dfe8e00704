import type { PlatesSection } from '../definition';
import { connectedPieces } from '../../geometry/pieces';
import type { PlacedPlates } from '../plates/placing';
import type { TorsionFigures } from '../shape';
import { joinedPairs, midLines } from './mid-lines';
import { thinWalls } from './thin-walls';

const none: TorsionFigures = { torsionConstant: null, warpingConstant: null, shearCentre: null };

/** What a free end of a strip takes from bt³/3, as a share of t⁴ (El Darwish & Johnston 1965). */
const endLoss = 0.105;

/**
 * Torsion figures of free plates by the theory of thin walls: torsion constant Σbt³/3 over the plates,
 * less 0.105t⁴ at each free end, plus Bredt's part of closed cells (mm⁴), warping constant (mm⁶) and shear centre on the mid-lines,
 * extended to where they meet. What junctions and fillets add is left out. All null where the
 * theory does not hold (see `midLines`), warping and shear centre already where walls are too thick for them; of pieces apart the torsion constants are added and the rest
 * is null.
 */
export function platesTorsion(definition: PlatesSection, placed: PlacedPlates): TorsionFigures {
	const lines = midLines(definition, placed);
	if (lines === null) return none;
	const count = definition.plates.length;
	const pairs = joinedPairs(definition, placed).map(({ a, b }) => [a, b] as const);
	const walls = lines.walls.map(({ from, to }) => [from, to] as const);
	const meet = connectedPieces(lines.nodes.length, walls).length;
	if (meet !== connectedPieces(count, pairs).length) return none;
	const own = definition.plates.reduce((sum, { width, thickness }) => {
		const [long, short] = width > thickness ? [width, thickness] : [thickness, width];
		return sum + (long * short ** 3) / 3;
	}, 0);
	const lost = lines.freeEnds.reduce((sum, thickness) => sum + endLoss * thickness ** 4, 0);
	const figures = thinWalls(lines);
	const torsionConstant = own - lost + figures.torsionConstant!;
	return lines.warps ? { ...figures, torsionConstant } : { ...none, torsionConstant };
}
