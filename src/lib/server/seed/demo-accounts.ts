import { z } from 'zod';
import { roles } from '../rights/roles';
import accounts from './demo-accounts.json';

const shape = z.object({
	firm: z.string(),
	note: z.string(),
	password: z.string(),
	people: z.array(z.object({ name: z.string(), email: z.string(), role: z.enum(roles) }))
});

/** The invented firm, its people (one per role) and the password that they share. */
export const demoAccounts = shape.parse(accounts);
