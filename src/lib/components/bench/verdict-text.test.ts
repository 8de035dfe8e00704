import { expect, it } from 'vitest';
import { gluedPieces } from './verdict-text';

const word = (text: string) => ({ text, strong: false });
const figure = (text: string) => ({ text, strong: true });

it('keeps a mark with the figure that it follows', () => {
	const pieces = gluedPieces([word('Count '), figure('3110 kNm'), word(', up to first yield.')]);
	expect(pieces.map(({ text, mark }) => [text, mark])).toEqual([
		['Count ', ''],
		['3110 kNm', ','],
		[' up to first yield.', '']
	]);
});

it('says the same words as before', () => {
	const pieces = [
		word('c/t '),
		figure('9.25'),
		word(' is over '),
		figure('8.25'),
		word('. The '),
		figure('4')
	];
	const said = gluedPieces(pieces)
		.map(({ text, mark }) => text + mark)
		.join('');
	expect(said).toBe('c/t 9.25 is over 8.25. The 4');
});
