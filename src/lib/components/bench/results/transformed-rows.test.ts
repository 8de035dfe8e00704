import { describe, expect, it } from 'vitest';
import { prepareSection } from '$lib/engine/section/prepare';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { transformedRows } from './transformed-rows';

const si = { system: 'si', decimal: 'point' } as const;
const rowsOf = (definition: SectionDefinition) => {
	const built = prepareSection(definition);
	if (!built.ok) throw new Error(built.error[0]?.message);
	return transformedRows(built.value, si);
};
/** Two plates of 100 × 20, one upon the other; the upper one with half the E. */
const plates = (upper: SectionDefinition['grade']): SectionDefinition => ({
	kind: 'plates',
	plates: [
		{ name: 'lower', y: 0, z: 10, angle: 0, width: 100, thickness: 20 },
		{ name: 'upper', y: 0, z: 30, angle: 0, width: 100, thickness: 20 }
	],
	joins: [{ a: 'lower', b: 'upper' }],
	grade: { fy: 250, fu: 400, E: 200_000 },
	partGrades: { upper }
});

describe('transformed values', () => {
	it('count the softer plate by its share: A = 30 cm², centroid at (2·10 + 30)/3 mm', () => {
		const shown = rowsOf(plates({ fy: 250, fu: 400, E: 100_000 }));
		expect(shown?.modulus).toMatch(/^200.000.N\/mm²$/);
		const figure = (name: string) => shown?.rows.find((row) => row.name === name)?.figure;
		expect(figure('Area')).toBe('30.00');
		expect(figure('Centroid from base')).toBe('16.67');
		// own axes 100·20³/12 (1 + ½), and 2000·6.667² + 1000·13.333² apart, mm⁴
		expect(figure('Second moment, y–y')).toBe('36.67');
	});

	it('are not shown where every part has the same E', () => {
		expect(rowsOf(plates({ fy: 300, fu: 400, E: 200_000 }))).toBeNull();
	});
});
