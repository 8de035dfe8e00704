import { fail, ok, type Result } from '../../engine/result';
import { signUp } from '../queries/sign-up';
import { mayTry, signUpLimits } from './attempt-limit';
import type { FieldFaults } from './form-fields';
import { passwordHash } from './password';

export interface FirmFault {
	status: 409 | 429;
	message: string | null;
	faults: FieldFaults;
}

const tooMany: FirmFault = {
	status: 429,
	message: 'Too many firms were made from here just now. Wait a quarter of an hour.',
	faults: {}
};

const taken: FirmFault = {
	status: 409,
	message: null,
	faults: { email: 'This address has an account already. Sign in, or ask for a new password.' }
};

/** A new person and the firm that they own, within the limit on making them. */
export const makeFirm = async (
	asked: { name: string; firm: string; email: string; password: string },
	client: string
): Promise<Result<null, FirmFault>> => {
	if (!(await mayTry(signUpLimits(client)))) return fail(tooMany);
	const { name, email, firm: firmName } = asked;
	const hash = await passwordHash(asked.password);
	const made = await signUp({ name, email, firmName, passwordHash: hash });
	return made.ok ? ok(null) : fail(taken);
};
