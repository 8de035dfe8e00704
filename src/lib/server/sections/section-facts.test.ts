import { expect, it } from 'vitest';
import type { SectionDefinition } from '../../engine/section/definition';
import { sectionFacts } from './section-facts';

const girder: SectionDefinition = {
	kind: 'i',
	fabrication: 'welded',
	h: 940,
	b: 400,
	tw: 14,
	tf: 20,
	weldLeg: 8,
	grade: 'S355'
};

it('area and mass of a plate girder are those of its three plates', () => {
	const facts = sectionFacts(girder, {});
	// Closed form: 2·400·20 + 900·14 mm², at 7850 kg/m³.
	expect(facts.ok && facts.value.area).toBeCloseTo(28_600, 6);
	expect(facts.ok && facts.value.mass).toBeCloseTo(28_600e-6 * 7850, 6);
	expect(facts.ok && [facts.value.h, facts.value.b]).toEqual([940, 400]);
});

it('a section that cannot be is refused, with the place of the fault in the request', () => {
	const facts = sectionFacts({ ...girder, tw: 0 }, {});
	expect(facts.ok).toBe(false);
	expect(!facts.ok && facts.error.code).toBe('invalid_section');
	expect(!facts.ok && facts.error.issues?.[0]?.path).toBe('definition.tw');
});

it('the hash follows dimensions and settings, not the order of fields', () => {
	const hashOf = (definition: SectionDefinition, gammaM0: number) => {
		const facts = sectionFacts(definition, { code: { gammaM0 } });
		return facts.ok ? facts.value.inputHash : '';
	};
	const { kind: _kind, ...rest } = girder;
	const turned = { ...rest, kind: 'i' } as SectionDefinition;
	expect(hashOf(turned, 1)).toBe(hashOf(girder, 1));
	expect(hashOf(girder, 1.1)).not.toBe(hashOf(girder, 1));
	expect(hashOf({ ...girder, tw: 15 }, 1)).not.toBe(hashOf(girder, 1));
});
