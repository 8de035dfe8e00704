import type { Note } from '../../result';
import type { GrossProperties, PreparedSection } from '../prepared';
import type { TorsionFigures } from '../shape';
import { numericalTorsion, type NumericalTorsion, type NumericalTorsionOutcome } from './numerical';

/** Both answers side by side; null where there is none. */
export interface TorsionReport {
	/** By handbook formulas or the theory of thin walls. */
	readonly handbook: TorsionFigures | null;
	readonly numerical: Omit<NumericalTorsion, 'notes'> | null;
}

export type SectionWithTorsion = PreparedSection & { readonly torsion: TorsionReport };

const names = {
	torsionConstant: 'torsion constant',
	warpingConstant: 'warping constant',
	shearCentre: 'shear centre'
} as const;

const fields = ['torsionConstant', 'warpingConstant', 'shearCentre'] as const;

/** Torsion figures of a section as it was prepared; null when no formula gave any. */
export function handbookTorsion({ gross }: PreparedSection): TorsionFigures | null {
	const { torsionConstant, warpingConstant, shearCentre } = gross;
	const figures = { torsionConstant, warpingConstant, shearCentre };
	return fields.every((field) => figures[field] === null) ? null : figures;
}

/**
 * The section with the numerical torsion solution beside the handbook's (tens of milliseconds). In
 * `gross` the handbook's figures stay, and the numerical ones stand where it has none; a note names
 * these, and `torsion-not-covered` stays only for those that are still missing. `solved`: the solution,
 * where it is known already.
 */
export function withNumericalTorsion(
	section: PreparedSection,
	solved: NumericalTorsionOutcome = numericalTorsion(section)
): SectionWithTorsion {
	const { notes: reasons, ...figures } = { ...none, ...solved };
	const numerical = figures.torsionConstant === null ? null : (figures as NumericalTorsion);
	const gross = { ...section.gross };
	const filled = fields.filter((field) => section.gross[field] === null && figures[field] !== null);
	for (const field of filled) fill(gross, field, figures);
	const missing = fields.filter((field) => gross[field] === null);
	const kept = section.notes.filter(({ code }) => code !== notCovered);
	const notes = [...kept, ...filledNotes(filled, numerical), ...missingNotes(missing, reasons)];
	return { ...section, gross, notes, torsion: { handbook: handbookTorsion(section), numerical } };
}

const none: TorsionFigures = { torsionConstant: null, warpingConstant: null, shearCentre: null };
const notCovered = 'torsion-not-covered';

function fill<F extends keyof TorsionFigures>(
	gross: Pick<GrossProperties, F>,
	field: F,
	figures: Pick<GrossProperties, F>
): void {
	gross[field] = figures[field];
}

type Field = (typeof fields)[number];

const listed = (missing: readonly Field[]): string =>
	missing.map((field) => names[field]).join(', ');

function filledNotes(filled: readonly Field[], numerical: NumericalTorsion | null): Note[] {
	if (filled.length === 0 || !numerical) return [];
	const share = (numerical.error.torsionShare * 100).toPrecision(1);
	const message = `Solved numerically: ${listed(filled)}. The torsion constant is within ${Number(share)} % by bounds from both sides.`;
	return [{ code: 'torsion-numerical', message }];
}

function missingNotes(missing: readonly Field[], reasons: readonly Note[]): Note[] {
	const others = reasons.filter(({ code }) => code !== notCovered);
	if (missing.length === 0) return others;
	const why = reasons.find(({ code }) => code === notCovered)?.message;
	const message = `No published formula and no numerical solution gives: ${listed(missing)}.${why ? ` ${why}` : ''}`;
	return [...others, { code: notCovered, message }];
}
