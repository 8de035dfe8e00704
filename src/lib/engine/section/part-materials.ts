import { materialOf } from '../material/grades';
import type { GradeDefinition, StrengthBasis } from '../material/material';
import { fail, ok, type Issue, type Result } from '../result';
import type { SectionDefinition } from './definition';
import type { Part } from './prepared';
import type { Shape, ShapePart } from './shape';

interface PartGrade {
	readonly grade: GradeDefinition;
	/** Where the grade was written, for issues. */
	readonly path: string;
	/** Thickness that sets its nominal strength, mm. */
	readonly thickness: number;
}

/**
 * Parts with their materials. A part's grade is its entry in `partGrades`, else the one stated at
 * the plate or region, else the section's. A rolled or hollow shape takes the strength of its
 * thickest part throughout; a part with its own entry in `partGrades` goes by its own thickness.
 */
export function partsOf(
	definition: SectionDefinition,
	shape: Shape,
	basis: StrengthBasis
): Result<Part[], Issue[]> {
	const thickest = Math.max(...shape.parts.map(({ thickness }) => thickness));
	const parts: Part[] = [];
	const issues: Issue[] = [];
	const made = new Map<string, ReturnType<typeof materialOf>>();
	for (const [index, part] of shape.parts.entries()) {
		const { grade, path, thickness } = gradeOf(definition, part, index, shape, thickest);
		const name = `${typeof grade} ${typeof grade === 'object' ? path : grade} ${thickness}`;
		const material = made.get(name) ?? materialOf(grade, thickness, basis);
		made.set(name, material);
		if (material.ok)
			parts.push({ name: part.name, region: part.region, thickness, material: material.value });
		else if (!issues.some((issue) => issue.path === path))
			issues.push({ path, message: material.error });
	}
	return issues.length > 0 ? fail(issues) : ok(parts);
}

function gradeOf(
	definition: SectionDefinition,
	part: ShapePart,
	index: number,
	{ oneThickness }: Shape,
	thickest: number
): PartGrade {
	const own = ownGrade(definition, part.name);
	if (own !== undefined)
		return { grade: own, path: `partGrades.${part.name}`, thickness: part.thickness };
	const thickness = oneThickness ? thickest : part.thickness;
	if (part.grade === undefined) return { grade: definition.grade, path: 'grade', thickness };
	const list = definition.kind === 'plates' ? 'plates' : 'regions';
	return { grade: part.grade, path: `${list}.${index}.grade`, thickness };
}

/** A part may be called `constructor`: only what was written counts, not what objects inherit. */
const ownGrade = ({ partGrades = {} }: SectionDefinition, name: string) =>
	Object.hasOwn(partGrades, name) ? partGrades[name] : undefined;

/** Names of `partGrades` that the section does not have. */
export function partGradeIssues({ partGrades = {} }: SectionDefinition, shape: Shape): Issue[] {
	return Object.keys(partGrades).flatMap((name) =>
		hasPart(shape, name) ? [] : [{ path: `partGrades.${name}`, message: unknownPart(shape, name) }]
	);
}

export const hasPart = (shape: Shape, name: string): boolean =>
	shape.parts.some((part) => part.name === name);

export const unknownPart = (shape: Shape, name: string): string =>
	`The section has no part “${name}”; its parts are ${shape.parts.map((part) => part.name).join(', ')}.`;
