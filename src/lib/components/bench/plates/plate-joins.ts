import type { PlateJoin, PlatesSection } from '$lib/engine/section/definition';
import { jointsOf } from '$lib/engine/section/plates/joints';

/** Two plates in contact, or named as a join; `leg` of the fillet in mm. */
export interface JoinRow {
	readonly a: string;
	readonly b: string;
	readonly joined: boolean;
	readonly leg: number;
	/** They meet at a point only. */
	readonly atPoint: boolean;
}

/** All contacts of plates that stand, joined or not. */
export function joinRows(section: PlatesSection): JoinRow[] {
	const { strips, welded, loose, doubtful } = jointsOf(section);
	const row = (joined: boolean) => (contact: (typeof welded)[number] | (typeof loose)[number]) => ({
		a: strips[contact.a]?.name ?? '',
		b: strips[contact.b]?.name ?? '',
		joined,
		leg: 'leg' in contact ? contact.leg : 0,
		atPoint: contact.length === 0
	});
	const counted = new Set<string>(welded.map(({ a, b }) => `${a} ${b}`));
	const open = [...loose, ...doubtful].filter(({ a, b }) => !counted.has(`${a} ${b}`));
	return [...welded.map(row(true)), ...open.map(row(false))];
}

/** The section with its joins given one by one, one of them changed. */
export function withJoin(
	section: PlatesSection,
	rows: readonly JoinRow[],
	changed: JoinRow
): PlatesSection {
	const isIt = ({ a, b }: JoinRow) => a === changed.a && b === changed.b;
	const joins = rows
		.map((row) => (isIt(row) ? changed : row))
		.filter(({ joined }) => joined)
		.map(({ a, b, leg }): PlateJoin => (leg > 0 ? { a, b, weldLeg: leg } : { a, b }));
	return { ...section, joins };
}

/** The section with its joins found by contact again. */
export function withFoundJoins({ joins: _given, ...section }: PlatesSection): PlatesSection {
	return section;
}
