import type { Operation } from './operation';
import {
	createSectionRequest,
	sectionConflict,
	sectionListQuery,
	sectionListResponse,
	sectionResponse,
	updateSectionRequest
} from './sections';

const list = '/api/v1/sections';
const one = '/api/v1/sections/{id}';
const always = { signedIn: true, answer: sectionResponse } as const;

/** Routes of the sections that a firm keeps on its Rack. */
export const sectionOperations: readonly Operation[] = [
	{
		...always,
		...{ id: 'sections', method: 'get', path: list, title: 'List saved sections' },
		description: 'One page of the sections on the Rack of the firm in hand.',
		query: sectionListQuery,
		answer: sectionListResponse,
		refusals: [400, 401, 403, 503]
	},
	{
		...always,
		...{ id: 'createSection', method: 'post', path: list, title: 'Save a section' },
		description: 'Puts a section with its settings on the Rack, as a draft in version 1.',
		body: createSectionRequest,
		status: 201,
		refusals: [400, 401, 403, 413, 415, 422, 503]
	},
	{
		...always,
		...{ id: 'section', method: 'get', path: one, title: 'Read a saved section' },
		description: 'The section in full as it stands now.',
		refusals: [401, 403, 404, 503]
	},
	{
		...always,
		...{ id: 'updateSection', method: 'patch', path: one, title: 'Change a saved section' },
		description:
			'Sends what changes and the version it was read at. 409 with both states when somebody saved in between.',
		body: updateSectionRequest,
		refusals: [400, 401, 403, 404, 409, 413, 415, 422, 503],
		conflict: sectionConflict
	},
	{
		...always,
		...{ id: 'deleteSection', method: 'delete', path: one, title: 'Take a section off the Rack' },
		description: 'A deleted section can be put back.',
		refusals: [401, 403, 404, 409, 503]
	},
	{
		...always,
		...{ id: 'restoreSection', method: 'post', path: `${one}/restore` },
		title: 'Put a deleted section back',
		description: 'Undoes the deletion.',
		refusals: [401, 403, 404, 409, 503]
	}
];
