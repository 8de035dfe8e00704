import { expect, it } from 'vitest';
import { fieldFigure, figureWithin } from './field-figure';

const si = { system: 'si', decimal: 'point' } as const;
const us = { system: 'us', decimal: 'point' } as const;

it('shows what was typed to its last place', () => {
	expect(fieldFigure(1234.5678, 'length', si, { digits: 5 })).toBe('1234.5678');
	expect(fieldFigure(400, 'length', si, { digits: 5 })).toBe('400');
	expect(fieldFigure(9.525, 'length', us, { digits: 5 })).toBe('0.375');
});

it('rounds what a conversion or a calculation left long', () => {
	expect(fieldFigure(400, 'length', us, { digits: 5 })).toBe('15.748');
	expect(fieldFigure(1000 / 3, 'length', si, { digits: 6 })).toBe('333.333');
});

it('drops places, never figures of the whole part, where the field is too narrow', () => {
	const within = (value: number, room: number) =>
		figureWithin(value, 'length', si, { digits: 6, room });
	expect(within(103.124, 7)).toBe('103.124');
	expect(within(103.124, 6)).toBe('103.12');
	expect(within(1103.1246, 7)).toBe('1103.12');
	expect(within(12345.6, 4)).toBe('12\u202f346');
});
