import { searchableShape, searchShapes } from '$lib/api/shape-search';
import type { SearchableShape, ShapeIndexRow } from '$lib/api/shape-index';
import { sectionSchema } from '$lib/api/section';
import type { SectionDefinition } from '$lib/engine/section/definition';

let loaded: Promise<SearchableShape[]> | null = null;

/** All shapes, fetched once when first asked for; a failed fetch is tried again next time. */
function allShapes(fetcher: typeof fetch): Promise<SearchableShape[]> {
	loaded ??= fetchIndex(fetcher).catch((cause: unknown) => {
		loaded = null;
		throw cause;
	});
	return loaded;
}

async function fetchIndex(fetcher: typeof fetch): Promise<SearchableShape[]> {
	const response = await fetcher('/api/v1/shapes/index.json');
	if (!response.ok) throw new Error(`index of shapes: ${response.status}`);
	return rowsOf(await response.json()).map(searchableShape);
}

/** Rows of the index, which stand alone or under `shapes`. */
function rowsOf(body: unknown): ShapeIndexRow[] {
	if (Array.isArray(body)) return body as ShapeIndexRow[];
	const found: unknown[] = Object.values(body ?? {}).filter(Array.isArray);
	return (found[0] ?? []) as ShapeIndexRow[];
}

/** Shapes that answer what was typed, best first. */
export const findShapes = async (query: string, fetcher = fetch): Promise<ShapeIndexRow[]> =>
	searchShapes(await allShapes(fetcher), query, 60);

/** Definition of a catalogue shape; a sentence when it cannot be had. */
export async function shapeDefinition(
	id: string,
	fetcher = fetch
): Promise<SectionDefinition | null> {
	const response = await fetcher(`/api/v1/shapes/${encodeURIComponent(id)}`).catch(() => null);
	if (!response?.ok) return null;
	const body: unknown = await response.json().catch(() => null);
	return definitionIn(body);
}

function definitionIn(body: unknown): SectionDefinition | null {
	if (typeof body !== 'object' || body === null) return null;
	const held: unknown = Reflect.get(body, 'definition');
	const parsed = sectionSchema.safeParse(held);
	if (parsed.success) return parsed.data as SectionDefinition;
	const inner: unknown = Reflect.get(body, 'shape');
	return inner === undefined ? null : definitionIn(inner);
}
