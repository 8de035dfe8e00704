import { describe, expect, it } from 'vitest';
import { catalogueListSchema, shapeListSchema, shapeSchema } from '$lib/api/shapes';
import { searchableShape, searchShapes } from '$lib/api/shape-search';
import type { ShapeIndexRow } from '$lib/api/shape-index';
import { call } from './call';

const list = async (query: string) => {
	const { status, body } = await call(`/api/v1/shapes?${query}`);
	expect({ status, body }).toMatchObject({ status: 200 });
	return shapeListSchema.parse(body);
};
const names = async (query: string) => (await list(query)).items.map((item) => item.designation);

describe('GET /api/v1/catalogues', () => {
	it('lists every catalogue, about 2,300 shapes in all', async () => {
		const { body } = await call('/api/v1/catalogues');
		const { items, total } = catalogueListSchema.parse(body);
		expect(items).toHaveLength(total);
		expect(items.reduce((sum, { count }) => sum + count, 0)).toBeGreaterThan(2200);
		expect(items.flatMap(({ families }) => families)).toContain('IPE');
	});

	it('says of every catalogue which edition it follows and how it was confirmed', async () => {
		const { body } = await call('/api/v1/catalogues');
		for (const { source } of catalogueListSchema.parse(body).items) {
			expect(source).toMatch(/EN 10\d{3}(-\d)?:\d{4}|ASTM A\d+/);
			expect(source).toContain('Confirmed by');
		}
	});
});

describe('GET /api/v1/shapes', () => {
	it('pages through all shapes without a gap or a repeat', async () => {
		const first = await list('pageSize=200');
		const pages = Array.from({ length: Math.ceil(first.total / 200) }, (_, i) => i + 1);
		const all = await Promise.all(pages.map((page) => list(`pageSize=200&page=${page}`)));
		const ids = all.flatMap(({ items }) => items.map(({ id }) => id));
		expect(ids).toHaveLength(first.total);
		expect(new Set(ids).size).toBe(first.total);
		expect((await list('page=9999')).items).toEqual([]);
	});

	it.each([
		['ipe 3', ['IPE 300', 'IPE 330', 'IPE 360']],
		['hea300', ['HE 300 A']],
		['457x191x67', ['UB 457x191x67']],
		['w14x2', ['W14X22', 'W14X26', 'W14X211']]
	])('puts the best answers to "%s" first', async (q, expected) => {
		const found = await names(`q=${encodeURIComponent(q)}&pageSize=10`);
		expect(found.slice(0, expected.length)).toEqual(expected);
	});

	it('filters by family and catalogue, and sorts both ways', async () => {
		const light = await list('family=IPE&sort=mass&pageSize=200');
		expect(light.items[0]?.designation).toBe('IPE 80');
		expect(light.items.every(({ family }) => family === 'IPE')).toBe(true);
		const heavy = await list('family=IPE&sort=-mass&pageSize=200');
		expect(heavy.items.map(({ id }) => id)).toEqual(light.items.map(({ id }) => id).reverse());
		const catalogue = light.items[0]?.catalogue ?? '';
		expect((await list(`catalogue=${catalogue}&family=IPE`)).total).toBe(light.total);
	});

	it('filters by standard', async () => {
		const { items, total } = await list('standard=EN%2010056-1&pageSize=200');
		expect(total).toBeGreaterThan(0);
		expect(total).toBeLessThan((await list('pageSize=1')).total);
		expect(items.every(({ standard }) => standard === 'EN 10056-1')).toBe(true);
	});

	it('refuses a parameter that it does not know, and names those that it does', async () => {
		const { status, body } = await call('/api/v1/shapes?standart=EN%2010056-1');
		expect({ status, body }).toMatchObject({
			status: 400,
			body: { error: { code: 'invalid_request', issues: [{ path: 'standart' }] } }
		});
		expect(JSON.stringify(body)).toContain('did you mean');
		expect(JSON.stringify(body)).toContain('pageSize');
	});

	it('joins words, filter and sort', async () => {
		const found = await list('q=ipe&family=IPE&sort=-height&pageSize=1');
		expect(found.items[0]?.designation).toBe('IPE 600');
	});

	it.each(['page=0', 'page=x', 'pageSize=100000', 'sort=colour'])('refuses %s', async (query) => {
		const { status, body } = await call(`/api/v1/shapes?${query}`);
		expect({ status, body }).toMatchObject({
			status: 400,
			body: { error: { code: 'invalid_request', issues: [{ path: query.split('=')[0] }] } }
		});
	});
});

describe('GET /api/v1/shapes/[id]', () => {
	it('reads definition and properties (EN 10365: IPE 300 is 300 × 150 × 7.1 × 10.7, r 15)', async () => {
		const { body } = await call('/api/v1/shapes/en10365-ipe-300');
		const { definition, properties } = shapeSchema.parse(body);
		expect(definition).toMatchObject({ kind: 'i', h: 300, b: 150, tw: 7.1, tf: 10.7, r: 15 });
		expect(properties.plasticModulusY / 1e3).toBeCloseTo(628.4, 1);
	});

	it('answers 404 to an id that is not there', async () => {
		expect(await call('/api/v1/shapes/en10365-ipe-301')).toMatchObject({
			status: 404,
			body: { error: { code: 'unknown_shape' } }
		});
	});
});

describe('GET /api/v1/shapes/index.json', () => {
	it('holds every shape in brief, fit for the same search in the browser', async () => {
		const { body } = await call('/api/v1/shapes/index.json');
		const rows = body as ShapeIndexRow[];
		expect(rows).toHaveLength((await list('pageSize=1')).total);
		const found = searchShapes(rows.map(searchableShape), 'ub 457', 40).map(([, name]) => name);
		expect(found[0]).toBe('UB 457x152x52');
		expect(found).toEqual(await names('q=ub+457&pageSize=40'));
	});

	it('is not sent again to whoever has it', async () => {
		const { headers } = await call('/api/v1/shapes/index.json');
		const again = await call('/api/v1/shapes/index.json', {
			headers: { 'if-none-match': headers.get('etag') ?? '' }
		});
		expect(again).toMatchObject({ status: 304, body: null });
	});
});
