import { firmAnswerSchema, firmConflictSchema, firmSettingsRequest } from './firm-settings';
import type { Operation } from './operation';

const path = '/api/v1/firm';

/** Routes of what a firm has settled for all its studies. */
export const firmOperations: readonly Operation[] = [
	{
		...{ id: 'firm', method: 'get', path, title: 'Read the firm’s settings' },
		signedIn: true,
		description:
			'Preset of the code and plate stock of the firm in hand, and the stock used where it keeps none.',
		answer: firmAnswerSchema,
		refusals: [401, 403, 503]
	},
	{
		...{ id: 'updateFirm', method: 'patch', path, title: 'Change the firm’s settings' },
		signedIn: true,
		description:
			'For owners and librarians. Sends what changes and the version it was read at; null goes back to the default. 409 with both states when somebody saved in between.',
		body: firmSettingsRequest,
		answer: firmAnswerSchema,
		refusals: [400, 401, 403, 409, 413, 415, 503],
		conflict: firmConflictSchema
	}
];
