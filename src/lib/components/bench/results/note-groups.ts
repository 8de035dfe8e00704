import type { Note } from '$lib/engine/result';
import { uncheckedNames } from '$lib/engine/rules/unchecked';

export interface NoteGroup {
	readonly key: 'unchecked' | 'outside' | 'memory' | 'taken';
	readonly title: string;
	readonly notes: readonly Note[];
}

const titles: readonly Omit<NoteGroup, 'notes'>[] = [
	{ key: 'unchecked', title: 'Not checked' },
	{ key: 'outside', title: 'Outside the limits of a rule' },
	{ key: 'memory', title: 'From memory, to be compared with the standard' },
	{ key: 'taken', title: 'How figures were taken' }
];

const outside = /-(out-of-range|not-covered|unknown|too-weak|too-slender)$|^moduli-differ$/;
const unchecked = new Set(['stiffener-not-checked', 'bolt-holes-pulled', 'angle-alone']);

function groupOf({ code }: Note): NoteGroup['key'] {
	if (uncheckedNames([code]).length > 0 || unchecked.has(code)) return 'unchecked';
	if (code === 'edition-from-memory' || code === 'rule-from-memory') return 'memory';
	return outside.test(code) ? 'outside' : 'taken';
}

/** The notes by what they ask of the reader, the most pressing first; empty groups are left out. */
export const noteGroups = (notes: readonly Note[]): NoteGroup[] =>
	titles
		.map((group) => ({ ...group, notes: notes.filter((note) => groupOf(note) === group.key) }))
		.filter((group) => group.notes.length > 0);
