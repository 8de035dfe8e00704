import type { SectionDefinition } from '$lib/engine/section/definition';
import { must } from './describe';
import {
	coordinate,
	listOf,
	oneOf,
	size,
	sizeOrZero,
	strict,
	text,
	wholeWithin,
	within
} from './fields';
import { gradeSchema } from './grade';
import { limits } from './limits';
import { ranges } from './ranges';
import { z } from './zod';

const boltHoles = strict('An entry of boltHoles', {
	part: text('part', limits.name),
	diameter: size('Hole diameter'),
	count: wholeWithin('Number of holes', ranges.boltHoles)
});

const steel = {
	grade: gradeSchema,
	partGrades: z
		.record(z.string(), gradeSchema, { error: must('partGrades', 'an object of part → grade') })
		.optional(),
	boltHoles: listOf('boltHoles', boltHoles, limits.boltHoles).optional()
};

const weld = {
	weldLeg: sizeOrZero('Fillet leg (weldLeg)').optional(),
	weldThroat: sizeOrZero('Fillet throat (weldThroat)').optional()
};
const r = sizeOrZero('Root radius (r)').optional();
const rToe = sizeOrZero('Toe radius (rToe)').optional();
const h = size('Depth (h)');
const b = size('Width (b)');
const tw = size('Web thickness (tw)');
const tf = size('Flange thickness (tf)');
const t = size('Thickness (t)');
const d = size('Diameter (d)');

const iSection = strict('An I section', {
	kind: z.literal('i'),
	...{ h, b, tw, tf },
	bBottom: size('Bottom flange width (bBottom)').optional(),
	tfBottom: size('Bottom flange thickness (tfBottom)').optional(),
	fabrication: oneOf('Fabrication', ['rolled', 'welded']),
	r,
	...weld,
	...steel
});

const channel = strict('A channel', {
	kind: z.literal('channel'),
	...{ h, b, tw, tf, r, rToe },
	flangeSlopePercent: within('Slope of the inner flange face', '%', ranges.slope).optional(),
	tfAt: oneOf('tfAt', ['half-flange', 'half-outstand']).optional(),
	...steel
});

const tee = strict('A tee', {
	kind: z.literal('tee'),
	...{ h, b, tw, tf, r },
	fabrication: oneOf('Fabrication', ['rolled', 'welded']),
	...weld,
	...steel
});

const angle = strict('An angle', {
	kind: z.literal('angle'),
	h: size('Vertical leg (h)'),
	b: size('Horizontal leg (b)'),
	...{ t, r, rToe },
	...steel
});

const rectangularHollow = strict('A rectangular hollow section', {
	kind: z.literal('rectangular-hollow'),
	...{ h, b, t },
	ro: sizeOrZero('Outside corner radius (ro)').optional(),
	ri: sizeOrZero('Inside corner radius (ri)').optional(),
	fabrication: oneOf('Fabrication', ['hot-finished', 'cold-formed']),
	...steel
});

const circularHollow = strict('A circular hollow section', {
	kind: z.literal('circular-hollow'),
	...{ d, t },
	...steel
});

const box = strict('A box', {
	kind: z.literal('box'),
	...{ h, b, tw },
	tfTop: size('Top flange thickness (tfTop)'),
	tfBottom: size('Bottom flange thickness (tfBottom)'),
	webGap: size('Clear distance between webs (webGap)'),
	bBottom: size('Bottom flange width (bBottom)').optional(),
	...weld,
	...steel
});

const flat = strict('A flat bar', { kind: z.literal('flat'), ...{ b, h }, ...steel });
const round = strict('A round bar', { kind: z.literal('round'), d, ...steel });

const plate = strict('A plate', {
	name: text('Name of a plate', limits.name),
	width: size('Width of a plate'),
	thickness: size('Thickness of a plate'),
	y: coordinate('Centre y of a plate'),
	z: coordinate('Centre z of a plate'),
	angle: within('Angle of a plate', 'degrees', ranges.angle),
	grade: gradeSchema.optional()
});

const join = strict('A join', {
	a: text('Plate a of a join', limits.name),
	b: text('Plate b of a join', limits.name),
	weldLeg: sizeOrZero('Fillet leg of a join').optional()
});

const plates = strict('A section of plates', {
	kind: z.literal('plates'),
	plates: listOf('plates', plate, limits.plates),
	joins: listOf('joins', join, limits.plates).optional(),
	tied: z.boolean({ error: must('tied', 'true or false') }).optional(),
	...steel
});

const point = z.tuple([coordinate('Coordinate y'), coordinate('Coordinate z')], {
	error: must('A point', 'a pair [y, z] in mm')
});
const ring = listOf('A ring', point, limits.points);
const holes = listOf('holes', ring, limits.points).optional();
const region = strict('A region', { outer: ring, holes, grade: gradeSchema.optional() });

type Rings = { outer?: readonly unknown[]; holes?: readonly (readonly unknown[])[] };
const pointCount = ({ outer = [], holes: inner = [] }: Rings) =>
	outer.length + inner.reduce((sum, hole) => sum + hole.length, 0);

const outline = strict('An outline', {
	kind: z.literal('outline'),
	regions: listOf('regions', region, limits.points).optional(),
	outer: ring.optional(),
	holes,
	...steel
})
	.refine((one) => (one.regions === undefined) !== (one.outer === undefined), {
		error: 'An outline takes either regions, or outer (with holes) for a single region.'
	})
	.refine(
		(one) => [one, ...(one.regions ?? [])].reduce((n, x) => n + pointCount(x), 0) <= limits.points,
		{
			error: `An outline may hold at most ${limits.points} points over all its rings.`
		}
	);

const kinds = [
	...([iSection, channel, tee, angle, rectangularHollow, circularHollow, box] as const),
	...([flat, round, plates, outline] as const)
] as const;

const kindOf = (input: unknown) =>
	typeof input === 'object' && input !== null && 'kind' in input ? input.kind : undefined;

/** Names of every kind of section, in the order of the contract. */
export const sectionKinds = kinds.map(
	(kind) => [...kind.shape.kind.values][0] as SectionDefinition['kind']
);

/** A section as it comes in. Sizes and fits are judged by the engine, shape and words here. */
export const sectionSchema = z
	.discriminatedUnion('kind', kinds, {
		error: (issue) =>
			issue.code === 'invalid_union'
				? must(
						'Kind of section',
						`one of ${sectionKinds.join(', ')}`
					)({ input: kindOf(issue.input) })
				: must('Section', 'an object with a kind and its dimensions')(issue)
	})
	.meta({
		id: 'Section',
		description:
			'Lengths in mm, y to the right and z up. Parametric kinds are measured from the lower left corner of their bounding box; plates and outline keep their own coordinates.'
	});

export type SectionInput = z.infer<typeof sectionSchema>;
