import type { Explanation, Working } from '$lib/engine/explain/working';
import type { Bench } from '../bench.svelte';
import { caseNames } from '../explain/figure-keys';

/** Figures that the printed page shows, and all that their formulas take from other workings. */
export function printedWorkings(bench: Bench): [string, Working][] {
	const all = bench.explanation;
	const wanted = new Set<string>();
	const take = (key: string) => {
		const working = all[key];
		if (!working || wanted.has(key)) return;
		for (const { from } of working.inputs) if (from !== undefined) take(from);
		wanted.add(key);
	};
	for (const key of Object.keys(all)) if (isShown(key, bench)) take(key);
	return [...wanted].map((key) => [key, all[key]!]);
}

const figures = /^(gross|moment|resistance|reduced|check|demand)\.|^squashLoad$/;

/** Limits only of the case on show; what only stands behind a figure comes with it. */
function isShown(key: keyof Explanation & string, bench: Bench): boolean {
	if (figures.test(key)) return true;
	const { classification } = bench.analysis;
	const judged = bench.activeState ?? classification;
	if (!judged || !key.startsWith('class.')) return false;
	return caseNames(judged.basis, bench.activeState?.demand ?? null).some((name) =>
		key.startsWith(`class.${name}.`)
	);
}
