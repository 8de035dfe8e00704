import type { SectionConflict } from '$lib/api/sections';

export interface ConflictRow {
	readonly name: string;
	readonly theirs: string;
	readonly yours: string;
}

const absent = '–';

/** Fields in which two versions of a section differ, by dotted name. */
export function conflictRows({ theirs, yours }: SectionConflict): ConflictRow[] {
	const left = flat({ name: theirs.name, ...theirs.definition, ...theirs.settings });
	const right = flat({
		name: yours.name ?? theirs.name,
		...(yours.definition ?? theirs.definition),
		...(yours.settings ?? theirs.settings)
	});
	const names = [...new Set([...left.keys(), ...right.keys()])];
	return names
		.filter((name) => left.get(name) !== right.get(name))
		.map((name) => ({
			name,
			theirs: left.get(name) ?? absent,
			yours: right.get(name) ?? absent
		}));
}

function flat(value: unknown, path = '', into = new Map<string, string>()): Map<string, string> {
	if (typeof value === 'object' && value !== null) {
		for (const [key, inner] of Object.entries(value)) {
			flat(inner, path === '' ? key : `${path}.${key}`, into);
		}
	} else if (value !== undefined && value !== null) into.set(path, String(value));
	return into;
}
