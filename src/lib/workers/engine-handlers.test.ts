import { describe, expect, it, vi } from 'vitest';
import { respond } from '$lib/engine/response/respond';
import type { BendingPath } from '$lib/engine/response/state';
import { prepareSection } from '$lib/engine/section/prepare';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { engineHandlers } from './engine-handlers';

const definition: SectionDefinition = { kind: 'flat', b: 100, h: 200, grade: 250 };
const path: BendingPath = { axisAngle: 0, transverse: 'moment-zero', N: 0 };
const at = { curvatureRatio: Array.from({ length: 60 }, (_, i) => i / 10) };
const going = () => Promise.resolve(true);

describe('engine jobs', () => {
	it('gives the same states in batches as at once', async () => {
		const progress = vi.fn();
		const job = await engineHandlers.respond({ definition, path, at }, { progress, goOn: going });
		const section = prepareSection(definition);
		expect(job.ok && section.ok).toBe(true);
		if (job.ok && section.ok) expect(job.value).toEqual(respond(section.value, path, at));
		expect(progress.mock.calls.flat()).toEqual([25 / 60, 50 / 60, 1]);
	});

	it('stops between batches when cancelled', async () => {
		const goOn = () => Promise.resolve(false);
		const job = await engineHandlers.respond(
			{ definition, path, at },
			{ progress: () => {}, goOn }
		);
		expect(job.ok && job.value.states).toHaveLength(25);
	});

	it('hands back what is wrong with a definition', async () => {
		const wrong: SectionDefinition = { kind: 'flat', b: -1, h: 200, grade: 250 };
		const job = await engineHandlers.analyse(
			{ definition: wrong },
			{ progress: () => {}, goOn: going }
		);
		expect(!job.ok && job.error[0]?.path).toBe('b');
	});

	it('gives up a search for what unlocks more when cancelled', async () => {
		const girder: SectionDefinition = {
			...{ kind: 'i', fabrication: 'welded', grade: 'S355' },
			...{ h: 940, b: 400, tw: 14, tf: 20, weldLeg: 8 }
		};
		const thicknesses = [14, 16, 20, 25, 30, 40];
		const request = {
			girder: { definition: girder, stiffeners: null },
			stock: { thicknesses, widthStep: 10, depthStep: 25, stiffenerStep: 250 },
			code: {},
			demands: [{ name: 'A', My: 20_000 }],
			strengthBasis: 'product-standard' as const
		};
		const stop = () => Promise.resolve(false);
		expect(await engineHandlers.unlock(request, { progress: () => {}, goOn: stop })).toBeNull();
	});

	it('solves torsion beside the handbook, and not at all once cancelled', async () => {
		const job = await engineHandlers.torsion({ definition }, { progress: () => {}, goOn: going });
		if (!job?.ok) throw new Error('No torsion.');
		const { handbook, numerical } = job.value.torsion;
		expect(numerical!.torsionConstant / handbook!.torsionConstant!).toBeCloseTo(1, 3);
		const goOn = () => Promise.resolve(false);
		expect(await engineHandlers.torsion({ definition }, { progress: () => {}, goOn })).toBeNull();
	});
});
