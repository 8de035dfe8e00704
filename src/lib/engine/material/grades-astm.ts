import { gradeTable, type NamedGrade } from './grades-table';

const modulus = 200_000;

/** N/mm² in one ksi: 4.4482216152605 N per lbf, 25.4 mm per inch, both exact. */
const ksi = (1000 * 4.448_221_615_260_5) / 25.4 ** 2;
const inch = 25.4;

/** Same strengths under both bases; the specification's ksi values, exactly converted. */
function grade(
	name: string,
	source: string,
	bands: readonly (readonly [upToInches: number | null, fy: number, fu: number])[]
): NamedGrade {
	const table = gradeTable(
		source,
		bands.map(([upTo]) => (upTo === null ? null : upTo * inch)),
		bands.map(([, fy]) => fy * ksi),
		bands.map(([, , fu]) => fu * ksi)
	);
	return { name, E: modulus, codeTable: table, productStandard: table };
}

/**
 * ASTM structural steels, from memory of the specifications (minimum yield and tensile strength).
 * A500 depends on the form of the tube, so the name says it; round grade C is the lower value of
 * the editions before 2021.
 */
export const astmGrades: readonly NamedGrade[] = [
	grade('A36', 'ASTM A36', [
		[8, 36, 58],
		[null, 32, 58]
	]),
	grade('A992', 'ASTM A992', [[null, 50, 65]]),
	grade('A572 Gr 42', 'ASTM A572', [[6, 42, 60]]),
	grade('A572 Gr 50', 'ASTM A572', [[4, 50, 65]]),
	grade('A572 Gr 55', 'ASTM A572', [[2, 55, 70]]),
	grade('A572 Gr 60', 'ASTM A572', [[1.25, 60, 75]]),
	grade('A572 Gr 65', 'ASTM A572', [[1.25, 65, 80]]),
	grade('A913 Gr 50', 'ASTM A913', [[null, 50, 65]]),
	grade('A913 Gr 65', 'ASTM A913', [[null, 65, 80]]),
	grade('A53 Gr B', 'ASTM A53', [[null, 35, 60]]),
	grade('A500 Gr B round', 'ASTM A500', [[1, 42, 58]]),
	grade('A500 Gr B shaped', 'ASTM A500', [[1, 46, 58]]),
	grade('A500 Gr C round', 'ASTM A500', [[1, 46, 62]]),
	grade('A500 Gr C shaped', 'ASTM A500', [[1, 50, 62]]),
	grade('A1085', 'ASTM A1085', [[1, 50, 65]])
];
