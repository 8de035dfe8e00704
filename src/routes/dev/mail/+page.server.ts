import { error } from '@sveltejs/kit';
import { config } from '$lib/server/config';
import { shownLocalMail } from '$lib/server/mail/local-mailbox';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ setHeaders }) => {
	if (config().smtpUrl) error(404, 'Mail goes out by the mail server that is set up.');
	setHeaders({ 'cache-control': 'no-store', 'referrer-policy': 'no-referrer' });
	return { mails: await shownLocalMail() };
};
