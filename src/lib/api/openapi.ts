import { engineVersion } from '../engine/version';
import { errorSchema } from './error';
import type { Operation } from './operation';
import { operations, refusalMeanings } from './operations';
import { z } from './zod';

export type JsonSchema = z.core.JSONSchema.BaseSchema;

const uri = (id: string) => `#/components/schemas/${id}`;

/** Dialect and address of a schema mean nothing inside one document. */
const bare = ({ $schema: _dialect, $id: _address, id: _id, ...schema }: JsonSchema): JsonSchema =>
	schema;

/** Every schema that has a name, as JSON Schema 2020-12, by name. */
export const componentSchemas = (): Record<string, JsonSchema> => {
	const { schemas } = z.toJSONSchema(z.globalRegistry, { io: 'input', uri });
	return Object.fromEntries(Object.entries(schemas).map(([id, schema]) => [id, bare(schema)]));
};

const reference = (schema: z.ZodType) => ({
	'application/json': { schema: { $ref: uri(z.globalRegistry.get(schema)?.id ?? '') } }
});

const queryParameters = (query: z.ZodObject) => {
	const { properties = {} } = bare(z.toJSONSchema(query, { io: 'input' }));
	return Object.entries(properties).map(([name, schema]) => ({ name, in: 'query', schema }));
};

const pathParameters = (path: string) =>
	[...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => ({
		name,
		in: 'path',
		required: true,
		schema: { type: 'string' }
	}));

const refusalsOf = ({ refusals, conflict }: Operation) =>
	[...refusals, 500].map((status): [number, object] => [
		status,
		{
			description: refusalMeanings[status],
			content: reference(status === 409 && conflict ? conflict : errorSchema)
		}
	]);

const answersOf = ({ answer, status = 200, alike = [] }: Operation) => {
	const content = answer
		? reference(answer)
		: { 'application/json': { schema: { type: 'array' } } };
	return [status, ...alike].map((one): [number, object] => [
		one,
		{ description: refusalMeanings[one] ?? 'The answer.', content }
	]);
};

const responsesOf = (operation: Operation): Record<string, object> =>
	Object.fromEntries([...answersOf(operation), ...refusalsOf(operation)]);

const operationOf = (operation: Operation) => {
	const { id, title, description, query, body, path, signedIn } = operation;
	return {
		operationId: id,
		summary: title,
		description,
		parameters: [...pathParameters(path), ...(query ? queryParameters(query) : [])],
		...(body && { requestBody: { required: true, content: reference(body) } }),
		responses: responsesOf(operation),
		security: signedIn ? [{ session: [] }] : [{}]
	};
};

/** Operations by path, then by method. */
const pathItems = () => {
	const items: Record<string, Record<string, ReturnType<typeof operationOf>>> = {};
	for (const operation of operations)
		items[operation.path] = {
			...items[operation.path],
			[operation.method]: operationOf(operation)
		};
	return items;
};

/** The whole API as an OpenAPI 3.1 document, made from the schemas that check the requests. */
export const openApiDocument = () => ({
	openapi: '3.1.0',
	info: {
		title: 'Flangewright',
		version: '1',
		summary: 'How much of a steel section’s strength may be counted on.',
		description:
			'Lengths mm, stress N/mm², force kN, moment kNm, curvature 1/m, angles in degrees anticlockwise. Tension positive; My positive puts the bottom in tension, Mz positive the right. A design aid: its answers are to be judged by a licensed engineer.',
		'x-engine-version': engineVersion
	},
	servers: [{ url: '/' }],
	paths: pathItems(),
	components: {
		schemas: componentSchemas(),
		securitySchemes: {
			session: { type: 'apiKey', in: 'cookie', name: 'authjs.session-token' }
		}
	}
});
