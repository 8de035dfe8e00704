import { describe, expect, it } from 'vitest';
import { fieldRows, schemaTables } from './field-rows';
import { componentSchemas } from './openapi';
import { sectionKinds } from './section';

const schemas = componentSchemas();
const rowsOf = (id: string) => fieldRows(schemas[id] ?? {});
const row = (id: string, name: string) => rowsOf(id).find((one) => one.name === name);

describe('fieldRows', () => {
	it('tells unit and whether a figure may be absent', () => {
		expect(row('AnalyseAnswer', 'squashLoad')).toMatchObject({ type: 'number | null', unit: 'kN' });
		expect(row('GrossProperties', 'area')).toMatchObject({ unit: 'mm²', required: true });
	});

	it('reaches into objects and lists', () => {
		expect(row('AnalyseAnswer', 'classification.elements[].part')?.type).toBe('string');
		expect(row('GrossProperties', 'centroid.y')?.type).toBe('number');
	});

	it('points to the schema that says more', () => {
		expect(row('AnalyseRequest', 'demands')).toMatchObject({
			type: 'list of Demand',
			schema: 'Demand'
		});
		expect(row('AnalyseRequest', 'partGrades')).toMatchObject({ schema: 'Grade' });
	});
});

describe('schemaTables', () => {
	it('gives one table for each kind of section', () => {
		expect(schemaTables(schemas.Section ?? {}).map(({ title }) => title)).toEqual(sectionKinds);
	});

	it('leaves a law without fields of its own a table of its type alone', () => {
		const titles = schemaTables(schemas.Law ?? {}).map(({ title }) => title);
		expect(titles).toContain('quad-linear');
	});
});
