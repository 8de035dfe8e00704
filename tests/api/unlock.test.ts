import { describe, expect, it } from 'vitest';
import { post } from './call';

const girder = {
	kind: 'i',
	fabrication: 'welded',
	h: 940,
	b: 400,
	tw: 14,
	tf: 20,
	weldLeg: 8,
	grade: 'S355'
};

interface Option {
	changes: { part: string; field: string; from: number; to: number }[];
	class: number;
	MyRd: number;
	mass: number;
	addedMass: number;
	section: Record<string, unknown>;
}

const unlocked = async (request: object) => {
	const { status, body } = await post('/api/v1/unlock', request);
	expect(status).toBe(200);
	return body as { goal: string | null; options: Option[] };
};

describe('POST /api/v1/unlock', () => {
	it('gives options with the least added steel first, each true by a full analysis', async () => {
		const { options } = await unlocked({ section: girder, code: {} });
		expect(options.length).toBeGreaterThan(0);
		const added = options.map(({ addedMass }) => addedMass);
		expect(added).toEqual([...added].sort((a, b) => a - b));
		for (const option of options) {
			const again = await post('/api/v1/analyse', { section: option.section });
			const { classification, resistance, gross } = again.body as unknown as {
				classification: { overall: number };
				resistance: { MyRd: number };
				gross: { mass: number };
			};
			expect(classification.overall).toBe(option.class);
			expect(resistance.MyRd).toBe(option.MyRd);
			expect(gross.mass).toBe(option.mass);
			expect(option.section).toMatchObject({ grade: 'S355', weldLeg: 8 });
		}
	});

	it('steps through the stock that is sent', async () => {
		const stock = { thicknesses: [20, 32], widthStep: 100, depthStep: 100, stiffenerStep: 500 };
		const { options } = await unlocked({ section: girder, stock });
		for (const { field, to } of options.flatMap(({ changes }) => changes))
			if (field === 'tf' || field === 'tw') expect(stock.thicknesses).toContain(to);
			else if (field !== 'spacing') expect(to % 100).toBe(0);
	});

	it('says when nothing is locked', async () => {
		expect(await unlocked({ section: { ...girder, b: 200 } })).toMatchObject({
			goal: null,
			options: []
		});
	});

	it('names a wrong thickness of the stock', async () => {
		const stock = { thicknesses: [20, -1], widthStep: 10, depthStep: 50, stiffenerStep: 250 };
		const { status, body } = await post('/api/v1/unlock', { section: girder, stock });
		expect(status).toBe(400);
		expect(JSON.stringify(body)).toContain('Plate thickness must be from 1 to 500 mm, not -1.');
	});
});
