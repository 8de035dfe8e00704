import type { Change } from '$lib/engine/unlock/proposal';
import { formatQuantity, type Preferences } from '$lib/units';
import { partTitle } from '../part-titles';

const parts: Readonly<Record<string, string>> = {
	flanges: 'Flanges',
	webs: 'Webs',
	stiffeners: 'Stiffeners'
};

/** What a size is of its part, behind the figures: "350 mm wide". */
const measures: Readonly<Record<string, string>> = {
	b: 'wide',
	bBottom: 'wide',
	width: 'wide',
	h: 'deep, over all',
	webGap: 'apart',
	spacing: 'apart'
};

/** A change in words: "Flanges 400 → 350 mm wide", "Stiffeners put in, 1500 mm apart". */
export function changeWords({ part, field, from, to }: Change, preferences: Preferences): string {
	const length = (mm: number, unit = false) =>
		formatQuantity(mm, 'length', preferences, { digits: 5, trim: true, unit });
	const name = field === 'h' ? 'Section' : (parts[part] ?? partTitle(part));
	const measure = measures[field] ?? 'thick';
	if (from === 0) return `${name} put in, ${length(to, true)} ${measure}`;
	return `${name} ${length(from)} → ${length(to, true)} ${measure}`;
}
