import { fail, ok, type Result } from '../result';
import { namedGrade, nearGradeNames } from './grades-names';
import type { GradeBand, GradeTable, NamedGrade } from './grades-table';
import { lawOf } from './laws';
import type { GradeDefinition, LawDefinition, Material, StrengthBasis } from './material';

export { gradeNames } from './grades-names';

const steelModulus = 210_000;
const steelDensity = 7850;

interface Strengths {
	grade: string;
	fy: number;
	fyc: number;
	fu: number | null;
	E: number;
	density: number;
	law?: LawDefinition | undefined;
}

/**
 * What a part of this grade and thickness (mm) is made of. A name is looked up in the table of the
 * basis (EN 1993-1-1 Table 3.1 or the product standard); a plain number is fy at any thickness.
 * Defaults: fyc = fy, E = 210 000 N/mm² (ASTM 200 000), 7850 kg/m³. The error is a sentence.
 */
export function materialOf(
	grade: GradeDefinition,
	thickness: number,
	basis: StrengthBasis
): Result<Material, string> {
	const strengths = strengthsOf(grade, thickness, basis);
	return strengths.ok ? withLaw(strengths.value) : strengths;
}

function strengthsOf(
	grade: GradeDefinition,
	thickness: number,
	basis: StrengthBasis
): Result<Strengths, string> {
	if (typeof grade === 'string') return namedStrengths(grade, thickness, basis);
	if (typeof grade === 'number') return givenStrengths({ fy: grade });
	return givenStrengths(grade);
}

function givenStrengths(
	given: Exclude<GradeDefinition, string | number>
): Result<Strengths, string> {
	const { fy, fyc = fy, fu = null, E = steelModulus, density = steelDensity, law } = given;
	const positive = { fy, fyc, E, density, ...(fu === null ? {} : { fu }) };
	for (const [name, value] of Object.entries(positive))
		if (!(Number.isFinite(value) && value > 0))
			return fail(`${name} must be a number greater than 0.`);
	if (fu !== null && fu < fy) return fail(`fu ${fu} must not be less than fy ${fy}.`);
	return ok({ grade: `fy ${fy}`, fy, fyc, fu, E, density, law });
}

function namedStrengths(
	name: string,
	thickness: number,
	basis: StrengthBasis
): Result<Strengths, string> {
	const grade = namedGrade(name);
	if (!grade)
		return fail(`Grade “${name}” is not known. Near names: ${nearGradeNames(name).join(', ')}.`);
	const band = bandOf(grade, thickness, basis);
	if (!band.ok) return band;
	const { fy, fu } = band.value;
	return ok({ grade: grade.name, fy, fyc: fy, fu, E: grade.E, density: steelDensity });
}

function bandOf(
	grade: NamedGrade,
	thickness: number,
	basis: StrengthBasis
): Result<GradeBand, string> {
	const table = basis === 'code-table' ? grade.codeTable : grade.productStandard;
	if (!table)
		return fail(
			`${grade.name} is not in EN 1993-1-1 Table 3.1: take its strengths from the product standard, or another grade.`
		);
	if (!(thickness > 0)) return fail(`${grade.name} needs a thickness greater than 0.`);
	const band = table.bands.find(({ upTo }) => upTo === null || thickness <= upTo);
	return band ? ok(band) : fail(outsideBands(grade.name, thickness, table));
}

function outsideBands(name: string, thickness: number, table: GradeTable): string {
	const last = table.bands.at(-1)?.upTo ?? 0;
	const reach = Number(last.toPrecision(6));
	return `${name} has no strength at ${Number(thickness.toPrecision(6))} mm: ${table.source} covers thicknesses up to ${reach} mm.`;
}

function withLaw(strengths: Strengths): Result<Material, string> {
	const { grade, fy, fyc, fu, E, density } = strengths;
	const law = lawOf(strengths.law, { E, fy, fyc, fu });
	return law.ok ? ok({ grade, fy, fyc, fu, E, density, law: law.value }) : law;
}
