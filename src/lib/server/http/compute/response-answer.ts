import {
	responseRequestSchema,
	type ResponseAnswer,
	type ResponseRequest
} from '../../../api/response';
import { fail, ok, type Note, type Result } from '../../../engine/result';
import type { Imposed } from '../../../engine/response/respond';
import type { BendingPath } from '../../../engine/response/state';
import { noState } from '../../../engine/response/state-report';
import type { PreparedSection } from '../../../engine/section/prepared';
import { prepareSection } from '../../../engine/section/prepare';
import { contractVersion, engineVersion } from '../../../engine/version';
import { parsed } from '../parse';
import { invalid, type Refusal } from '../refusal';
import { ignoredFields } from './ignored-fields';
import { withLaw } from './replaced-law';
import { respondInTurns } from './states-in-turns';
import { placed, subjectOf, type FindShape, type Subject } from './subject';
import { hasUnbuiltLaw, unbuiltLawNote, withoutUnbuiltLaws } from './unbuilt-laws';
import { workIssues } from './work-limit';

const known = Object.keys(responseRequestSchema.shape);

const unloadNote: Note = {
	code: 'unloading_not_built',
	message:
		'Unloading is not built yet: no state is given. Leave unloadFrom out to bend the section.'
};
const residualNote: Note = {
	code: 'residual_not_built',
	message:
		'Residual stress is not built yet: no state is given. Send residual "none" or leave it out.'
};

/** Why no state can be given, if so. */
const unbuiltNotes = (request: ResponseRequest, subject: Subject): Note[] => [
	...(request.unloadFrom ? [unloadNote] : []),
	...(request.residual && request.residual !== 'none' ? [residualNote] : []),
	...(request.law
		? request.law.type === 'ramberg-osgood'
			? [unbuiltLawNote]
			: []
		: hasUnbuiltLaw(subject.definition)
			? [unbuiltLawNote]
			: [])
];

/** The schema has made sure that exactly one of the four is there. */
const imposedOf = ({
	curvature,
	curvatureRatio,
	moment,
	strainPlanes = []
}: ResponseRequest['at']): Imposed =>
	curvature
		? { curvature }
		: curvatureRatio
			? { curvatureRatio }
			: moment
				? { moment }
				: { strainPlanes };

const pathOf = ({
	axisAngle = 0,
	transverse = 'moment-zero',
	N = 0
}: ResponseRequest): BendingPath => ({
	axisAngle,
	transverse,
	N
});

const noAnswer = (at: ResponseRequest['at']) => ({
	states: Object.values(at).flatMap((list) => list.map(() => noState)),
	firstYield: { curvature: null, moment: null },
	plasticMoment: null
});

/** The prepared section with the law that the request asks for, or what is wrong with it. */
const preparedFor = (
	request: ResponseRequest,
	{ definition, at }: Subject
): Result<PreparedSection, Refusal> => {
	const section = prepareSection(withoutUnbuiltLaws(definition), request.strengthBasis);
	if (!section.ok) return fail(invalid(placed(section.error, at)));
	if (!request.law || request.law.type === 'ramberg-osgood') return section;
	const lawful = withLaw(section.value, request.law);
	return lawful.ok ? lawful : fail(invalid(lawful.error));
};

/**
 * Answer to POST /api/v1/response: states of the bent section. What is not built yet gives states
 * that are not converged, and a note. Other requests get their turn between states; once `signal` is
 * aborted the rest is left undone.
 */
export const responseAnswer = async (
	body: unknown,
	findShape: FindShape,
	signal?: AbortSignal
): Promise<Result<ResponseAnswer, Refusal>> => {
	const request = parsed(responseRequestSchema, body);
	if (!request.ok) return request;
	const subject = await subjectOf(request.value, findShape);
	if (!subject.ok) return subject;
	const section = preparedFor(request.value, subject.value);
	if (!section.ok) return section;
	const { at } = request.value;
	const unbuilt = unbuiltNotes(request.value, subject.value);
	const tooMuch = workIssues(at, section.value);
	if (tooMuch.length > 0) return fail(invalid(tooMuch));
	const response =
		unbuilt.length > 0
			? ok(noAnswer(at))
			: await respondInTurns(section.value, pathOf(request.value), imposedOf(at), signal);
	if (!response.ok) return response;
	return ok({
		contract: contractVersion,
		engineVersion,
		strengthBasis: section.value.strengthBasis,
		...response.value,
		notes: [...subject.value.notes, ...ignoredFields(body, known), ...unbuilt]
	});
};
