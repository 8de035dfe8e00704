import type { ClassifiedElement } from '$lib/engine/rules/result';
import { partTitle } from '../part-titles';

/** The plate's name; where a part is both held and free, which of the two: "Top flange, outstand". */
export function plateTitle(
	{ part, type }: Pick<ClassifiedElement, 'part' | 'type'>,
	all: readonly Pick<ClassifiedElement, 'part' | 'type'>[]
): string {
	const both = all.some((other) => other.part === part && other.type !== type);
	if (!both) return partTitle(part);
	return `${partTitle(part)}, ${type === 'internal' ? 'between webs' : 'outstand'}`;
}
