import { expect, it } from 'vitest';
import { plateTitle } from './plate-title';

const between = { part: 'topFlange', type: 'internal' } as const;
const free = { part: 'topFlange', type: 'outstand' } as const;
const web = { part: 'leftWeb', type: 'internal' } as const;

it('tells a flange between the webs from its outstand', () => {
	const all = [between, free, web];
	expect(all.map((one) => plateTitle(one, all))).toEqual([
		'Top flange, between webs',
		'Top flange, outstand',
		'Left web'
	]);
});

it('says only the part where there is one kind of it', () => {
	expect(plateTitle(free, [free, free])).toBe('Top flange');
});
