import type { InteractionPlane, InteractionPoint } from '../response/interaction';
import type { PreparedSection } from '../section/prepared';
import { analyse, type AnalyseRequest } from './analyse';
import type { Demand, DemandState } from './result';

export interface CountableRequest extends Omit<AnalyseRequest, 'demands' | 'explain'> {
	readonly plane: InteractionPlane;
	/** kN, held; for My–Mz. */
	readonly N?: number;
	/** Points of the loop. */
	readonly points?: number;
}

/** A point of the code's curve; null where nothing may be counted, so that the line is broken there. */
export type CountablePoint = InteractionPoint | null;

const usualPoints = 72;
/** Ends of the range of N are left by this share, where no moment would be left. */
const inside = 1 - 1e-9;

/**
 * What the code lets count in a plane of forces, no shear acting: a loop of points, each found by the
 * rules themselves for a demand in its direction (N–M: N held, M as large as the checks allow; My–Mz:
 * both in proportion, N held). Where the class changes with N the curve jumps, as the code does. kN,
 * kNm. Empty where the code gives no resistance.
 */
export function countableCurve(
	section: PreparedSection,
	{ plane, N = 0, points = usualPoints, ...request }: CountableRequest
): CountablePoint[] {
	const range = plane === 'My-Mz' ? null : axialRange(section, request);
	if (plane !== 'My-Mz' && range === null) return [];
	const asked = range === null ? around(points, N) : beside(points, plane, range);
	const { demands, resistance } = analyse(section, { ...request, demands: asked });
	if (resistance === null) return [];
	return demands.map((state, i) => pointOf(asked[i]!, state));
}

/** Directions of the moment once round. */
const around = (points: number, N: number): Demand[] =>
	Array.from({ length: points }, (_, i) => {
		const angle = (2 * Math.PI * i) / points;
		return { name: String(i), N, My: Math.cos(angle), Mz: Math.sin(angle) };
	});

/** Up one side from compression to tension and down the other, closer together near the ends. */
function beside(
	points: number,
	plane: InteractionPlane,
	{ least, most }: { least: number; most: number }
): Demand[] {
	const half = Math.max(2, Math.floor(points / 2));
	const levels = Array.from({ length: half }, (_, i) => {
		const share = (1 - Math.cos((Math.PI * i) / (half - 1))) / 2;
		return inside * (least + share * (most - least));
	});
	const demand = (N: number, M: number, i: number): Demand =>
		plane === 'N-My' ? { name: String(i), N, My: M } : { name: String(i), N, Mz: M };
	return [
		...levels.map((N, i) => demand(N, 1, i)),
		...levels.reverse().map((N, i) => demand(N, -1, half + i))
	];
}

function axialRange(section: PreparedSection, request: AnalyseRequest) {
	const { resistance } = analyse(section, request);
	const [NRd, NtRd] = [resistance?.NRd ?? null, resistance?.NtRd ?? null];
	return NRd === null || NtRd === null ? null : { least: -NRd, most: NtRd };
}

function pointOf({ N = 0, My = 0, Mz = 0 }: Demand, { countable }: DemandState): CountablePoint {
	return countable === null ? null : { N, My: My * countable, Mz: Mz * countable };
}
