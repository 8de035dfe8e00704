import { codeChoiceOf } from '../../../api/code';
import { unlockRequestSchema, type UnlockAnswer, type UnlockRequest } from '../../../api/unlock';
import { fail, ok, type Result } from '../../../engine/result';
import { prepareSection } from '../../../engine/section/prepare';
import type { SectionDefinition } from '../../../engine/section/definition';
import { unlocking } from '../../../engine/unlock/unlock';
import { contractVersion, engineVersion } from '../../../engine/version';
import { defaultStock } from '../../firm/default-stock';
import { parsed } from '../parse';
import { invalid, type Refusal } from '../refusal';
import { ignoredFields } from './ignored-fields';
import { searchInTurns } from './search-in-turns';
import { placed, subjectOf, type FindShape } from './subject';

const known = Object.keys(unlockRequestSchema.shape);

const basisOf = ({ code }: UnlockRequest) => code?.strengthBasis ?? 'product-standard';

const searchOf = (request: UnlockRequest, definition: SectionDefinition) => {
	const { code = {}, demand, demands = [], stiffeners = null, stock } = request;
	return unlocking({
		girder: { definition, stiffeners },
		code: codeChoiceOf(code),
		demands: demand ? [demand, ...demands] : demands,
		strengthBasis: basisOf(request),
		stock: stock ?? defaultStock()
	});
};

/**
 * Answer to POST /api/v1/unlock: changes in stock steps after which more may be counted or the
 * demands are met. 400 when a field is wrong, 404 and 422 when the shape is not there.
 */
export const unlockAnswer = async (
	body: unknown,
	findShape: FindShape,
	signal?: AbortSignal
): Promise<Result<UnlockAnswer, Refusal>> => {
	const request = parsed(unlockRequestSchema, body);
	if (!request.ok) return request;
	const subject = await subjectOf(request.value, findShape);
	if (!subject.ok) return subject;
	const { definition, notes, at } = subject.value;
	const strengthBasis = basisOf(request.value);
	const section = prepareSection(definition, strengthBasis);
	if (!section.ok) return fail(invalid(placed(section.error, at)));
	const search = await searchInTurns(searchOf(request.value, definition), signal);
	if (!search.ok) return search;
	const { goal = null, options = [], notes: own = [] } = search.value ?? {};
	return ok({
		contract: contractVersion,
		engineVersion,
		strengthBasis,
		goal,
		options: options.map(({ girder, changes, ...figures }) => ({
			changes: [...changes],
			...figures,
			section: girder.definition,
			stiffeners: girder.stiffeners
		})),
		notes: [...notes, ...ignoredFields(body, known), ...own]
	});
};
