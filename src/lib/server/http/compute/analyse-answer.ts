import {
	analyseRequestSchema,
	type AnalyseAnswer,
	type AnalyseRequest
} from '../../../api/analyse';
import { codeChoiceOf } from '../../../api/code';
import { fail, ok, type Result } from '../../../engine/result';
import { analyse } from '../../../engine/rules/analyse';
import { prepareSection } from '../../../engine/section/prepare';
import { contractVersion, engineVersion } from '../../../engine/version';
import { parsed } from '../parse';
import { invalid, type Refusal } from '../refusal';
import { ignoredFields } from './ignored-fields';
import { sectionWithTorsion } from './section-torsion';
import { placed, subjectOf, type FindShape } from './subject';

const known = Object.keys(analyseRequestSchema.shape);

const engineRequest = (
	{ code, demand, demands = [], stiffeners }: AnalyseRequest,
	query: URLSearchParams | undefined
) => ({
	code: codeChoiceOf(code ?? {}),
	demands: demand ? [demand, ...demands] : demands,
	stiffeners,
	explain: query?.get('explain') === '1'
});

/**
 * Answer to POST /api/v1/analyse: what the engine says of one section under its demands.
 * 400 when a field is wrong, 404 and 422 when the shape is not there.
 */
export const analyseAnswer = async (
	body: unknown,
	findShape: FindShape,
	signal?: AbortSignal,
	query?: URLSearchParams
): Promise<Result<AnalyseAnswer, Refusal>> => {
	const request = parsed(analyseRequestSchema, body);
	if (!request.ok) return request;
	const subject = await subjectOf(request.value, findShape);
	if (!subject.ok) return subject;
	const { definition, notes, at } = subject.value;
	const section = prepareSection(definition, request.value.code?.strengthBasis);
	if (!section.ok) return fail(invalid(placed(section.error, at)));
	const asked = request.value.numericalTorsion === true;
	const solved = await sectionWithTorsion(section.value, asked, signal);
	if (!solved.ok) return solved;
	const analysis = analyse(solved.value, engineRequest(request.value, query));
	const { notes: own, ...figures } = analysis;
	return ok({
		contract: contractVersion,
		engineVersion,
		...figures,
		torsion: solved.value.torsion,
		notes: [...notes, ...ignoredFields(body, known), ...own]
	});
};
