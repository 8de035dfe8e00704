import { DrizzleAdapter } from '@auth/drizzle-adapter';
import type { Adapter } from '@auth/sveltekit/adapters';
import { db } from '../db/connection';
import { adapterAccounts, adapterUsers, adapterVerificationTokens } from './adapter-tables';

/** Keeps people who come through an outside provider; sessions are not stored, so no such table. */
export const adapter = (): Adapter => {
	const kept = DrizzleAdapter(db(), {
		usersTable: adapterUsers,
		accountsTable: adapterAccounts,
		verificationTokensTable: adapterVerificationTokens
	});
	return {
		...kept,
		createUser: (user) => {
			const lower = { ...user, email: user.email.toLowerCase() };
			return kept.createUser?.(lower) ?? lower;
		},
		getUserByEmail: (email) => kept.getUserByEmail?.(email.toLowerCase()) ?? null
	};
};
