import { residualGap, type ResidualPattern } from '$lib/engine/material/residual/pattern';
import { historyOf } from '$lib/engine/response/history/history';
import type { PreparedSection } from '$lib/engine/section/prepared';

export interface ResidualChoice {
	readonly value: ResidualPattern;
	readonly label: string;
	/** Why it cannot be had; null when it can. */
	readonly gap: string | null;
}

/** Patterns of residual stress, each with why this section has none of it. */
export const residualChoices = (section: PreparedSection): ResidualChoice[] => [
	{ value: 'none', label: 'None', gap: null },
	...(['rolled', 'welded'] as const).map((value) => ({
		value,
		label: value === 'rolled' ? 'Rolled' : 'Welded',
		gap: gapOf(section, value)
	}))
];

function gapOf(section: PreparedSection, pattern: 'rolled' | 'welded'): string | null {
	const gap = residualGap(section, pattern);
	if (gap) return gap;
	const history = historyOf(section, pattern);
	return history.ok ? null : history.error.message;
}
