import { fail, ok, type Result } from '../result';
import type { OutlineRegion } from './definition';
import { pointIn } from './coordinate-line';
import { nestedRegions, type TextRing } from './nested-rings';

/** A line of pasted text and what is to be said of it; lines are counted from 1. */
export interface LineIssue {
	readonly line: number;
	readonly message: string;
}

/** Regions with the holes found in them, and the lines that were passed over as headings. */
export interface OutlineText {
	readonly regions: readonly OutlineRegion[];
	readonly headings: readonly LineIssue[];
}

/**
 * Reads coordinates in mm, y and z a line, parted by spaces, tabs, a semicolon or a comma; with a
 * decimal point, or a decimal comma where something else parts the numbers. A blank line ends a
 * ring. A ring within another is its hole, a ring within a hole a region of its own. Lines before the first
 * point that begin with no number are headings. Fails with every line that cannot be read.
 */
export function outlineFromText(text: string): Result<OutlineText, LineIssue[]> {
	const { rings, headings, issues } = readLines(text);
	issues.push(...rings.flatMap(ringIssues));
	if (issues.length === 0 && rings.length === 0)
		issues.push({ line: 1, message: 'There are no coordinates in the text.' });
	if (issues.length > 0) return fail(issues.sort((a, b) => a.line - b.line));
	return ok({ regions: nestedRegions(rings), headings });
}

const startsWithNumber = /^[-+\u2212]?[.,]?\d/;

function readLines(text: string) {
	const rings: TextRing[] = [];
	const [headings, issues]: [LineIssue[], LineIssue[]] = [[], []];
	let ring: TextRing | null = null;
	for (const [i, raw] of text.split(/\r\n|\r|\n/).entries()) {
		const [line, content] = [i + 1, raw.trim()];
		if (content === '') {
			ring = null;
			continue;
		}
		const point = pointIn(content);
		const said = `“${content.slice(0, 40)}”`;
		if (point) {
			if (!ring) rings.push((ring = { line, points: [] }));
			ring.points.push(point);
		} else if (rings.length === 0 && !startsWithNumber.test(content))
			headings.push({ line, message: `Line ${line} is passed over as a heading: ${said}.` });
		else issues.push({ line, message: `Line ${line} is not two numbers, y and z: ${said}.` });
	}
	return { rings, headings, issues };
}

function ringIssues({ line, points }: TextRing): LineIssue[] {
	const different = new Set(points.map(([y, z]) => `${y},${z}`)).size;
	if (different >= 3) return [];
	const message = `The ring that begins on line ${line} needs at least 3 different points, not ${different}.`;
	return [{ line, message }];
}
