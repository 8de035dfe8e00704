import { createTransport, type Transporter } from 'nodemailer';
import { config } from '../config';
import { log } from '../log';
import { keepLocalMail } from '../queries/local-mail';
import { isInventedAddress } from './invented-address';

export interface Mail {
	to: string;
	subject: string;
	/** Plain text. */
	text: string;
}

let transport: Transporter | undefined;

const overSmtp = async (smtpUrl: string, mail: Mail): Promise<void> => {
	transport ??= createTransport(smtpUrl);
	await transport.sendMail({ from: config().mailFrom, ...mail });
};

const refusal =
	'A mail was not sent: no mail server is set up, and this address may be real. Set SMTP_URL.';

/** Where mail goes that cannot be sent: into the local mailbox, unless someone real waits for it. */
const locally = async ({ to, subject, text }: Mail): Promise<boolean> => {
	if (process.env.NODE_ENV === 'production' && !isInventedAddress(to)) {
		log.error({ subject }, refusal);
		return false;
	}
	await keepLocalMail({ recipient: to, subject, body: text });
	return true;
};

/** Sends, or keeps at /dev/mail while SMTP_URL is not set. False and a line in the log on failure. */
export const sendMail = async (mail: Mail): Promise<boolean> => {
	const { smtpUrl } = config();
	try {
		if (!smtpUrl) return await locally(mail);
		await overSmtp(smtpUrl, mail);
		return true;
	} catch (error) {
		log.error({ err: error, subject: mail.subject }, 'A mail could not be sent');
		return false;
	}
};
