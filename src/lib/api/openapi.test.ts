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
		expect(Object.keys(document.paths)).toEqual(operations.map(({ path }) => path));
	});

	it('refers only to schemas that are there', () => {
		const names = references(document).map((one) => one.replace('#/components/schemas/', ''));
		expect(names.length).toBeGreaterThan(20);
		const known = Object.keys(document.components.schemas);
		expect(names.filter((name) => !known.includes(name))).toEqual([]);
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
