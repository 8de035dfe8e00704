import { describe, expect, it } from 'vitest';
import { prepareSection } from '$lib/engine/section/prepare';
import { catalogueShapes, type CatalogueShape } from './shapes';

const catalogues = catalogueShapes();
const shapes = catalogues.flatMap((catalogue) => catalogue.shapes);
const shape = (designation: string): CatalogueShape | undefined =>
	shapes.find((candidate) => candidate.designation === designation);

describe('the shipped catalogues', () => {
	it('hold all 2304 shapes of the files', () => {
		expect(shapes).toHaveLength(2304);
	});

	it('prepare without an issue or a note about the input, every one', () => {
		const faults = shapes.flatMap(({ designation, definition }) => {
			const result = prepareSection(definition);
			if (!result.ok) return [`${designation}: ${result.error[0]?.message}`];
			const notes = result.value.notes.filter(({ code }) => code !== 'torsion-not-covered');
			return notes.map(({ message }) => `${designation}: ${message}`);
		});
		expect(faults).toEqual([]);
	});

	it('give every shape an identity of its own', () => {
		const identities = shapes.map(({ standard, designation }) => `${standard} ${designation}`);
		expect(new Set(identities).size).toBe(shapes.length);
	});

	it('give no alias to two shapes of a standard', () => {
		const names = shapes.flatMap(({ standard, designation, aliases }) =>
			[designation, ...aliases].map((name) => `${standard} ${name}`)
		);
		const repeated = names.filter((name, index) => names.indexOf(name) !== index);
		expect(repeated).toEqual([]);
	});

	it('know a shape by the other ways of writing it', () => {
		expect(shape('HE 300 A')?.aliases).toContain('HEA 300');
		expect(shape('IPE 300')?.aliases).toContain('IPE300');
		expect(shape('UB 457x191x67')?.aliases).toContain('457x191x67 UB');
		expect(shape('UB 457x191x67')?.aliases).toContain('UB 457×191×67');
		expect(shape('W44X335')?.aliases).toContain('W1100X499');
		expect(shape('W44X335')?.aliases).toContain('W44×335');
	});

	it('take inches as exactly 25.4 mm', () => {
		expect(shape('W44X335')?.definition).toMatchObject({ h: 1117.6, b: 403.86, tf: 44.958 });
	});

	it('have the same content hash on every reading', () => {
		const again = catalogueShapes().map(({ catalogue }) => catalogue.contentHash);
		expect(again).toEqual(catalogues.map(({ catalogue }) => catalogue.contentHash));
	});
});
