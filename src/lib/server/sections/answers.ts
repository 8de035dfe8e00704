import type { SectionRecord } from '../../api/sections';
import type { Result } from '../../engine/result';
import { contractVersion, engineVersion } from '../../engine/version';
import { refused, type Refusal } from '../http/refusal';
import { isMovedOn } from './refusals';

const privately = { 'cache-control': 'private, no-store' };

/** What every answer about sections carries. */
export const enveloped = <T extends object>(body: T) => ({
	contract: contractVersion,
	engineVersion,
	...body
});

/** JSON for the person who asked, and for no cache. */
export const privateAnswer = (body: object, status = 200): Response =>
	Response.json(enveloped(body), { status, headers: privately });

/** A refusal; one for a section that moved on carries both states beside the error. */
const refusedSection = (refusal: Refusal): Response => {
	if (!isMovedOn(refusal)) return refused(refusal);
	const { status, code, message, yours, theirs } = refusal;
	return Response.json({ error: { code, message }, yours, theirs }, { status, headers: privately });
};

/** The section, or why not. */
export const sectionAnswer = (result: Result<SectionRecord, Refusal>, status = 200): Response =>
	result.ok ? privateAnswer({ section: result.value }, status) : refusedSection(result.error);
