import { limits } from '../../../api/limits';
import type { ResponseRequest } from '../../../api/response';
import type { Issue } from '../../../engine/result';
import type { PreparedSection } from '../../../engine/section/prepared';

/** Edges of all parts: what the time for one state grows with. */
export const edgesOf = ({ parts }: PreparedSection): number =>
	parts.reduce(
		(sum, { region }) => sum + region.loops.reduce((edges, loop) => edges + loop.length, 0),
		0
	);

/** States per reversal of a cycle when the request does not say. */
export const usualPointsPerLeg = 20;

type Asked = Pick<ResponseRequest, 'at' | 'cycle'>;

/** How many states are asked for, by the field that asks for them. */
const countsOf = ({
	at = {},
	cycle
}: Asked): { path: string; search: boolean; count: number }[] => {
	const points = cycle?.pointsPerLeg ?? usualPointsPerLeg;
	return [
		...Object.entries(at).map(([form, { length }]) => ({
			...{ path: `at.${form}`, search: form === 'moment', count: length }
		})),
		...(cycle
			? [
					{
						path: 'cycle',
						search: cycle.moments !== undefined,
						count: (cycle.moments ?? cycle.curvatures ?? []).length * points
					}
				]
			: [])
	];
};

/**
 * What is wrong when a section of very many edges is asked for more states than are computed in
 * about two seconds: a moment takes a search, and counts several times as much as a curvature.
 */
export const workIssues = (asked: Asked, section: PreparedSection): Issue[] => {
	const edges = edgesOf(section);
	return countsOf(asked).flatMap(({ path, search, count }) => {
		const work = search ? limits.momentWork : limits.work;
		const most = Math.min(limits.states, Math.floor(work / edges));
		if (count <= most) return [];
		const what = path === 'cycle' ? 'states in all' : 'entries';
		const message = `${path} may hold at most ${most} ${what} for a section of ${edges} edges, not ${count}.`;
		return [{ path, message }];
	});
};
