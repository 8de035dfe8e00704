import {
	interactionRequestSchema,
	type InteractionAnswer,
	type InteractionRequest
} from '../../../api/interaction';
import { interactionPoints, interactionTracing } from '../../../engine/response/interaction';
import { fail, ok, type Issue, type Note, type Result } from '../../../engine/result';
import { prepareSection } from '../../../engine/section/prepare';
import type { PreparedSection } from '../../../engine/section/prepared';
import { contractVersion, engineVersion } from '../../../engine/version';
import { parsed } from '../parse';
import { invalid, type Refusal } from '../refusal';
import { ignoredFields } from './ignored-fields';
import { searchInTurns } from './search-in-turns';
import { placed, subjectOf, type FindShape } from './subject';
import { edgesOf } from './work-limit';

const known = Object.keys(interactionRequestSchema.shape);

/** Points times edges that are computed in about two seconds. */
const mostWork = 400_000;

const workIssues = (
	{ points = interactionPoints.usual }: InteractionRequest,
	section: PreparedSection
): Issue[] => {
	const edges = edgesOf(section);
	const most = Math.floor(mostWork / edges);
	if (points <= most) return [];
	const message = `points may be at most ${most} for a section of ${edges} edges, not ${points}.`;
	return [{ path: 'points', message }];
};

const centroidNote: Note = {
	code: 'force_at_gross_centroid',
	message:
		'N acts at the gross centroid, and parts differ in strength: the greatest N goes with a moment that is not zero.'
};

const centroidNotes = ({ parts }: PreparedSection): Note[] =>
	parts.some(
		({ material }) =>
			material.fy !== parts[0]?.material.fy || material.fyc !== parts[0]?.material.fyc
	)
		? [centroidNote]
		: [];

const runsOverN: Note = {
	code: 'ignored_field',
	message: '"N" is for the plane My-Mz and was ignored: this curve runs over every N.'
};

/**
 * Answer to POST /api/v1/interaction: the loop of one limit in one plane. 400 when a field is wrong,
 * 422 when no such curve exists: N beyond the section, no straight elastic range, or no full plastic block. Other
 * requests get their turn between points.
 */
export const interactionAnswer = async (
	body: unknown,
	findShape: FindShape,
	signal?: AbortSignal
): Promise<Result<InteractionAnswer, Refusal>> => {
	const request = parsed(interactionRequestSchema, body);
	if (!request.ok) return request;
	const subject = await subjectOf(request.value, findShape);
	if (!subject.ok) return subject;
	const section = prepareSection(subject.value.definition, request.value.strengthBasis);
	if (!section.ok) return fail(invalid(placed(section.error, subject.value.at)));
	const tooMuch = workIssues(request.value, section.value);
	if (tooMuch.length > 0) return fail(invalid(tooMuch));
	const { limit, plane, N, points } = request.value;
	const tracing = interactionTracing(section.value, {
		...{ limit, plane },
		...(N === undefined ? {} : { N }),
		...(points === undefined ? {} : { points })
	});
	const traced = await searchInTurns(tracing, signal);
	if (!traced.ok) return traced;
	const curve = traced.value;
	if (!curve.ok) return fail({ ...invalid([curve.error]), status: 422, code: 'no_curve' });
	return ok({
		contract: contractVersion,
		engineVersion,
		strengthBasis: section.value.strengthBasis,
		points: curve.value.points,
		notes: [
			...subject.value.notes,
			...ignoredFields(body, known),
			...(plane !== 'My-Mz' && N ? [runsOverN] : []),
			...centroidNotes(section.value)
		]
	});
};
