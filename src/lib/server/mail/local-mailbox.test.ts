import { expect, it } from 'vitest';
import { stretchesOf } from './local-mailbox';

const here = 'http://localhost:3000';

it('only links to this site can be followed', () => {
	const text = `Go to ${here}/reset?token=a or https://elsewhere.example/x now`;
	expect(stretchesOf(text, here).filter(({ href }) => href)).toEqual([
		{ text: `${here}/reset?token=a`, href: `${here}/reset?token=a` }
	]);
});

it('nothing of the text is lost', () => {
	const text = `One\n\n${here}/a\ntwo`;
	expect(
		stretchesOf(text, here)
			.map((stretch) => stretch.text)
			.join('')
	).toBe(text);
});
