import type { JsonSchema } from './openapi';

/** One line of a table of fields. */
export interface FieldRow {
	/** Path inside the schema: `centroid.y`, `elements[].part`. */
	name: string;
	type: string;
	unit: string;
	required: boolean;
	description: string;
	/** Name of the schema that says more. */
	schema: string | null;
}

/** A schema as tables: one, or one for each of its kinds. */
export interface SchemaTable {
	title: string;
	rows: FieldRow[];
}

type Schema = JsonSchema & { 'x-unit'?: string };

const asSchema = (schema: unknown): Schema =>
	typeof schema === 'object' && schema !== null ? (schema as Schema) : {};

/** What a schema is besides null, and whether it may be null. */
const withoutNull = (schema: Schema): { schema: Schema; nullable: boolean } => {
	const types: unknown = schema.type;
	if (Array.isArray(types) && types.includes('null')) {
		const [type] = types.filter((one) => one !== 'null') as Schema['type'][];
		return { schema: { ...schema, type }, nullable: true };
	}
	const branches = schema.anyOf?.map(asSchema);
	const others = branches?.filter(({ type }) => type !== 'null') ?? [];
	if (!branches || others.length === branches.length) return { schema, nullable: false };
	const rest = others.length === 1 ? others[0] : { anyOf: others };
	return { schema: { ...schema, anyOf: undefined, ...rest }, nullable: true };
};

const nameOf = (ref: string | undefined) => ref?.split('/').at(-1) ?? null;

const words = (values: readonly unknown[]) => values.map((one) => JSON.stringify(one)).join(' | ');

const typeOf = (schema: Schema): string => {
	const ref = nameOf(schema.$ref);
	if (ref) return ref;
	if (schema.const !== undefined) return JSON.stringify(schema.const);
	if (schema.enum) return words(schema.enum);
	const branches = schema.anyOf ?? schema.oneOf;
	if (branches) return branches.map((one) => typeOf(asSchema(one))).join(' | ');
	if (schema.prefixItems)
		return `[${schema.prefixItems.map((one) => typeOf(asSchema(one))).join(', ')}]`;
	if (schema.type === 'array') return `list of ${typeOf(asSchema(schema.items))}`;
	if (schema.type === 'object' && asSchema(schema.additionalProperties).$ref)
		return `object of ${typeOf(asSchema(schema.additionalProperties))}`;
	return String(schema.type ?? 'any');
};

const refOf = (schema: Schema): string | null =>
	nameOf(schema.$ref ?? asSchema(schema.items).$ref ?? asSchema(schema.additionalProperties).$ref);

/** Object behind a field that is written out in place, and how its own fields are reached. */
const innerObject = (schema: Schema): { schema: Schema; joint: string } | null => {
	if (schema.properties) return { schema, joint: '.' };
	const items = asSchema(schema.items);
	return items.properties ? { schema: items, joint: '[].' } : null;
};

/** Fields of an object, those of objects inside it after their parent. */
export const fieldRows = (schema: Schema, before = ''): FieldRow[] =>
	Object.entries(schema.properties ?? {}).flatMap(([key, given]) => {
		const { schema: own, nullable } = withoutNull(asSchema(given));
		const row: FieldRow = {
			name: before + key,
			type: typeOf(own) + (nullable ? ' | null' : ''),
			unit: own['x-unit'] ?? '',
			required: schema.required?.includes(key) ?? false,
			description: own.description ?? (own.title === key ? '' : (own.title ?? '')),
			schema: refOf(own)
		};
		const inner = innerObject(own);
		return inner ? [row, ...fieldRows(inner.schema, row.name + inner.joint)] : [row];
	});

const titleOf = (variant: Schema) =>
	typeOf(asSchema(variant.properties?.kind ?? variant.properties?.type ?? variant)).replaceAll(
		'"',
		''
	);

/** A named schema as tables: one for each kind of a union that has kinds, else one. */
export const schemaTables = (schema: Schema): SchemaTable[] => {
	const variants = (schema.oneOf ?? schema.anyOf ?? [schema]).map(asSchema);
	return variants
		.filter((variant) => variant.properties)
		.map((variant) => ({
			title: variants.length > 1 ? titleOf(variant) : '',
			rows: fieldRows(variant)
		}));
};
