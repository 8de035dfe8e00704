import type { Cookies } from '@sveltejs/kit';
import { config } from '../config';
import type { Standing } from '../queries/people';
import type { Person } from '../rights/person';

const cookieName = 'firm';
const year = 365 * 24 * 60 * 60;

/** The firm that this browser last worked in; only a wish until it is held against memberships. */
export const wishedFirm = (cookies: Cookies): string | undefined => cookies.get(cookieName);

export const keepFirm = (cookies: Cookies, firmId: string): void =>
	cookies.set(cookieName, firmId, {
		path: '/',
		httpOnly: true,
		sameSite: 'lax',
		secure: config().origin.startsWith('https:'),
		maxAge: year
	});

export const forgetFirm = (cookies: Cookies): void => cookies.delete(cookieName, { path: '/' });

/** The person with the firm in hand: the one wished for where they belong to it, else their first. */
export const personIn = (standing: Standing, wish: string | undefined): Person => {
	const { id, name, email, memberships } = standing;
	const inHand = memberships.find(({ firm }) => firm.id === wish) ?? memberships[0];
	return { id, name, email, memberships, firm: inHand?.firm ?? null, role: inHand?.role ?? null };
};
