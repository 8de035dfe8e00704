import type { Operation } from './operation';
import { analyseAnswerSchema, analyseQuerySchema, analyseRequestSchema } from './analyse';
import { interactionAnswerSchema, interactionRequestSchema } from './interaction';
import { responseAnswerSchema, responseRequestSchema } from './response';
import { healthSchema } from './health';
import { proofListSchema, proofQuerySchema } from './proof';
import { unlockAnswerSchema, unlockRequestSchema } from './unlock';
import { firmOperations } from './firm-operations';
import { sectionOperations } from './section-operations';
import { catalogueListSchema, shapeListSchema, shapeQuerySchema, shapeSchema } from './shapes';

const compute = [400, 404, 413, 415, 422, 429] as const;

/** Every route described so far. */
export const operations: readonly Operation[] = [
	{
		id: 'analyse',
		method: 'post',
		path: '/api/v1/analyse',
		title: 'Analyse a section',
		description:
			'Gross properties, first yield and full plastic, class of every plate, and the resistance that may be counted under the demands. Needs no account. A figure whose rule does not reach, or is not built, is null and a note says why.',
		query: analyseQuerySchema,
		body: analyseRequestSchema,
		answer: analyseAnswerSchema,
		refusals: compute
	},
	{
		id: 'response',
		method: 'post',
		path: '/api/v1/response',
		title: 'Bend a section',
		description:
			'States of the section at imposed curvatures, curvature ratios, moments or strain planes, at constant N, about any axis. A state that cannot exist has converged false and null figures. Needs no account.',
		body: responseRequestSchema,
		answer: responseAnswerSchema,
		refusals: compute
	},
	{
		id: 'interaction',
		method: 'post',
		path: '/api/v1/interaction',
		title: 'Trace an interaction curve',
		description:
			'The closed loop of forces at first yield or at full plastic, in the plane N-My, N-Mz or My-Mz; the moment not in the plane is held at zero, so that the neutral axis of an unsymmetric section turns. Needs no account.',
		body: interactionRequestSchema,
		answer: interactionAnswerSchema,
		refusals: compute
	},
	{
		id: 'unlock',
		method: 'post',
		path: '/api/v1/unlock',
		title: 'Find what would unlock more',
		description:
			'Changes in stock steps with the least added steel after which the demands are met or, where they are, more of the strength may be counted. One change, or two where no single one does; each verified by a full analysis. Grades and welds stay. Needs no account.',
		body: unlockRequestSchema,
		answer: unlockAnswerSchema,
		refusals: compute
	},
	{
		id: 'catalogues',
		method: 'get',
		path: '/api/v1/catalogues',
		title: 'List the catalogues',
		description: 'The catalogues of published shapes, with their families.',
		answer: catalogueListSchema,
		refusals: []
	},
	{
		id: 'shapes',
		method: 'get',
		path: '/api/v1/shapes',
		title: 'Find shapes',
		description:
			'One page of shapes. With q and no sort the best answers come first: "ipe 3", "w14x", "457x191x67".',
		query: shapeQuerySchema,
		answer: shapeListSchema,
		refusals: [400]
	},
	{
		id: 'shape',
		method: 'get',
		path: '/api/v1/shapes/{id}',
		title: 'Read a shape',
		description: 'Definition and computed properties of one shape.',
		answer: shapeSchema,
		refusals: [404]
	},
	{
		id: 'shapeIndex',
		method: 'get',
		path: '/api/v1/shapes/index.json',
		title: 'All shapes in brief',
		description:
			'Rows [id, designation, family, standard, mass in kg/m, h in mm, b in mm] for searching on the spot. Carries an ETag.',
		answer: null,
		refusals: []
	},
	{
		id: 'proof',
		method: 'get',
		path: '/api/v1/proof',
		title: 'Published values and ours',
		description:
			'One page of the published values that the engine is held against, each with its source, our own value and what may lie between them; with the counts of all. A value that is not met is there like any other. Needs no account.',
		query: proofQuerySchema,
		answer: proofListSchema,
		refusals: [400]
	},
	{
		id: 'health',
		method: 'get',
		path: '/api/v1/health',
		title: 'Ask how this instance is',
		description:
			'200 when everything works, 503 with the same figures when the database is away or not at this program’s level.',
		answer: healthSchema,
		alike: [503],
		refusals: []
	},
	...sectionOperations,
	...firmOperations
];

/** What each status means, in a sentence. */
export const refusalMeanings: Readonly<Record<number, string>> = {
	400: 'The request is not JSON, or a field is wrong: issues name each one by its path.',
	401: 'Sign in first.',
	403: 'Your role may not do this.',
	404: 'There is nothing under this address or id.',
	405: 'The address answers another method; the Allow header says which.',
	409: 'Somebody saved in between: read again and repeat.',
	413: 'The request is larger than the limit named in the message.',
	415: 'Send content-type application/json.',
	422: 'Well formed, but what it asks for does not exist, such as a version of a shape.',
	429: 'Too many calculations in a minute; Retry-After says how long to wait.',
	500: 'A fault on our side; id ties it to the log.',
	503: 'The database cannot be reached at the moment.'
};
