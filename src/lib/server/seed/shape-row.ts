import { createHash } from 'node:crypto';
import { shapeId } from '../../api/shape-id';
import type { Result } from '../../engine/result';
import { fail, ok } from '../../engine/result';
import { prepareSection } from '../../engine/section/prepare';
import { schemaVersion } from '../../engine/version';
import type { CatalogueShape } from '../catalogues/shapes';
import type { shapes } from '../db/schema';

export type ShapeRow = typeof shapes.$inferInsert;

const longestSearchText = 500;

const contentHashOf = (parts: unknown) =>
	createHash('sha256').update(JSON.stringify(parts)).digest('hex');

const searchTextOf = ({ designation, aliases, family }: CatalogueShape) =>
	[designation, family, ...aliases].join(' ').toLowerCase().slice(0, longestSearchText);

/**
 * A catalogue shape as its row: dims as shipped, properties computed by the engine (mm, mm², mm³,
 * mm⁴, kg/m). Fails with a sentence when the dims make no section.
 */
export const shapeRow = (
	shape: CatalogueShape,
	catalogueId: string,
	position: number
): Result<ShapeRow, string> => {
	const { designation, standard, family, aliases, definition } = shape;
	const prepared = prepareSection(definition);
	if (!prepared.ok) return fail(`${designation}: ${prepared.error[0]?.message ?? 'not valid'}`);
	const properties = prepared.value.gross;
	return ok({
		id: shapeId(standard, designation),
		catalogueId,
		position,
		designation,
		standard,
		family,
		kind: definition.kind,
		aliases: aliases.join('\n'),
		searchText: searchTextOf(shape),
		definition,
		schemaVersion,
		properties,
		area: properties.area,
		mass: properties.mass,
		h: properties.height,
		b: properties.width,
		secondMomentY: properties.secondMomentY,
		elasticModulusY: Math.min(properties.elasticModulusYTop, properties.elasticModulusYBottom),
		plasticModulusY: properties.plasticModulusY,
		contentHash: contentHashOf([definition, properties, aliases])
	});
};
