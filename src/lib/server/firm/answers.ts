import type { Result } from '../../engine/result';
import { refused, type Refusal } from '../http/refusal';
import { privateAnswer } from '../sections/answers';
import type { FirmState, SettingsMovedOn } from './settings';

const isMovedOn = (refusal: Refusal): refusal is SettingsMovedOn => refusal.code === 'moved_on';

/** The firm with its settings, or why not; settings that moved on come with both states. */
export const firmAnswer = (result: Result<FirmState, Refusal>): Response => {
	if (result.ok) return privateAnswer(result.value);
	if (!isMovedOn(result.error)) return refused(result.error);
	const { status, code, message, yours, theirs } = result.error;
	const headers = { 'cache-control': 'private, no-store' };
	return Response.json({ error: { code, message }, yours, theirs }, { status, headers });
};
