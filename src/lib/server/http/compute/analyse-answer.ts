import {
	analyseRequestSchema,
	type AnalyseAnswer,
	type AnalyseRequest
} from '../../../api/analyse';
import { codeChoiceOf } from '../../../api/code';
import { fail, ok, type Note, type Result } from '../../../engine/result';
import { analyse } from '../../../engine/rules/analyse';
import type { Analysis } from '../../../engine/rules/analysis';
import { prepareSection } from '../../../engine/section/prepare';
import { contractVersion, engineVersion } from '../../../engine/version';
import { parsed } from '../parse';
import { invalid, type Refusal } from '../refusal';
import { ignoredFields } from './ignored-fields';
import { placed, subjectOf, type FindShape } from './subject';
import { hasUnbuiltLaw, unbuiltLawNote, withoutUnbuiltLaws } from './unbuilt-laws';

const known = Object.keys(analyseRequestSchema.shape);

const stiffenersNote: Note = {
	code: 'stiffeners_not_used',
	message: 'Transverse stiffeners are not used yet: shear is judged as if there were none.'
};

const engineRequest = ({ code, demand, demands = [] }: AnalyseRequest) => ({
	code: codeChoiceOf(code ?? {}),
	demands: demand ? [demand, ...demands] : demands
});

const nothing = null;

/** Without a law the figures of strength stand on nothing: none is given. */
const withoutStrength = (analysis: Analysis) => ({
	...analysis,
	moment: {
		firstYieldY: nothing,
		firstYieldZ: nothing,
		plasticY: nothing,
		plasticZ: nothing,
		plasticNeutralAxisZ: nothing,
		plasticNeutralAxisY: nothing,
		shapeFactorY: nothing,
		shapeFactorZ: nothing
	},
	squashLoad: nothing,
	classification: nothing,
	effective: nothing,
	resistance: nothing,
	demands: [],
	verdict: nothing,
	notes: [unbuiltLawNote, ...analysis.notes]
});

/**
 * Answer to POST /api/v1/analyse: what the engine says of one section under its demands.
 * 400 when a field is wrong, 404 and 422 when the shape is not there.
 */
export const analyseAnswer = async (
	body: unknown,
	findShape: FindShape
): Promise<Result<AnalyseAnswer, Refusal>> => {
	const request = parsed(analyseRequestSchema, body);
	if (!request.ok) return request;
	const subject = await subjectOf(request.value, findShape);
	if (!subject.ok) return subject;
	const { definition, notes, at } = subject.value;
	const unbuilt = hasUnbuiltLaw(definition);
	const section = prepareSection(
		unbuilt ? withoutUnbuiltLaws(definition) : definition,
		request.value.code?.strengthBasis
	);
	if (!section.ok) return fail(invalid(placed(section.error, at)));
	const analysis = analyse(section.value, engineRequest(request.value));
	const { notes: own, ...figures } = unbuilt ? withoutStrength(analysis) : analysis;
	const more = request.value.stiffeners ? [stiffenersNote] : [];
	return ok({
		contract: contractVersion,
		engineVersion,
		...figures,
		notes: [...notes, ...ignoredFields(body, known), ...more, ...own]
	});
};
