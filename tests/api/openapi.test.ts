import { describe, expect, inject, it } from 'vitest';
import { call } from './call';

interface Document {
	openapi: string;
	paths: Record<string, Record<string, { responses: Record<string, unknown>; security: object[] }>>;
	components: { schemas: Record<string, unknown> };
}

describe('the description of the API', () => {
	it('is an OpenAPI 3.1 document whose open GET routes without parameters answer', async () => {
		const { body } = await call('/api/v1/openapi.json');
		const { openapi, paths } = body as Document;
		expect(openapi).toBe('3.1.0');
		for (const [path, methods] of Object.entries(paths))
			if (methods.get && !path.includes('{'))
				expect(await call(path)).toMatchObject({
					status: methods.get.security.some((needs) => 'session' in needs) ? 401 : 200
				});
	});

	it('names the refusals of a compute route', async () => {
		const { body } = await call('/api/v1/openapi.json');
		const responses = (body as Document).paths['/api/v1/analyse']?.post?.responses ?? {};
		expect(Object.keys(responses)).toEqual(
			expect.arrayContaining(['200', '400', '404', '413', '415', '422', '429', '500'])
		);
	});

	it('can be read by people at /api, with figures computed on the spot', async () => {
		const response = await fetch(`${inject('baseUrl')}/api`);
		const page = await response.text();
		expect(response.status).toBe(200);
		expect(page).toContain('POST /api/v1/analyse');
		expect(page).toContain('shapeFactorY');
		expect(page).toContain('/api/v1/openapi.json');
	});
});
