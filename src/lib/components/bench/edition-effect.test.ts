import { expect, it } from 'vitest';
import { analyse } from '$lib/engine/rules/analyse';
import { verdict } from '$lib/engine/rules/verdict';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { prepareSection } from '$lib/engine/section/prepare';
import { editionEffect } from './edition-effect';

const si = { system: 'si', decimal: 'point' } as const;

function between(section: SectionDefinition) {
	const built = prepareSection(section);
	if (!built.ok) throw new Error('cannot be built');
	const said = (standard: 'EN1993-1-1:2005' | 'EN1993-1-1:2022') => {
		const analysis = analyse(built.value, {
			code: { standard },
			demands: [{ name: 'A', N: -100 }]
		});
		return { state: analysis.demands[0], verdict: verdict(analysis, 'A') };
	};
	return editionEffect(said('EN1993-1-1:2005'), said('EN1993-1-1:2022'), 'EN1993-1-1:2022', si);
}

const hollow = (h: number): SectionDefinition => ({
	kind: 'rectangular-hollow',
	h,
	b: 100,
	t: 6,
	ro: 9,
	ri: 6,
	fabrication: 'hot-finished',
	grade: 'S235'
});

it('names the class where the editions part: an internal part in compression, class 3 up to 42ε or 38ε', () => {
	// (258 − 18)/6 = 40 with ε = 1: within 42 (EN 1993-1-1:2005 Table 5.2), over 38 (2022 Table 7.3).
	expect(between(hollow(258))).toMatch(/^The 2022 edition: class 4, count .*kN\.$/);
});

it('says that nothing changes where nothing does', () => {
	// (108 − 18)/6 = 15: class 1 in both.
	expect(between(hollow(108))).toBe('The 2022 edition gives the same class and figure here.');
});
