import { sizeLimits, coordinateLimit } from '$lib/engine/tolerances';
import { must, mustHold } from './describe';
import { rangeWords, type Range } from './ranges';
import { z } from './zod';

/** Number with a unit, its title used in messages and in the description of the API. */
export const quantity = (title: string, unit: string) =>
	z
		.number({ error: must(title, unit ? `a number in ${unit}` : 'a plain number') })
		.meta({ title, ...(unit ? { 'x-unit': unit } : {}) });

/** Number with a unit inside a range; the message names the field, what came and the limits. */
export const within = (title: string, unit: string, range: Range) => {
	const error = must(title, rangeWords(range, unit));
	const number = z
		.number({ error: must(title, unit ? `a number in ${unit}` : 'a plain number') })
		.max(range.most, { error });
	const bounded =
		range.above === undefined
			? number.min(range.least ?? -range.most, { error })
			: number.gt(range.above, { error });
	return bounded.meta({ title, ...(unit ? { 'x-unit': unit } : {}) });
};

/** Whole number inside a range. */
export const wholeWithin = (title: string, range: Range) =>
	z
		.number({ error: must(title, 'a whole number') })
		.refine(
			(value) => Number.isInteger(value) && value >= (range.least ?? 0) && value <= range.most,
			{
				error: must(title, `a whole number ${rangeWords(range, '')}`)
			}
		)
		.meta({ title, type: 'integer', minimum: range.least ?? 0, maximum: range.most });

/** A length of the section, mm; the engine holds it between 0.01 mm and 100 m. */
export const size = (title: string) =>
	quantity(title, 'mm').meta({
		title,
		'x-unit': 'mm',
		minimum: sizeLimits.least,
		maximum: sizeLimits.most
	});

/** A length that may be 0, such as a root radius, mm. */
export const sizeOrZero = (title: string) =>
	quantity(title, 'mm').meta({ title, 'x-unit': 'mm', minimum: 0, maximum: sizeLimits.most });

/** A coordinate, mm, within 1 km of the origin. */
export const coordinate = (title: string) =>
	quantity(title, 'mm').meta({
		title,
		'x-unit': 'mm',
		minimum: -coordinateLimit,
		maximum: coordinateLimit
	});

/** One of a few words. */
export const oneOf = <const W extends readonly [string, ...string[]]>(title: string, words: W) =>
	z.enum(words, { error: must(title, words.map((w) => `"${w}"`).join(' or ')) }).meta({ title });

/** Object that refuses fields it does not know, so that a misspelt one never passes unseen. */
export const strict = <S extends z.ZodRawShape>(title: string, shape: S) =>
	z.strictObject(shape, { error: mustHold(title, Object.keys(shape)) });

/** List with a stated greatest length. */
export const listOf = <T extends z.ZodType>(title: string, item: T, most: number) =>
	z.array(item, { error: must(title, 'a list') }).max(most, {
		error: (issue) =>
			`${title} may hold at most ${most} entries, not ${Array.isArray(issue.input) ? issue.input.length : 'more'}.`
	});

/** Text of at most `most` characters. */
export const text = (title: string, most: number) =>
	z
		.string({ error: must(title, 'text') })
		.max(most, { error: `${title} may have at most ${most} characters.` });
