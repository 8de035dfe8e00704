import type { ClassifiedElement } from '$lib/engine/rules/result';
import { partTitle } from '../part-titles';

type Titled = Pick<ClassifiedElement, 'part' | 'type' | 'element'>;

/**
 * The plate's name; where a part is both held and free, which of the two: "Top flange, outstand". With
 * `sided` the outstand that is the worse is named too, as under a moment across the web.
 */
export function plateTitle(own: Titled, all: readonly Titled[], sided = false): string {
	if (own.type === 'angle') return 'Angle as a whole';
	const side = sided ? /\.(left|right)$/.exec(own.element ?? '')?.[1] : undefined;
	const title = plainTitle(own, all);
	return side === undefined ? title : `${title}, ${side}`;
}

function plainTitle({ part, type }: Titled, all: readonly Titled[]): string {
	const both = all.some((other) => other.part === part && other.type !== type);
	if (!both) return partTitle(part);
	return `${partTitle(part)}, ${type === 'internal' ? 'between webs' : 'outstand'}`;
}
