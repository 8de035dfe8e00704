import { describe, expect, it } from 'vitest';
import { bending } from '$lib/engine/response/respond';
import { prepareSection } from '$lib/engine/section/prepare';
import { buildKinds } from './opening-sections';
import { curveRatios } from './curve';
import { curvatureForStrain, strainAtLevel } from './strain-drag';
import { openingStudy } from './study';

const bender = (definition = openingStudy.section, N = 0) => {
	const built = prepareSection(definition);
	if (!built.ok) throw new Error('cannot be built');
	return {
		section: built.value,
		bent: bending(built.value, { axisAngle: 0, transverse: 'moment-zero', N })
	};
};

describe('dragging an end of the strain line', () => {
	const tee = buildKinds.find(({ key }) => key === 'tee')!.opening;

	it.each([
		['the girder in the elastic range', openingStudy.section, 0, 0.0008],
		['the girder far beyond yield', openingStudy.section, 0, -0.009],
		['the girder bent the other way', openingStudy.section, 0, 0.004],
		['a girder under axial force', openingStudy.section, -2000, -0.005],
		['a lopsided tee', tee, 0, -0.002]
	])('brings %s to the strain under the hand', (_, definition, N, wanted) => {
		const { section, bent } = bender(definition, N);
		const unit = bent.firstYield.curvature ?? 1;
		const depth = section.bounds.top - section.gross.centroid.z;
		const level = { angle: 0, depth };
		let now = 0.4 * unit;
		for (let move = 0; move < 3; move += 1)
			now = curvatureForStrain(bent, now, unit, level, wanted);
		const reached = strainAtLevel(bent.atCurvature(now), level);
		expect(reached).toBeCloseTo(wanted, 5);
	});
});

describe('the ratios of a curve', () => {
	it('begin at rest, rise, and end where asked', () => {
		const ratios = curveRatios(6);
		expect(ratios[0]).toBe(0);
		expect(ratios.at(-1)).toBeCloseTo(6, 9);
		expect(ratios).toContain(1);
		expect([...ratios].sort((a, b) => a - b)).toEqual(ratios);
	});
});
