import { expect, it } from 'vitest';
import { noteText } from './note-text';

const comma = { system: 'si', decimal: 'comma' } as const;
const us = { system: 'us', decimal: 'point' } as const;
const plain = (text: string) => text.replace(/[\u00a0\u202f]/g, ' ');

it('follows the decimal mark, and leaves clauses and editions alone', () => {
	const note = 'hw/tw 71.4 is over 55.0 (EN 1993-1-1:2005 6.2.2.4, region1, Case 2.5).';
	expect(noteText(note, comma)).toBe(
		'hw/tw 71,4 is over 55,0 (EN 1993-1-1:2005 6.2.2.4, region1, Case 2,5).'
	);
});

it('leaves a clause of three numbers alone', () => {
	expect(noteText('see 6.2.4 and EN 1993-1-5 4.', comma)).toBe('see 6.2.4 and EN 1993-1-5 4.');
});

it('converts what has a unit: 1 in is 25.4 mm, 1 ksi is 6.894757 N/mm² (NIST SP 811)', () => {
	expect(plain(noteText('15.0 mm outside and 10 mm inside', us))).toBe(
		'0.5906 in outside and 0.3937 in inside'
	);
	expect(plain(noteText('near 210 000 N/mm². No class', us))).toBe('near 30 458 ksi. No class');
});
