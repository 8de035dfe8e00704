import { engineVersion } from '../engine/version';
import { errorSchema } from './error';
import { operations, refusalMeanings, type Operation } from './operations';
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

const refusalsOf = ({ refusals }: Operation) =>
	Object.fromEntries(
		[...refusals, 500].map((status) => [
			status,
			{ description: refusalMeanings[status], content: reference(errorSchema) }
		])
	);

const operationOf = (operation: Operation) => {
	const { id, title, description, query, body, answer, path } = operation;
	return {
		operationId: id,
		summary: title,
		description,
		parameters: [...pathParameters(path), ...(query ? queryParameters(query) : [])],
		...(body && { requestBody: { required: true, content: reference(body) } }),
		responses: {
			200: {
				description: 'The answer.',
				content: answer ? reference(answer) : { 'application/json': { schema: { type: 'array' } } }
			},
			...refusalsOf(operation)
		},
		security: [{}, { bearer: [] }]
	};
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
	paths: Object.fromEntries(
		operations.map((operation) => [operation.path, { [operation.method]: operationOf(operation) }])
	),
	components: {
		schemas: componentSchemas(),
		securitySchemes: { bearer: { type: 'http', scheme: 'bearer' } }
	}
});
