import { demoAccounts } from './demo-accounts';
import { demoStands } from './demo';

/** What the sign-in page says of the demo firm; null where there is none. */
export const demoForSignIn = async () => {
	if (process.env.DEMO === 'off' || !(await demoStands())) return null;
	const { firm, password, people } = demoAccounts;
	return { firm, password, people };
};
