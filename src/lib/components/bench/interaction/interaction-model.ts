import type { InteractionPlane, InteractionPoint } from '$lib/engine/response/interaction';
import type { Demand } from '$lib/engine/rules/result';
import type { Quantity } from '$lib/units';

export type Force = 'N' | 'My' | 'Mz';

/** The force drawn to the right, and the one drawn up. */
export const planeForces: Readonly<Record<InteractionPlane, readonly [Force, Force]>> = {
	'N-My': ['N', 'My'],
	'N-Mz': ['N', 'Mz'],
	'My-Mz': ['My', 'Mz']
};

export const forceQuantity = (force: Force): Quantity => (force === 'N' ? 'force' : 'moment');

export type SeriesKey = 'plastic' | 'first-yield' | 'code' | 'cases';

/** A point that can be read off: kN and kNm; `name` of a case. */
export interface ReadPoint extends InteractionPoint {
	readonly name?: string;
	/** The force that is not in the plane differs from the plane's. */
	readonly offPlane?: boolean;
}

export interface Series {
	readonly key: SeriesKey;
	readonly title: string;
	/** Null breaks the line. */
	readonly points: readonly (ReadPoint | null)[];
}

/** A demand case in a plane; `N` is that of the plane My–Mz. */
export function casePoint(demand: Demand, plane: InteractionPlane, N: number): ReadPoint {
	const point = { N: demand.N ?? 0, My: demand.My ?? 0, Mz: demand.Mz ?? 0 };
	const off =
		plane === 'My-Mz'
			? Math.abs(point.N - N) > 1e-9 * Math.max(1, Math.abs(N))
			: point[plane === 'N-My' ? 'Mz' : 'My'] !== 0;
	return { ...point, name: demand.name ?? '', offPlane: off };
}

export const hasForce = ({ N, My, Mz }: InteractionPoint): boolean =>
	N !== 0 || My !== 0 || Mz !== 0;

/** Points of a series that can be read, in order. */
export const readable = ({ points }: Series): ReadPoint[] =>
	points.filter((point): point is ReadPoint => point !== null);

/** Unbroken stretches of a series; a loop with no break closes. */
export function stretches({ points, key }: Series): ReadPoint[][] {
	const out: ReadPoint[][] = [[]];
	for (const point of points) {
		if (point) out.at(-1)!.push(point);
		else out.push([]);
	}
	const first = out[0]?.[0];
	if (key === 'code' && out.length === 1 && first) out[0]!.push(first);
	return out.filter(({ length }) => length > 1);
}

/** Forces below this share of the curve's greatest are rounding. */
const noise = 1e-9;

/** A curve whose forces are zero where only the last digits are left of them. */
export function withoutNoise(series: Series): Series {
	if (series.key === 'cases') return series;
	const most = (force: Force) =>
		readable(series).reduce((so, point) => Math.max(so, Math.abs(point[force])), 0);
	const [N, My, Mz] = [most('N'), most('My'), most('Mz')];
	const clean = (value: number, greatest: number) =>
		Math.abs(value) < noise * greatest ? 0 : value;
	return {
		...series,
		points: series.points.map(
			(point) =>
				point && {
					...point,
					N: clean(point.N, N),
					My: clean(point.My, My),
					Mz: clean(point.Mz, Mz)
				}
		)
	};
}
