import { describe, expect, it } from 'vitest';
import type { PlatesSection, SectionDefinition } from '../../../section/definition';
import { testModel } from '../test-model';
import { effectiveAxial } from './effective-axial';
import { effectiveMoment } from './effective-moment';
import { effectiveSection } from './effective-section';

const [h, b, tf, tw] = [1200, 400, 12, 8];

/** The girder as plates about its middle, turned by some degrees. */
function girderOfPlates(turned: number): PlatesSection {
	const [cos, sin] = [Math.cos((turned * Math.PI) / 180), Math.sin((turned * Math.PI) / 180)];
	const plate = (name: string, width: number, thickness: number, up: number, angle: number) => ({
		name,
		width,
		thickness,
		y: -sin * up,
		z: cos * up,
		angle: angle + turned
	});
	return {
		kind: 'plates',
		grade: 'S355',
		plates: [
			plate('topFlange', b, tf, (h - tf) / 2, 0),
			plate('web', h - 2 * tf, tw, 0, 90),
			plate('bottomFlange', b, tf, -(h - tf) / 2, 0)
		]
	};
}

const girder: SectionDefinition = { kind: 'i', fabrication: 'welded', h, b, tf, tw, grade: 'S355' };

describe('effective section of free plates', () => {
	it.each(['plusMy', 'minusMy', 'plusMz', 'minusMz'] as const)(
		'is that of the same section drawn as an I, %s',
		(sense) => {
			const [own, drawn] = [girderOfPlates(0), girder].map((definition) =>
				effectiveMoment(testModel(definition), sense)!
			);
			expect(own!.value / drawn!.value).toBeCloseTo(1, 9);
			expect(own!.converged / drawn!.converged).toBeCloseTo(1, 9);
			expect(own!.effective.area / drawn!.effective.area).toBeCloseTo(1, 9);
			expect(own!.effective.removed.length).toBe(drawn!.effective.removed.length);
		}
	);

	it.each([17, 30, 90, 225])(
		'keeps area and second moments in compression when turned, %d°',
		(turned) => {
			const [own, drawn] = [girderOfPlates(turned), girder].map((definition) =>
				effectiveSection(testModel(definition), 'N')!
			);
			expect(own!.area / drawn!.area).toBeCloseTo(1, 9);
			const polar = (found: typeof own) => found!.secondMomentY + found!.secondMomentZ;
			expect(polar(own) / polar(drawn)).toBeCloseTo(1, 9);
			const whole = (found: typeof own) =>
				found!.secondMomentY * found!.secondMomentZ - found!.productYZ ** 2;
			expect(whole(own) / whole(drawn)).toBeCloseTo(1, 8);
		}
	);

	it.each(['plusMy', 'plusMz'] as const)(
		'turned a quarter, the axes change places, %s',
		(sense) => {
			const own = effectiveMoment(testModel(girderOfPlates(90)), sense)!;
			const other = sense === 'plusMy' ? 'plusMz' : 'plusMy';
			expect(own.value / effectiveMoment(testModel(girder), other)!.value).toBeCloseTo(1, 9);
		}
	);

	// four outstands of a cruciform, each ρ c from its root: EN 1993-1-5 Table 4.2
	it('cruciform in compression: four outstands by hand', () => {
		const model = testModel({
			kind: 'plates',
			grade: 'S355',
			plates: [
				{ name: 'level', width: 410, thickness: 10, y: 0, z: 0, angle: 0 },
				{ name: 'upper', width: 200, thickness: 10, y: 0, z: 105, angle: 90 },
				{ name: 'lower', width: 200, thickness: 10, y: 0, z: -105, angle: 90 }
			]
		});
		const slenderness = 20 / (28.4 * Math.sqrt((235 / 355) * 0.43));
		const rho = (slenderness - 0.188) / slenderness ** 2;
		const axial = effectiveAxial(model)!;
		expect(axial.effective.area).toBeCloseTo(8100 - 4 * (1 - rho) * 2000, 6);
		expect(axial.shiftZ).toBeCloseTo(0, 9);
	});
});
