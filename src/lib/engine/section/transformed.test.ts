import { describe, expect, it } from 'vitest';
import { part, rectangle, sectionOf, steel } from '../response/test-sections';
import { materialNotes, transformedProperties } from './transformed';

describe('transformedProperties', () => {
	it('of two materials one on the other follow the closed form', () => {
		const [b, h1, h2, E1, E2] = [50, 80, 20, 70_000, 210_000];
		const section = sectionOf(
			part('lower', rectangle(-25, 0, b, h1), steel(250, { E: E1 })),
			part('upper', rectangle(-25, h1, b, h2), steel(355, { E: E2 }))
		);
		const [A1, A2] = [b * h1, b * h2];
		const z = (E1 * A1 * (h1 / 2) + E2 * A2 * (h1 + h2 / 2)) / (E1 * A1 + E2 * A2);
		const EIy =
			E1 * ((b * h1 ** 3) / 12 + A1 * (z - h1 / 2) ** 2) +
			E2 * ((b * h2 ** 3) / 12 + A2 * (h1 + h2 / 2 - z) ** 2);
		const t = transformedProperties(section);
		expect(t.EA / (E1 * A1 + E2 * A2)).toBeCloseTo(1, 13);
		expect(t.centroid.z).toBeCloseTo(z, 10);
		expect(t.EIy / EIy).toBeCloseTo(1, 12);
		expect(t.EIz / ((E1 * h1 + E2 * h2) * (b ** 3 / 12))).toBeCloseTo(1, 12);
		expect(t.EIyz / EIy).toBeCloseTo(0, 12);
		expect(materialNotes(section.parts).map(({ code }) => code)).toEqual(['moduli-differ']);
	});

	it('say nothing where all parts have one E and a sharp yield point', () => {
		expect(materialNotes([part('bar', rectangle(0, 0, 1, 1), steel(250))])).toEqual([]);
	});
});
