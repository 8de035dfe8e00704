import { expect, it } from 'vitest';
import { noteGroups } from './note-groups';

const note = (code: string) => ({ code, message: code });

it('puts what is not checked first and how figures were taken last', () => {
	const groups = noteGroups(
		['effective-section', 'rule-from-memory', 'strength-out-of-range', 'ltb-not-checked'].map(note)
	);
	expect(groups.map(({ key, notes }) => [key, notes.map(({ code }) => code)])).toEqual([
		['unchecked', ['ltb-not-checked']],
		['outside', ['strength-out-of-range']],
		['memory', ['rule-from-memory']],
		['taken', ['effective-section']]
	]);
});

it('leaves out a group that has nothing to say, and loses no note', () => {
	const notes = ['class-alpha', 'edition-from-memory', 'something-new'].map(note);
	const groups = noteGroups(notes);
	expect(groups.map(({ key }) => key)).toEqual(['memory', 'taken']);
	expect(groups.flatMap((group) => group.notes)).toHaveLength(3);
});
