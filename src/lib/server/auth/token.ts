import { createHash, randomBytes } from 'node:crypto';

/** Hash under which a mailed token is kept; the token itself is 256 random bits, so no salt. */
export const tokenHash = (token: string): string =>
	createHash('sha256').update(token).digest('hex');

/** A fresh token to mail (43 characters, safe in an address) and the hash to keep. */
export const newToken = (): { token: string; hash: string } => {
	const token = randomBytes(32).toString('base64url');
	return { token, hash: tokenHash(token) };
};
