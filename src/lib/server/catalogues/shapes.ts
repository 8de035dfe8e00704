import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import Papa from 'papaparse';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { aliasesOf } from './aliases';
import { catalogueSources, type CatalogueSource } from './list';
import type { SourceRow } from './row';

/** One shape of a shipped catalogue: identity is designation and standard. */
export interface CatalogueShape {
	readonly designation: string;
	readonly standard: string;
	/** IPE, HE A, UB, W, HSS rect … as in the file. */
	readonly family: string;
	readonly aliases: readonly string[];
	/** Sizes in mm, with a usual grade of its standard. */
	readonly definition: SectionDefinition;
	readonly sourceRow: SourceRow;
}

export interface Catalogue {
	readonly catalogue: {
		readonly id: string;
		readonly title: string;
		readonly standard: string;
		/** Edition, and how the dimensions were confirmed. */
		readonly source: string;
		/** SHA-256 of the shapes below; the same as long as nothing in them changes. */
		readonly contentHash: string;
	};
	readonly shapes: readonly CatalogueShape[];
}

/**
 * Every shipped catalogue, read from `data/` below the project's root (the working directory).
 * Dimensions only: properties are the engine's. Throws when a file of the release is damaged.
 */
export function catalogueShapes(root = process.cwd()): Catalogue[] {
	return catalogueSources.map((listed) => {
		const { id, title, standard, source } = listed;
		const shapes = rowsOf(resolve(root, 'data', listed.file)).map((row) => shapeIn(listed, row));
		const contentHash = createHash('sha256').update(JSON.stringify(shapes)).digest('hex');
		return { catalogue: { id, title, standard, source, contentHash }, shapes };
	});
}

function rowsOf(path: string): SourceRow[] {
	const text = readFileSync(path, 'utf8');
	const { data, errors } = Papa.parse<SourceRow>(text, { header: true, skipEmptyLines: true });
	const [first] = errors;
	if (first) throw new Error(`${path}: ${first.message}`);
	return data;
}

function shapeIn({ standard, definition }: CatalogueSource, row: SourceRow): CatalogueShape {
	return {
		designation: row.designation ?? '',
		standard,
		family: row.group ?? '',
		aliases: aliasesOf(row),
		definition: definition(row),
		sourceRow: row
	};
}
