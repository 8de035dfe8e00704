import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { text } from 'node:stream/consumers';
import { SMTPServer } from 'smtp-server';

/** A mail as it was handed over: the envelope and the raw message. */
export interface CaughtMail {
	from: string;
	to: string[];
	raw: string;
}

const portOf = (server: { address(): unknown }) => (server.address() as AddressInfo).port;

const smtpInto = (caught: CaughtMail[]) =>
	new SMTPServer({
		authOptional: true,
		disabledCommands: ['STARTTLS', 'AUTH'],
		onData: (stream, session, done) => {
			void text(stream).then((raw) => {
				const { mailFrom, rcptTo } = session.envelope;
				caught.push({
					from: mailFrom ? mailFrom.address : '',
					to: rcptTo.map(({ address }) => address),
					raw
				});
				done();
			});
		}
	});

const mailboxOf = (caught: CaughtMail[]): Server =>
	createServer((_request, response) => {
		response.setHeader('content-type', 'application/json');
		response.end(JSON.stringify(caught));
	});

const listen = (server: { listen(port: number, host: string, then: () => void): unknown }) =>
	new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));

/** A mail server that keeps what it is given; `mailboxUrl` answers with it as JSON. */
export const startMailFake = async () => {
	const caught: CaughtMail[] = [];
	const smtp = smtpInto(caught);
	const mailbox = mailboxOf(caught);
	await Promise.all([listen(smtp), listen(mailbox)]);
	return {
		smtpUrl: `smtp://127.0.0.1:${portOf(smtp.server)}`,
		mailboxUrl: `http://127.0.0.1:${portOf(mailbox)}`,
		stop: async () => {
			mailbox.closeAllConnections();
			mailbox.close();
			await new Promise<void>((resolve) => smtp.close(resolve));
		}
	};
};
