import { kindName } from '$lib/components/rack/kind-names';
import { codeChoice } from '$lib/engine/rules/code-choice';
import { formatNumber, formatQuantity, type Preferences } from '$lib/units';
import { gradeTitle } from '../part-grades';
import { partRows } from '../part-rows';
import { partTitle } from '../part-titles';
import type { Study } from '../study';

/** What is said of a version: the name of a field as the form has it, and its value as text. */
export type Entry = readonly [name: string, text: string];

/** Kind, sizes, grades, and whatever else a definition holds. */
export function sectionEntries({ section, shape }: Study, preferences: Preferences): Entry[] {
	const fields = partRows(section)
		.flatMap(({ width, thick }) => [width, thick])
		.filter((field) => field !== null);
	const told = new Set([
		...fields.map(({ path }) => path),
		...['kind', 'grade', 'partGrades', 'h', 'b', 'bBottom', 'tfBottom', 'weldLeg', 'weldThroat']
	]);
	const rest = Object.entries(section).filter(([key]) => !told.has(key));
	return [
		...(shape ? [['Catalogue shape', shape] as const] : []),
		['Kind', kindName(section.kind)],
		...fields.map(({ label, value }): Entry => [label, lengthText(value, preferences)]),
		['Grade', gradeTitle(section.grade)],
		...Object.entries(section.partGrades ?? {}).map(([part, grade]): Entry => [
			`Grade, ${partTitle(part)}`,
			gradeTitle(grade)
		]),
		...rest.flatMap(([key, value]) => looseEntries(wordsOf(key), value, preferences))
	];
}

/** The code choices that the Bench offers, and the others where they are not the usual ones. */
export function codeEntries({ code, strengthBasis }: Study, preferences: Preferences): Entry[] {
	const { standard, gammaM0, gammaM1, gammaM2, eta, allowEffectiveClass2 } = codeChoice(code);
	const figure = (value: number) => formatNumber(value, preferences, { digits: 6, trim: true });
	return [
		['Edition', standard],
		[
			'Strength by thickness from',
			strengthBasis === 'code-table' ? 'code table' : 'product standard'
		],
		['γM0', figure(gammaM0)],
		['γM1', figure(gammaM1)],
		['γM2', figure(gammaM2)],
		['η, shear', figure(eta)],
		['Class 3 web as effective class 2', allowEffectiveClass2 ? 'yes' : 'no']
	];
}

const lengthText = (value: number, preferences: Preferences) =>
	formatQuantity(value, 'length', preferences, { digits: 6, trim: true, unit: true });

/** `flangeSlopePercent` as "Flange slope percent". */
function wordsOf(key: string): string {
	const words = key.replace(/([a-z])([A-Z])/g, '$1 $2').toLowerCase();
	return words.charAt(0).toUpperCase() + words.slice(1);
}

/** Fields that the form does not have: lists and groups are numbered and named in words. */
function looseEntries(name: string, value: unknown, preferences: Preferences): Entry[] {
	if (value === undefined || value === null) return [];
	if (Array.isArray(value))
		return value.flatMap((item, at) => looseEntries(`${name} ${at + 1}`, item, preferences));
	if (typeof value === 'object')
		return Object.entries(value).flatMap(([key, inner]) =>
			looseEntries(`${name}, ${wordsOf(key).toLowerCase()}`, inner, preferences)
		);
	if (typeof value === 'number')
		return [[name, formatNumber(value, preferences, { digits: 6, trim: true })]];
	return [[name, String(value)]];
}
