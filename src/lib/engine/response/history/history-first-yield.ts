import type { ElasticPath } from '../elastic-path';
import { curvatureAtYield } from '../first-yield';
import type { FirstYield } from '../state';
import { boxSpread, spreadOver, type Cell, type Spread } from './cell';
import type { History } from './history';
import { fieldSum, strainField, type LinearField } from './linear-field';

/** A use of the elastic range this near to 1 is yield itself: rounding of a residual stress of fy. */
const atYield = 1e-12;

/**
 * Curvature (1/m) and moment (kNm) at which a fibre first reaches its yield strength, residual stress
 * counted, while N is held and the curvature grows from zero. Both zero where the residual stress is at
 * the yield strength by itself (welding) and N leaves it there; null where N alone yields the section.
 */
export function historyFirstYield(
	history: History,
	elastic: ElasticPath,
	angle: { cos: number; sin: number },
	N: number
): FirstYield {
	const at = (curvature: number) =>
		strainField(angle, { e0: elastic.e0(curvature), curvature, turn: elastic.turn(curvature) });
	const excess = (curvature: number) => use(history, at(curvature)) - 1;
	if (N === 0 && excess(0) >= -atYield) return { curvature: 0, moment: 0 };
	const curvature = curvatureAtYield(excess, history.mechanics.reach);
	if (curvature === null) return { curvature: null, moment: null };
	return { curvature: curvature * 1e3, moment: elastic.moment(curvature) * 1e-6 };
}

/** Largest elastic strain over all cells as a share of what yields; 1 at first yield. */
function use({ start, layers }: History, strain: LinearField): number {
	let most = -Infinity;
	for (const cell of start) {
		const { tension, compression } = layers[cell.part]![0]!;
		const share = (spread: Spread) => Math.max(spread.most / tension, -spread.least / compression);
		const elastic = fieldSum(strain, cell.plastic[0]!, -1);
		if (share(boxSpread(cell.box, elastic)) > most)
			most = Math.max(most, share(spreadOver(cell as Cell, elastic)));
	}
	return most;
}
