import { fail, ok, type Result } from '../engine/result';
import { errorSchema } from './error';
import {
	firmAnswerSchema,
	firmConflictSchema,
	type FirmSettings,
	type FirmSettingsRequest
} from './firm-settings';

/** Why settings were not kept, in words that may be shown; `theirs` when somebody kept others since. */
export interface FirmFailure {
	readonly message: string;
	readonly theirs?: FirmSettings;
}

const unreachable = 'The server cannot be reached. Check the connection and try again.';
const unexpected = 'The server gave an answer that is no use here. Try again.';

/** Keeps settings of the firm in hand. Never rejects. */
export async function updateFirmSettings(
	changes: FirmSettingsRequest,
	fetcher = fetch
): Promise<Result<FirmSettings, FirmFailure>> {
	const response = await fetcher('/api/v1/firm', {
		method: 'PATCH',
		headers: { accept: 'application/json', 'content-type': 'application/json' },
		body: JSON.stringify(changes)
	}).catch(() => null);
	if (!response) return fail({ message: unreachable });
	const json: unknown = await response.json().catch(() => null);
	const answer = firmAnswerSchema.safeParse(json);
	if (response.ok && answer.success) return ok(answer.data.settings);
	const conflict = firmConflictSchema.safeParse(json);
	if (conflict.success)
		return fail({ message: conflict.data.error.message, theirs: conflict.data.theirs });
	const error = errorSchema.safeParse(json);
	return fail({ message: error.success ? error.data.error.message : unexpected });
}
