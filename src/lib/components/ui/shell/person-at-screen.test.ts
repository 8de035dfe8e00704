import { expect, it } from 'vitest';
import { initials } from './person-at-screen';

it('takes the initials of the first and the last name', () => {
	expect(initials('Ruth Tarn')).toBe('RT');
	expect(initials(' Åsa  van der Meer ')).toBe('ÅM');
	expect(initials('Odo')).toBe('O');
	expect(initials('')).toBe('');
});
