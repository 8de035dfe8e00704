import { fail, ok, type Result } from '../../engine/result';
import { log } from '../log';
import { credentialsOf, type Credentials } from '../queries/people';
import { forgiveTries, mayTry, signInLimits } from './attempt-limit';
import { passwordFits } from './password';

export type SignInFault = 'too_many' | 'no_fit';

/**
 * Whether e-mail and password belong together. Unknown, switched off and wrong password are one
 * answer, given after the same work.
 */
export const checkCredentials = async (
	email: string,
	password: string,
	client: string
): Promise<Result<Credentials, SignInFault>> => {
	const address = email.trim().toLowerCase();
	const limits = signInLimits(address, client);
	if (!(await mayTry(limits))) {
		log.warn({ client }, 'too many attempts to sign in');
		return fail('too_many');
	}
	const person = await credentialsOf(address);
	const fits = await passwordFits(person?.passwordHash ?? null, password);
	if (!person?.active || !fits) return fail('no_fit');
	await forgiveTries(limits.slice(0, 2));
	return ok(person);
};
