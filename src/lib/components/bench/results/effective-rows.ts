import { workingKey } from '$lib/engine/explain/keys';
import type { EffectiveProperties } from '$lib/engine/rules/en1993/effective/effective-section';
import type { GrossProperties } from '$lib/engine/section/prepared';
import {
	formatNumber,
	formatQuantity,
	unitLabel,
	type Preferences,
	type Quantity
} from '$lib/units';
import type { EffectiveCase, EffectivePass } from '../effective-view.svelte';
import { elementTitle } from './element-title';

/** A figure of the gross section beside that of one pass and the converged one. */
export interface EffectiveRow {
	readonly name: string;
	readonly unit: string;
	readonly gross: string;
	readonly once: string;
	readonly converged: string;
	/** Key of the working of the one-pass figure. */
	readonly key: string;
	/** Of the converged figure. */
	readonly convergedKey: string;
	/** Of the gross figure; null where the gross section has none to compare. */
	readonly grossKey: string | null;
}

/** The converged figures' name among the workings. */
const convergedBasis = (on: EffectiveCase): string => `${on} converged`;

interface Both {
	readonly once: EffectiveProperties;
	readonly converged: EffectiveProperties;
}

type Figure = Exclude<keyof EffectiveProperties & keyof GrossProperties, 'centroid'>;

const axisY: readonly (readonly [string, Quantity, Figure])[] = [
	['Second moment, y–y', 'secondMoment', 'secondMomentY'],
	['Modulus, top', 'modulus', 'elasticModulusYTop'],
	['Modulus, bottom', 'modulus', 'elasticModulusYBottom']
];
const axisZ: readonly (readonly [string, Quantity, Figure])[] = [
	['Second moment, z–z', 'secondMoment', 'secondMomentZ'],
	['Modulus, left', 'modulus', 'elasticModulusZLeft'],
	['Modulus, right', 'modulus', 'elasticModulusZRight']
];

/** What counts of the section in one case: area, inertia and moduli about its axis, shift of the centroid. */
export function effectiveRows(
	on: EffectiveCase,
	gross: GrossProperties,
	{ once, converged }: Both,
	preferences: Preferences
): EffectiveRow[] {
	const row = ([name, quantity, figure]: readonly [string, Quantity, Figure]): EffectiveRow => {
		const text = (value: number) =>
			formatQuantity(value, quantity, preferences, { digits: 4, grouping: 'always' });
		return {
			name,
			unit: unitLabel(quantity, preferences),
			gross: text(gross[figure]),
			once: text(once[figure]),
			converged: text(converged[figure]),
			key: workingKey.effective(on, figure),
			convergedKey: workingKey.effective(convergedBasis(on), figure),
			grossKey: workingKey.gross(figure)
		};
	};
	const about = on === 'N' ? [] : on.endsWith('y') ? axisY : axisZ;
	return [
		row(['Area', 'area', 'area']),
		...about.map(row),
		...shiftRows(on, { once, converged }, preferences)
	];
}

const shifts = [
	['Centroid moves up', 'centroidShiftZ'],
	['Centroid moves right', 'centroidShiftY']
] as const;

/** Shifts of less than this many millimetres are none. */
const nothing = 1e-6;

function shiftRows(
	on: EffectiveCase,
	{ once, converged }: Both,
	preferences: Preferences
): EffectiveRow[] {
	const decimals = preferences.system === 'us' ? 3 : 1;
	const text = (value: number) =>
		formatQuantity(Math.abs(value) < nothing ? 0 : value, 'length', preferences, { decimals });
	return shifts
		.filter(([, figure]) => Math.max(Math.abs(once[figure]), Math.abs(converged[figure])) > nothing)
		.map(([name, figure]) => ({
			name,
			unit: unitLabel('length', preferences),
			gross: '',
			once: text(once[figure]),
			converged: text(converged[figure]),
			key: workingKey.effective(on, figure),
			convergedKey: workingKey.effective(convergedBasis(on), figure),
			grossKey: null
		}));
}

/** An element's reduction, EN 1993-1-5 Tables 4.1 and 4.2. */
export interface ReductionRow {
	readonly title: string;
	/** ψ, kσ, λp, ρ, width, beff in the order of the table. */
	readonly figures: readonly { readonly text: string; readonly key: string }[];
	/** Whether anything of it is taken away. */
	readonly reduced: boolean;
}

export const reductionRows = (
	on: EffectiveCase,
	{ elements }: EffectiveProperties,
	pass: EffectivePass,
	preferences: Preferences
): ReductionRow[] =>
	elements.map((element) => {
		const number = (value: number) => formatNumber(value, preferences, { digits: 3 });
		const length = (value: number) => formatQuantity(value, 'length', preferences, { digits: 4 });
		const { part, element: id } = element;
		const basis = pass === 'once' ? on : convergedBasis(on);
		const key = (figure: string) => workingKey.effectiveWidthFigure(basis, part, id, figure);
		return {
			title: elementTitle(id, part),
			reduced: element.rho < 1,
			figures: [
				{ text: number(element.psi), key: key('psi') },
				{ text: number(element.kSigma), key: key('kSigma') },
				{ text: number(element.slenderness), key: key('slenderness') },
				{ text: number(element.rho), key: key('rho') },
				{ text: length(element.compressedWidth), key: key('compressedWidth') },
				{ text: length(element.effective), key: workingKey.effectiveWidth(basis, part, id) }
			]
		};
	});
