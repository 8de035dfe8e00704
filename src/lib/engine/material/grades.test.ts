import { describe, expect, it } from 'vitest';
import { gradeNames, materialOf } from './grades';
import type { GradeDefinition, StrengthBasis } from './material';

function strengths(grade: GradeDefinition, thickness: number, basis: StrengthBasis) {
	const material = materialOf(grade, thickness, basis);
	if (!material.ok) throw new Error(material.error);
	return material.value;
}

function refusal(grade: GradeDefinition, thickness: number, basis: StrengthBasis): string {
	const material = materialOf(grade, thickness, basis);
	return material.ok ? 'accepted' : material.error;
}

describe('EN strengths by thickness', () => {
	// EN 10025-2 Table 7 (from memory): S355 steps at 16, 40, 63, 80, 100, 150 mm.
	it.each([
		[16, 355],
		[16.01, 345],
		[40, 345],
		[40.5, 335],
		[63, 335],
		[80, 325],
		[100, 315],
		[150, 295]
	])('takes S355 at %d mm as %d by the product standard', (thickness, fy) => {
		expect(strengths('S355', thickness, 'product-standard').fy).toBe(fy);
	});

	// EN 1993-1-1:2005 Table 3.1 (from memory): two bands only.
	it.each([
		['S235', 40, 235, 360],
		['S235', 40.1, 215, 360],
		['S355', 20, 355, 490],
		['S355', 60, 335, 470],
		['S460M', 80, 430, 530],
		['S460Q', 80, 440, 550],
		['S355H', 30, 355, 510],
		['S460MH', 12, 460, 530]
	])('takes %s at %d mm as fy %d, fu %d by the code table', (grade, thickness, fy, fu) => {
		expect(strengths(grade, thickness, 'code-table')).toMatchObject({ fy, fu });
	});

	it('keeps fu of S355 at 470 by the product standard and 490 by the code table', () => {
		expect(strengths('S355', 10, 'product-standard').fu).toBe(470);
		expect(strengths('S355', 10, 'code-table').fu).toBe(490);
	});

	it('never gets stronger with thickness', () => {
		for (const name of gradeNames) {
			let last = Number.POSITIVE_INFINITY;
			for (let thickness = 1; thickness <= 150; thickness++) {
				const material = materialOf(name, thickness, 'product-standard');
				if (!material.ok) break;
				expect(material.value.fy).toBeLessThanOrEqual(last);
				last = material.value.fy;
			}
			expect(last).toBeLessThan(700);
		}
	});
});

describe('ways to write a grade', () => {
	it.each([
		['S355J2', 'S355'],
		['s355 k2', 'S355'],
		['S355 JR', 'S355'],
		['S460 NL', 'S460N'],
		['S420 M/ML', 'S420M'],
		['S355 J2H', 'S355H'],
		['S460 NLH', 'S460NH'],
		['S460 QL1', 'S460Q'],
		['ASTM A572 Grade 50', 'A572 Gr 50'],
		['A500 Gr. C shaped', 'A500 Gr C shaped']
	])('reads %s as %s', (written, name) => {
		expect(strengths(written, 10, 'product-standard').grade).toBe(name);
	});

	it('takes a plain number as fy at any thickness', () => {
		expect(strengths(301, 400, 'code-table')).toMatchObject({
			fy: 301,
			fyc: 301,
			fu: null,
			E: 210_000,
			density: 7850
		});
	});

	it('keeps a different strength in compression and a density of its own', () => {
		const given = { fy: 200, fyc: 150, E: 70_000, density: 2700 };
		expect(strengths(given, 5, 'code-table')).toMatchObject(given);
	});

	it('gives ASTM grades their modulus and exact ksi', () => {
		const steel = strengths('A992', 30, 'code-table');
		expect(steel.E).toBe(200_000);
		// 1 ksi = 6.894757293 N/mm² (definition of pound-force and inch).
		expect(steel.fy).toBeCloseTo(50 * 6.894757293, 6);
	});
});

describe('what is refused', () => {
	it('names grade, thickness and band outside a table', () => {
		expect(refusal('S355', 90, 'code-table')).toBe(
			'S355 has no strength at 90 mm: EN 1993-1-1 Table 3.1 covers thicknesses up to 80 mm.'
		);
		expect(refusal('S460MH', 45, 'product-standard')).toContain('up to 40 mm');
	});

	it('lists near names for an unknown grade', () => {
		expect(refusal('S356', 10, 'code-table')).toContain('S355');
		const tube = refusal('A500 Gr B', 10, 'code-table');
		expect(tube).toContain('A500 Gr B round');
		expect(tube).toContain('A500 Gr B shaped');
	});

	it('says when a basis does not list the grade', () => {
		expect(refusal('S460', 10, 'code-table')).toContain('not in EN 1993-1-1 Table 3.1');
	});

	it.each([0, -5, Number.NaN, Number.POSITIVE_INFINITY])('does not take fy %d', (fy) => {
		expect(refusal(fy, 10, 'code-table')).toContain('fy must be a number greater than 0');
	});

	it('does not take fu below fy', () => {
		expect(refusal({ fy: 355, fu: 300 }, 10, 'code-table')).toContain('fu 300');
	});
});
