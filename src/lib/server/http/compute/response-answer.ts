import {
	responseRequestSchema,
	type ResponseAnswer,
	type ResponseRequest
} from '../../../api/response';
import { fail, ok, type Note, type Result } from '../../../engine/result';
import { historyOf, type History } from '../../../engine/response/history/history';
import { keepsStrength, lostStrengthNote } from '../../../engine/response/kept-strength';
import { mechanicsOf } from '../../../engine/response/law-groups';
import type { Imposed } from '../../../engine/response/respond';
import type { BendingPath } from '../../../engine/response/state';
import { noState } from '../../../engine/response/state-report';
import type { PreparedSection } from '../../../engine/section/prepared';
import { materialNotes } from '../../../engine/section/transformed';
import { prepareSection } from '../../../engine/section/prepare';
import { contractVersion, engineVersion } from '../../../engine/version';
import { parsed } from '../parse';
import { invalid, type Refusal } from '../refusal';
import { bentInTurns, type Bent } from './bent-in-turns';
import { historyNotes } from './history-notes';
import { ignoredFields } from './ignored-fields';
import { withLaw } from './replaced-law';
import { placed, subjectOf, type FindShape, type Subject } from './subject';
import { usualPointsPerLeg, workIssues } from './work-limit';

const known = Object.keys(responseRequestSchema.shape);

/** The schema has made sure that one of the four at most is there. */
const imposedOf = ({
	curvature,
	curvatureRatio,
	moment,
	strainPlanes = []
}: NonNullable<ResponseRequest['at']> = {}): Imposed =>
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

const noAnswer = ({ at = {}, cycle }: ResponseRequest) => {
	const points = cycle?.pointsPerLeg ?? usualPointsPerLeg;
	const reversals = cycle?.moments ?? cycle?.curvatures;
	const leg = () => ({ states: Array.from({ length: points }, () => noState) });
	return {
		states: Object.values(at).flatMap((list) => list.map(() => noState)),
		...(reversals ? { legs: reversals.map(leg) } : {}),
		firstYield: { curvature: null, moment: null },
		plasticMoment: null
	};
};

/** The section with what it has been through, where the request asks for that; a note where it has no answer. */
const historyFor = (
	{ residual = 'none', unloadFrom, cycle }: ResponseRequest,
	section: PreparedSection
): Result<History | null, Note> =>
	residual === 'none' && !unloadFrom && !cycle ? ok(null) : historyOf(section, residual);

/** The prepared section with the law that the request asks for, or what is wrong with it. */
const preparedFor = (
	request: ResponseRequest,
	{ definition, at }: Subject
): Result<PreparedSection, Refusal> => {
	const section = prepareSection(definition, request.strengthBasis);
	if (!section.ok) return fail(invalid(placed(section.error, at)));
	if (!request.law) return section;
	const lawful = withLaw(section.value, request.law);
	return lawful.ok ? lawful : fail(invalid(lawful.error));
};

/**
 * Answer to POST /api/v1/response: states of the bent section. What the
 * laws do not reach gives states that are not converged. Other requests get their turn between states; once `signal` is
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
	const tooMuch = workIssues(request.value, section.value);
	if (tooMuch.length > 0) return fail(invalid(tooMuch));
	const response = await bentAnswer(request.value, section.value, signal);
	if (!response.ok) return response;
	const { notes, ...figures } = response.value;
	return ok({
		contract: contractVersion,
		engineVersion,
		strengthBasis: section.value.strengthBasis,
		...figures,
		notes: [
			...subject.value.notes,
			...ignoredFields(body, known),
			...materialNotes(section.value.parts),
			...(keepsStrength(mechanicsOf(section.value)) ? [] : [lostStrengthNote]),
			...notes
		]
	});
};

const bentAnswer = async (
	request: ResponseRequest,
	section: PreparedSection,
	signal: AbortSignal | undefined
): Promise<Result<Bent, Refusal>> => {
	const history = historyFor(request, section);
	if (!history.ok) return ok({ ...noAnswer(request), notes: [history.error] });
	const asked = { ...request, path: pathOf(request), at: imposedOf(request.at) };
	const bent = await bentInTurns(section, asked, history.value, signal);
	if (!bent.ok || !history.value) return bent;
	const { firstYield, notes } = bent.value;
	const more = historyNotes(request, history.value, firstYield.curvature);
	return ok({ ...bent.value, notes: [...more, ...notes] });
};
