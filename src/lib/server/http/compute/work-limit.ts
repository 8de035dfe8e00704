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

/**
 * What is wrong when a section of very many edges is asked for more states than are computed in
 * about two seconds: a moment takes a search, and counts several times as much as a curvature.
 */
export const workIssues = (at: ResponseRequest['at'], section: PreparedSection): Issue[] => {
	const edges = edgesOf(section);
	return Object.entries(at).flatMap(([form, asked]) => {
		const work = form === 'moment' ? limits.momentWork : limits.work;
		const most = Math.min(limits.states, Math.floor(work / edges));
		if (asked.length <= most) return [];
		const message = `at.${form} may hold at most ${most} entries for a section of ${edges} edges, not ${asked.length}.`;
		return [{ path: `at.${form}`, message }];
	});
};
