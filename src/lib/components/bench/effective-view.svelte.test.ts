import { describe, expect, it } from 'vitest';
import { Bench } from './bench.svelte';
import { openingBend, openingStudy } from './study';

const bend = openingBend;
/** hw/tw = 1960/10: its web is class 4 in bending and in compression. */
const slender = {
	...openingStudy,
	section: { ...openingStudy.section, h: 2000, tw: 10 } as typeof openingStudy.section
};

describe('the effective section on show', () => {
	it('is none where nothing is class 4 under bending', () => {
		const bench = new Bench({ study: openingStudy, bend });
		expect(bench.effectiveView.cases).not.toContain('+My');
	});

	it('follows the sense of the demand until a case is chosen', () => {
		const bench = new Bench({ study: { ...slender, demands: [{ name: 'A', My: -50 }] }, bend });
		expect(bench.effectiveView.case).toBe('−My');
		bench.changeCase(0, { My: 50 });
		expect(bench.effectiveView.case).toBe('+My');
		bench.changeCase(0, { My: undefined, N: -10 });
		expect(bench.effectiveView.case).toBe('N');
		bench.effectiveView.choose('+My');
		expect(bench.effectiveView.case).toBe('+My');
	});

	it('takes nothing away on the drawing while the demand leaves the section whole', () => {
		// The opening girder is class 4 under compression alone, and class 3 under its moment.
		const bench = new Bench({ study: openingStudy, bend });
		expect(bench.effectiveView.cases).toContain('N');
		expect(bench.effectiveView.drawn).toBeNull();
		bench.changeCase(0, { My: undefined, N: -100 });
		expect(bench.effectiveView.drawn?.removed.length).toBeGreaterThan(0);
		bench.changeCase(0, { N: 100 });
		expect(bench.effectiveView.drawn).toBeNull();
		bench.effectiveView.choose('N');
		expect(bench.effectiveView.drawn).not.toBeNull();
	});

	it('gives up a chosen case that is no longer class 4', () => {
		const bench = new Bench({ study: slender, bend });
		bench.effectiveView.choose('−My');
		bench.change({ section: openingStudy.section });
		expect(bench.effectiveView.case).not.toBe('−My');
	});

	it('keeps one pass and the converged figures apart', () => {
		const { effectiveView } = new Bench({ study: slender, bend });
		effectiveView.choose('+My');
		expect(effectiveView.shown).toBe(effectiveView.once);
		effectiveView.pass = 'converged';
		expect(effectiveView.shown).toBe(effectiveView.converged);
		// The web's compressed part grows as the axis moves down: never more area than in one pass.
		expect(effectiveView.converged!.area).toBeLessThanOrEqual(effectiveView.once!.area);
	});
});
