import { describe, expect, it } from 'vitest';
import { analyse } from '$lib/engine/rules/analyse';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { prepareSection } from '$lib/engine/section/prepare';
import { turnedIntoPlates } from './turned-into-plates';

function prepared(definition: SectionDefinition) {
	const built = prepareSection(definition);
	if (!built.ok) throw new Error(built.error[0]?.message);
	return built.value;
}

const grade = 'S355';
const made: Record<string, SectionDefinition> = {
	'a welded I': {
		...{ kind: 'i', fabrication: 'welded', grade, partGrades: { web: 'S275' } },
		...{ h: 940, b: 400, tf: 20, bBottom: 300, tfBottom: 25, tw: 14, weldLeg: 8 }
	},
	'a welded tee': {
		...{ kind: 'tee', fabrication: 'welded', grade, h: 200, b: 180, tw: 12, tf: 15, weldLeg: 6 }
	},
	'a box': {
		...{ kind: 'box', grade, h: 1240, b: 600, bBottom: 640, tfTop: 20, tfBottom: 25 },
		...{ tw: 12, webGap: 500, weldLeg: 6 }
	},
	'a flat': { kind: 'flat', grade, b: 20, h: 200 }
};

describe('a section turned into free plates', () => {
	it.each(Object.entries(made))('keeps every figure of %s', (_, definition) => {
		const { plates } = turnedIntoPlates(definition);
		const [before, after] = [prepared(definition), prepared(plates!)];
		for (const figure of ['area', 'secondMomentY', 'secondMomentZ', 'plasticModulusY'] as const)
			expect(after.gross[figure] / before.gross[figure]).toBeCloseTo(1, 10);
		expect(after.gross.centroid.y).toBeCloseTo(before.gross.centroid.y, 8);
		const moment = (section: typeof before) => analyse(section, {}).moment.plasticY ?? Number.NaN;
		expect(moment(after) / moment(before)).toBeCloseTo(1, 8);
	});

	it.each(['a welded I', 'a box'])('keeps the class of %s', (name) => {
		const { plates } = turnedIntoPlates(made[name]!);
		const classOf = (section: SectionDefinition) =>
			analyse(prepared(section), {}).classification?.overall;
		expect(classOf(plates!)).toBe(classOf(made[name]!));
	});

	it('says why shapes with roots, corners or round walls are not turned', () => {
		const rolled: SectionDefinition = {
			...{ kind: 'i', fabrication: 'rolled', grade, h: 300, b: 150, tf: 10.7, tw: 7.1, r: 15 }
		};
		expect(turnedIntoPlates(rolled).plates).toBeNull();
		expect(turnedIntoPlates(rolled).why).toMatch(/rounded roots/);
		expect(turnedIntoPlates({ kind: 'round', d: 60, grade }).why).toMatch(/round/);
	});
});
