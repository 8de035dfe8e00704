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

it('names the worse outstand only where the sides differ, and an angle as a whole', () => {
	const right = { ...free, element: 'topFlange.right' };
	expect(plateTitle(right, [right])).toBe('Top flange');
	expect(plateTitle(right, [right], true)).toBe('Top flange, right');
	const angle = { part: 'verticalLeg', type: 'angle' } as const;
	expect(plateTitle(angle, [angle])).toBe('Angle as a whole');
});

it('says only the part where there is one kind of it', () => {
	expect(plateTitle(free, [free, free])).toBe('Top flange');
});
