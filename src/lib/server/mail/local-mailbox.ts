import { config } from '../config';
import { recentLocalMail } from '../queries/local-mail';
import { isInventedAddress } from './invented-address';

/** A stretch of a mail's text; `href` where it is a link to this site. */
export interface Stretch {
	text: string;
	href: string | null;
}

/** Cuts a mail's text at its links to this site; links elsewhere stay text. */
export const stretchesOf = (body: string, origin: string): Stretch[] =>
	body
		.split(/(https?:\/\/\S+)/)
		.filter((text) => text !== '')
		.map((text) => ({ text, href: URL.parse(text)?.origin === origin ? text : null }));

/** The local mailbox; in production only mail to addresses that belong to nobody. */
export const shownLocalMail = async () => {
	const mails = await recentLocalMail();
	const isProduction = process.env.NODE_ENV === 'production';
	return mails
		.filter(({ recipient }) => !isProduction || isInventedAddress(recipient))
		.map(({ body, ...mail }) => ({ ...mail, stretches: stretchesOf(body, config().origin) }));
};
