import { describe, expect, it } from 'vitest';
import { analyseAnswerSchema } from '$lib/api/analyse';
import { sectionKinds } from '$lib/api/section';
import { exampleSections } from '$lib/server/http/compute/example-sections';
import { post } from './call';

const asked = async (request: object) => {
	const { status, body } = await post('/api/v1/analyse', request);
	expect({ status, body }).toMatchObject({ status: 200 });
	return analyseAnswerSchema.parse(body);
};

describe('POST /api/v1/analyse', () => {
	it.each(sectionKinds)('answers kind %s with every field of the contract', async (kind) => {
		const demands = [{ name: 'a', N: -10, My: 5, Mz: 1, Vy: 2, Vz: 3 }];
		const answer = await asked({ section: exampleSections[kind], demands });
		expect(answer).toMatchObject({ contract: 1, strengthBasis: 'product-standard' });
		expect(answer.engineVersion).toMatch(/^\d+\.\d+\.\d+$/);
	});

	it('gives IPE 300 its published properties (EN 10365, cm-based, to the printed digits)', async () => {
		const { gross } = await asked({ shapeId: 'en10365-ipe-300' });
		expect(gross.area / 1e2).toBeCloseTo(53.8, 1);
		expect(gross.secondMomentY / 1e4).toBeCloseTo(8356, 0);
		expect(gross.elasticModulusYTop / 1e3).toBeCloseTo(557.1, 1);
		expect(gross.plasticModulusY / 1e3).toBeCloseTo(628.4, 1);
		expect(gross.secondMomentZ / 1e4).toBeCloseTo(603.8, 1);
		expect(gross.plasticModulusZ / 1e3).toBeCloseTo(125.2, 1);
		expect((gross.warpingConstant ?? 0) / 1e9 / 125.9).toBeCloseTo(1, 2);
	});

	it('counts the plastic moment of IPE 300 in S355: Wpl · fy', async () => {
		const { moment, classification, resistance } = await asked({
			shapeId: 'en10365-ipe-300',
			grade: 'S355'
		});
		expect(moment.plasticY).toBeCloseTo((628.4 * 355) / 1e3, 1);
		expect(classification?.overall).toBe(1);
		expect(resistance?.basis).toBe('plastic');
		expect(resistance?.MyRd).toBeCloseTo((628.4 * 355) / 1e3, 1);
	});

	it('gives a rectangle its closed forms: shape factor 1.5, squash load fy·A', async () => {
		const { moment, squashLoad } = await asked({
			section: { kind: 'flat', b: 100, h: 200, grade: 250 }
		});
		expect(moment.shapeFactorY).toBeCloseTo(1.5, 12);
		expect(moment.shapeFactorZ).toBeCloseTo(1.5, 12);
		expect(squashLoad).toBeCloseTo(5000, 9);
	});

	it('gives no resistance to an outline, and says why', async () => {
		const { resistance, notes } = await asked({ section: exampleSections.outline });
		expect(resistance).toBeNull();
		expect(notes.length).toBeGreaterThan(0);
	});

	it('lowers what may be counted with a greater partial factor', async () => {
		const request = { section: exampleSections['rectangular-hollow'] };
		const plain = await asked(request);
		const factored = await asked({ ...request, code: { gammaM0: 1.1 } });
		expect((plain.resistance?.MyRd ?? 0) / (factored.resistance?.MyRd ?? 1)).toBeCloseTo(1.1, 12);
	});

	it('tells with ?explain=1 how each figure came about, and only then', async () => {
		const request = { shapeId: 'en10365-ipe-300', grade: 'S355', demand: { My: 50 } };
		const { status, body } = await post('/api/v1/analyse?explain=1', request);
		expect(status).toBe(200);
		const { explain, resistance } = analyseAnswerSchema.parse(body);
		const working = explain?.['resistance.MyRd'];
		expect(working?.clause).toBe('EN 1993-1-1:2005 6.2.5');
		expect(working?.result).toEqual({ value: resistance?.MyRd, unit: 'kNm' });
		expect((await asked(request)).explain).toBeUndefined();
	});

	it('uses transverse stiffeners in the shear resistance of a slender web', async () => {
		const section = {
			kind: 'i',
			fabrication: 'welded',
			h: 1540,
			b: 400,
			tw: 10,
			tf: 20,
			grade: 355
		};
		const plain = await asked({ section });
		const stiffeners = { spacing: 1500, endPost: 'non-rigid' };
		const stiffened = await asked({ section, stiffeners });
		// Trahair, Bradford, Nethercot & Gardner, examples 4.9.5 and 4.9.6: 1197 and 1583 kN.
		expect((plain.resistance?.VzRd ?? 0) / 1197).toBeCloseTo(1, 2);
		expect((stiffened.resistance?.VzRd ?? 0) / 1583).toBeCloseTo(1, 2);
	});

	it('answers by both editions', async () => {
		for (const standard of ['EN1993-1-1:2005', 'EN1993-1-1:2022']) {
			const { classification } = await asked({ section: exampleSections.i, code: { standard } });
			expect(classification?.standard).toBe(standard);
		}
	});

	it('answers the same to the same request', async () => {
		const request = { section: exampleSections.i, demand: { My: 900, Vz: 100 } };
		const [first, second] = await Promise.all([1, 2].map(() => post('/api/v1/analyse', request)));
		expect(first?.body).toEqual(second?.body);
	});
});
