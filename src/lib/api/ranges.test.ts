import { describe, expect, it } from 'vitest';
import { analyseRequestSchema } from './analyse';
import { issuesOf } from './issues';
import { rangeWords } from './ranges';
import { responseRequestSchema } from './response';

const section = { kind: 'flat', b: 20, h: 100, grade: 355 };
const analysed = (more: object) => analyseRequestSchema.safeParse({ section, ...more });
const bent = (more: object) =>
	responseRequestSchema.safeParse({ section, at: { curvature: [1] }, ...more });
const withGrade = (grade: unknown) => analysed({ section: { ...section, grade } });
const pathOf = (result: ReturnType<typeof analysed> | ReturnType<typeof bent>) =>
	result.success ? null : (issuesOf(result.error)[0]?.path ?? '');

describe('bounds of numbers', () => {
	it.each([
		['demand.N', analysed({ demand: { N: 1e308 } })],
		['demand.N', analysed({ demand: { N: -1.1e9 } })],
		['demand.Vz', analysed({ demand: { Vz: 1.1e9 } })],
		['demands.0.My', analysed({ demands: [{ My: 1e308 }] })],
		['demand.unbracedLength', analysed({ demand: { unbracedLength: -1 } })],
		['demand.unbracedLength', analysed({ demand: { unbracedLength: 0 } })],
		['demand.C1', analysed({ demand: { C1: 0.05 } })],
		['demand.zg', analysed({ demand: { zg: 1e6 } })],
		['code.gammaM0', analysed({ code: { gammaM0: 1e-308 } })],
		['code.gammaM1', analysed({ code: { gammaM1: 2.1 } })],
		['code.eta', analysed({ code: { eta: 1.1 } })],
		['stiffeners.spacing', analysed({ stiffeners: { spacing: 0, endPost: 'rigid' } })],
		['section.grade', withGrade(1e308)],
		['section.grade', withGrade(0.5)],
		['section.grade.E', withGrade({ fy: 355, E: 1e308 })],
		['section.grade.fu', withGrade({ fy: 355, fu: 1e5 })],
		['section.grade.density', withGrade({ fy: 355, density: 1 })],
		['section.grade.law.Eh', withGrade({ fy: 355, law: { type: 'bilinear', Eh: 1e308 } })],
		[
			'section.grade.law.tension.0.0',
			withGrade({ fy: 355, law: { type: 'curve', tension: [[11, 355]], beyond: 'flat' } })
		],
		[
			'section.boltHoles.0.count',
			analysed({
				section: { ...section, boltHoles: [{ part: 'bar', diameter: 10, count: 1e308 }] }
			})
		],
		[
			'section.boltHoles.0.count',
			analysed({ section: { ...section, boltHoles: [{ part: 'bar', diameter: 10, count: 1.5 }] } })
		],
		['N', bent({ N: 1e308 })],
		['axisAngle', bent({ axisAngle: 1e308 })],
		['at.moment.1', bent({ at: { moment: [0, 1e308] } })],
		['at.curvature.0', bent({ at: { curvature: [1e308] } })],
		['at.curvatureRatio.0', bent({ at: { curvatureRatio: [-1e7] } })],
		['at.strainPlanes.0.ky', bent({ at: { strainPlanes: [{ e0: 0, ky: 1e308, kz: 0 }] } })],
		['at.strainPlanes.0.e0', bent({ at: { strainPlanes: [{ e0: 11, ky: 0, kz: 0 }] } })]
	])('refuses what lies outside at %s', (path, result) => {
		expect(pathOf(result)).toBe(path);
	});

	it.each([
		analysed({ demand: { N: 5e-324, My: -1e-12, Vz: 1e9, unbracedLength: 1e7, C1: 1 } }),
		analysed({ code: { gammaM0: 0.9, gammaM1: 2, eta: 1 } }),
		analysed({ code: { eta: 1.2 } }),
		withGrade({ fy: 1, E: 1000, density: 100 }),
		withGrade(10_000),
		bent({ at: { curvature: [1e6, -1e6] }, axisAngle: -3600 })
	])('takes the bounds themselves, and loads as small as may be', (result) => {
		expect(pathOf(result)).toBeNull();
	});

	it('names the field, the limits and what came', () => {
		const result = analysed({ demand: { N: 1e308 } });
		expect(result.success ? '' : issuesOf(result.error)[0]?.message).toBe(
			`Axial force N must be ${rangeWords({ least: -1e9, most: 1e9 }, 'kN')}, not 1e+308.`
		);
		expect(rangeWords({ least: -1e5, most: 1e5 }, 'mm')).toBe(
			'from −100\u202f000 to 100\u202f000 mm'
		);
		expect(rangeWords({ above: 0, most: 9 }, '')).toBe('greater than 0 and at most 9');
	});
});
