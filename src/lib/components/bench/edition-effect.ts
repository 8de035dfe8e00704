import type { DemandState, Standard } from '$lib/engine/rules/result';
import type { Verdict } from '$lib/engine/rules/verdict';
import { formatQuantity, type Preferences } from '$lib/units';

interface Said {
	readonly state: DemandState | undefined;
	readonly verdict: Pick<Verdict, 'countable'>;
}

/** Figures closer than this share are the same. */
const same = 1e-9;

/** What the other edition says of a case, beside what is said now; empty where neither says anything. */
export function editionEffect(
	now: Said,
	other: Said,
	standard: Standard,
	preferences: Preferences
): string {
	if (!now.state || !other.state) return '';
	const year = standard.slice(-4);
	const sameClass = now.state.class === other.state.class;
	const figures = [countedOf(now), countedOf(other)] as const;
	const sameCount =
		figures[0] === figures[1] ||
		(figures[0] !== null &&
			figures[1] !== null &&
			Math.abs(figures[0] - figures[1]) <= same * Math.abs(figures[0]));
	if (sameClass && sameCount) return `The ${year} edition gives the same class and figure here.`;
	const quantity = other.verdict.countable.moment === null ? 'force' : 'moment';
	const counted =
		figures[1] === null
			? 'nothing may be counted'
			: `count ${formatQuantity(figures[1], quantity, preferences, { digits: 4, unit: true })}`;
	return `The ${year} edition: class ${other.state.class}, ${counted}.`;
}

const countedOf = ({ verdict: { countable } }: Said): number | null =>
	countable.moment ?? countable.force;
