import { expect, it } from 'vitest';
import { catalogueShapes } from '../catalogues/shapes';
import { shapeRow } from './shape-row';

const rows = catalogueShapes().flatMap(({ shapes }) =>
	shapes.map((shape, position) => shapeRow(shape, 'catalogue', position))
);

it('every shipped shape is a section', () => {
	expect(rows.flatMap((row) => (row.ok ? [] : [row.error]))).toEqual([]);
});

it('no two shapes share an id or an identity', () => {
	const kept = rows.flatMap((row) => (row.ok ? [row.value] : []));
	expect(new Set(kept.map(({ id }) => id)).size).toBe(kept.length);
	const identities = kept.map(({ standard, designation }) =>
		`${standard}|${designation}`.toLowerCase()
	);
	expect(new Set(identities).size).toBe(kept.length);
});

it('texts fit their columns', () => {
	for (const row of rows) {
		if (!row.ok) continue;
		expect(row.value.id.length).toBeLessThanOrEqual(120);
		expect(row.value.designation.length).toBeLessThanOrEqual(80);
		expect(row.value.searchText.length).toBeLessThanOrEqual(500);
	}
});
