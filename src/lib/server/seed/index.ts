import { config } from '../config';
import { underDatabaseLock } from '../db/migrate';
import { log } from '../log';
import { seedCatalogues } from './catalogues';
import { seedDemo } from './demo';

export { demoAccounts } from './demo-accounts';

const demoIsWanted = () => process.env.DEMO !== 'off';

/**
 * Fills the database after migration: the shipped catalogues, and the demo firm unless DEMO=off.
 * Does nothing to what stands already; of several instances that start at once, one works and the
 * others wait.
 */
export const seed = (): Promise<void> =>
	underDatabaseLock(config().databaseUrl, async () => {
		const start = performance.now();
		const shapes = await seedCatalogues();
		const demo = demoIsWanted() && (await seedDemo());
		const ms = Math.round(performance.now() - start);
		if (shapes > 0 || demo) log.info({ shapes, demo, ms }, 'database seeded');
	});
