import { hash, verify } from '@node-rs/argon2';

/** OWASP's argon2id setting: 19 MiB, two passes, one lane. The library's default is argon2id. */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export const shortestPassword = 10;
export const longestPassword = 200;

/** What is wrong with a password that somebody wants to have, or null. */
export const passwordFault = (password: string): string | null => {
	if (password.length < shortestPassword)
		return `Use at least ${shortestPassword} characters for the password.`;
	if (password.length > longestPassword)
		return `Use at most ${longestPassword} characters for the password.`;
	return null;
};

export const passwordHash = (password: string): Promise<string> => hash(password, cost);

let nobodysHash: Promise<string> | undefined;

/**
 * Whether the password fits the hash. Where there is no such person or no password, the same work
 * is done against a hash that fits nothing, so that the answer takes as long.
 */
export const passwordFits = async (stored: string | null, password: string): Promise<boolean> => {
	const against = stored ?? (await (nobodysHash ??= passwordHash(crypto.randomUUID())));
	const tried = password.length > longestPassword ? '' : password;
	const fits = await verify(against, tried).catch(() => false);
	return stored !== null && fits;
};
