import { config } from '../config';
import { log } from '../log';
import { sendMail } from '../mail/send-mail';
import { credentialsOf } from '../queries/people';
import { keepReset, resetIsUsable, resetPassword } from '../queries/password-resets';
import { forgotLimits, mayTry } from './attempt-limit';
import { passwordHash } from './password';
import { newToken, tokenHash } from './token';

const hour = 60 * 60_000;

const letter = (name: string, token: string) => `Hello ${name},

somebody, probably you, asked for a new password at Flangewright.
Set it here within an hour; the link works once:

${config().origin}/reset?token=${token}

If it was not you, nothing needs doing: your password stays as it is.
`;

const mailReset = async (email: string, client: string): Promise<void> => {
	const address = email.trim().toLowerCase();
	if (!(await mayTry(forgotLimits(address, client)))) return;
	const person = await credentialsOf(address);
	if (!person?.active || !person.passwordHash) return;
	const { token, hash } = newToken();
	await keepReset(person.id, hash, new Date(Date.now() + hour));
	await sendMail({
		to: person.email,
		subject: 'A new password for Flangewright',
		text: letter(person.name, token)
	});
};

/**
 * Mails a link to set a new password, if there is such a person. Returns at once and says nothing,
 * so that neither the answer nor its time tells whether the address is known.
 */
export const requestReset = (email: string, client: string): void => {
	mailReset(email, client).catch((error: unknown) =>
		log.error({ err: error }, 'A password reset could not be mailed')
	);
};

/** Whether a mailed link would still work; looking does not use it up. */
export const resetStillWorks = (token: string): Promise<boolean> => resetIsUsable(tokenHash(token));

/** Sets the new password and signs out everywhere; false when the link no longer works. */
export const setNewPassword = async (token: string, password: string): Promise<boolean> => {
	if (!(await resetStillWorks(token))) return false;
	return resetPassword(tokenHash(token), await passwordHash(password));
};
