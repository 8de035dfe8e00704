import { partTitle } from '../part-titles';

/** An element in words: "Top flange, left" for `topFlange.left`; the part's name where it is all of it. */
export function elementTitle(element: string, part: string): string {
	const side = /\.(left|right|top|bottom)$/.exec(element)?.[1];
	if (side !== undefined) return `${partTitle(part)}, ${side}`;
	const number = /[ .](\d+)$/.exec(element)?.[1];
	return number === undefined || element === part
		? partTitle(part)
		: `${partTitle(part)}, ${number}`;
}
