import { fail, ok, type Issue, type Note, type Result } from '../../../engine/result';
import type { GradeDefinition } from '../../../engine/material/material';
import type { SectionDefinition } from '../../../engine/section/definition';
import type { Refusal } from '../refusal';

/** Looks a catalogue shape up; null when there is none of that id. */
export type FindShape = (id: string) => Promise<SectionDefinition | null>;

/** The part of a request that says which section is meant; the schema has seen to one of the two. */
export interface Target {
	section?: SectionDefinition;
	shapeId?: string;
	version?: number;
	grade?: GradeDefinition;
	partGrades?: Readonly<Record<string, GradeDefinition>>;
}

export interface Subject {
	definition: SectionDefinition;
	notes: Note[];
	/** What an issue's path begins with. */
	at: 'section' | 'shapeId';
}

/** Catalogue shapes are nominal dims of one edition: each stands in version 1. */
const latestVersion = 1;

/** 404 for an id that no catalogue has. */
export const noShape = (id: string): Refusal => ({
	status: 404,
	code: 'unknown_shape',
	message: `There is no shape "${id}". Find its id with GET /api/v1/shapes?q=…`
});

const noVersion = (id: string, version: number): Refusal => ({
	status: 422,
	code: 'unknown_version',
	message: `Shape "${id}" has no version ${version}; its latest is ${latestVersion}.`
});

const gradeName = ({ grade }: SectionDefinition) =>
	typeof grade === 'object' ? `fy = ${grade.fy} N/mm²` : String(grade);

const assumedGrade = (definition: SectionDefinition): Note => ({
	code: 'assumed_grade',
	message: `A catalogue shape has no grade of its own: ${gradeName(definition)} was taken. Send grade to choose another.`
});

const withGrades = (definition: SectionDefinition, { grade, partGrades }: Target) => ({
	...definition,
	...(grade === undefined ? {} : { grade }),
	...(partGrades === undefined ? {} : { partGrades })
});

/** The section that a request is about, from itself or from the catalogues. */
export const subjectOf = async (
	target: Target,
	findShape: FindShape
): Promise<Result<Subject, Refusal>> => {
	const { section, shapeId = '', version } = target;
	if (section) return ok({ definition: section, notes: [], at: 'section' });
	const definition = await findShape(shapeId);
	if (!definition) return fail(noShape(shapeId));
	if (version !== undefined && version !== latestVersion) return fail(noVersion(shapeId, version));
	const notes = target.grade === undefined ? [assumedGrade(definition)] : [];
	return ok({ definition: withGrades(definition, target), notes, at: 'shapeId' });
};

/** Issues of the engine with their place in the request: `tw` → `section.tw`. */
export const placed = (issues: readonly Issue[], at: Subject['at']): Issue[] =>
	issues.map(({ path, mend, ...rest }) => ({
		...rest,
		path: placeIn(path, at),
		...(mend && { mend: { ...mend, path: placeIn(mend.path, at) } })
	}));

function placeIn(path: string, at: Subject['at']): string {
	if (at !== 'section') return path || 'shapeId';
	return path ? `section.${path}` : 'section';
}
