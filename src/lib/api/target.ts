import { must } from './describe';
import { gradeSchema } from './grade';
import { sectionSchema } from './section';
import { z } from './zod';

/** What a compute request is about: a section in full, or a shape of the catalogues by its id. */
export const targetFields = {
	section: sectionSchema.optional(),
	shapeId: z
		.string({ error: must('shapeId', 'the id of a shape, such as "en10365-ipe-300"') })
		.max(200)
		.optional()
		.meta({ description: 'Instead of section: the id of a catalogue shape.' }),
	version: z
		.int({ error: must('version', 'a whole number') })
		.min(1, { error: 'version must be 1 or more.' })
		.optional()
		.meta({ description: 'Version of the shape; the latest when absent.' }),
	grade: gradeSchema
		.optional()
		.meta({ description: 'With shapeId: the grade of the shape, instead of its default.' }),
	partGrades: z
		.record(z.string(), gradeSchema)
		.optional()
		.meta({ description: 'With shapeId: grades of single parts.' })
};

interface Target {
	section?: unknown;
	shapeId?: string;
}

/** Exactly one of the two says what is meant. */
export const namesOneTarget = (request: Target) =>
	(request.section === undefined) !== (request.shapeId === undefined);

export const targetMissing = {
	error: 'Give either section, or shapeId: one of them and not both.',
	path: ['section']
};
