import { describe, expect, it } from 'vitest';
import { openApiDocument } from './openapi';
import { operations } from './operations';
import { sectionKinds } from './section';

const document = JSON.parse(JSON.stringify(openApiDocument())) as ReturnType<
	typeof openApiDocument
>;

const references = (value: unknown): string[] => {
	if (Array.isArray(value)) return value.flatMap(references);
	if (typeof value !== 'object' || value === null) return [];
	return Object.entries(value).flatMap(([key, inner]) =>
		key === '$ref' ? [String(inner)] : references(inner)
	);
};

describe('openApiDocument', () => {
	it('describes every route', () => {
		expect(document.openapi).toBe('3.1.0');
		const told = Object.entries(document.paths).flatMap(([path, methods]) =>
			Object.keys(methods).map((method) => `${method} ${path}`)
		);
		expect(told.sort()).toEqual(operations.map(({ method, path }) => `${method} ${path}`).sort());
		expect(told).toContain('get /api/v1/health');
		expect(told).toContain('patch /api/v1/sections/{id}');
	});

	it('refers only to schemas that are there', () => {
		const names = references(document).map((one) => one.replace('#/components/schemas/', ''));
		expect(names.length).toBeGreaterThan(20);
		const known = Object.keys(document.components.schemas);
		expect(names.filter((name) => !known.includes(name))).toEqual([]);
	});

	it('tells what needs a session, and what a conflict carries', () => {
		const patch = document.paths['/api/v1/sections/{id}']?.patch;
		expect(patch?.security).toEqual([{ session: [] }]);
		expect(JSON.stringify(patch?.responses['409'])).toContain('SectionConflict');
		expect(JSON.stringify(document.paths['/api/v1/health']?.get?.responses['503'])).toContain(
			'Health'
		);
	});

	it('describes each kind of section apart, refusing fields it does not know', () => {
		const variants = document.components.schemas.Section?.oneOf as {
			properties: { kind: { const: string } };
			additionalProperties: boolean;
		}[];
		expect(variants.map(({ properties }) => properties.kind.const)).toEqual(sectionKinds);
		expect(variants.every((one) => one.additionalProperties === false)).toBe(true);
	});

	it('carries units, and leaves answers open for fields to come', () => {
		const gross = document.components.schemas.GrossProperties;
		expect(gross?.properties?.area).toMatchObject({ type: 'number', 'x-unit': 'mm²' });
		expect(gross?.additionalProperties).toBeUndefined();
	});

	it('has no other dialect or address inside', () => {
		expect(JSON.stringify(document)).not.toMatch(/"\$schema"|"\$id"|\$defs/);
	});
});
