import type { SectionConflict } from '$lib/api/sections';
import type { Study } from '../study';
import { formatQuantity, NO_FIGURE, type Preferences, type Quantity } from '$lib/units';
import { codeEntries, sectionEntries, type Entry } from './version-entries';
import { savedStudy } from './saved-study';

export interface ConflictRow {
	readonly name: string;
	readonly theirs: string;
	readonly yours: string;
}

/** What differs between two versions of a section, named and written as the form shows it. */
export function conflictRows(
	{ theirs, yours }: SectionConflict,
	preferences: Preferences
): ConflictRow[] {
	const left = entries(theirs.name, savedStudy(theirs), preferences);
	const right = entries(
		yours.name ?? theirs.name,
		savedStudy({
			definition: yours.definition ?? theirs.definition,
			settings: yours.settings ?? theirs.settings
		}),
		preferences
	);
	return [...new Set([...left.keys(), ...right.keys()])]
		.filter((name) => left.get(name) !== right.get(name))
		.map((name) => ({
			name,
			theirs: left.get(name) ?? NO_FIGURE,
			yours: right.get(name) ?? NO_FIGURE
		}));
}

function entries(name: string, study: Study, preferences: Preferences): Map<string, string> {
	return new Map([
		['Name', name] as const,
		...sectionEntries(study, preferences),
		...demandEntries(study.demands, preferences),
		...codeEntries(study, preferences)
	]);
}

const effects: readonly (readonly [keyof Study['demands'][number], string, Quantity])[] = [
	['My', 'My', 'moment'],
	['Mz', 'Mz', 'moment'],
	['N', 'N', 'force'],
	['Vz', 'Vz', 'force'],
	['Vy', 'Vy', 'force'],
	['unbracedLength', 'unbraced length', 'length'],
	['C1', 'C1', 'ratio'],
	['zg', 'zg', 'length']
];

/** Each case by its name; the second of one name is told apart by its place. */
function demandEntries(demands: Study['demands'], preferences: Preferences): Entry[] {
	return demands.flatMap((demand, at) => {
		const first = demands.findIndex(({ name }) => name === demand.name) === at;
		const name = first ? demand.name : `${demand.name} (case ${at + 1})`;
		const figures = effects.flatMap(([key, title, quantity]): Entry[] => {
			const value = demand[key];
			if (typeof value !== 'number' || value === 0) return [];
			const text = formatQuantity(value, quantity, preferences, {
				digits: 6,
				trim: true,
				unit: true
			});
			return [[`${name}, ${title}`, text]];
		});
		return [[`Demand case ${name}`, 'there'], ...figures];
	});
}
