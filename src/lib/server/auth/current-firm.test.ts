import { expect, it } from 'vitest';
import { personIn } from './current-firm';

const one = { firm: { id: 'one', name: 'One', demo: false }, role: 'owner' as const };
const two = { firm: { id: 'two', name: 'Two', demo: false }, role: 'reader' as const };
const standing = {
	id: 'p',
	name: 'P',
	email: 'p@firm.example',
	active: true,
	sessionEpoch: 0,
	memberships: [one, two]
};

it('a person has the role of the firm in hand, not of another one', () => {
	expect(personIn(standing, 'two')).toMatchObject({ firm: { id: 'two' }, role: 'reader' });
});

it('a wish for a firm that they do not belong to falls back to their first', () => {
	expect(personIn(standing, 'somebody elses')).toMatchObject({
		firm: { id: 'one' },
		role: 'owner'
	});
});

it('a person without a firm has no role', () => {
	expect(personIn({ ...standing, memberships: [] }, 'one')).toMatchObject({
		firm: null,
		role: null
	});
});
