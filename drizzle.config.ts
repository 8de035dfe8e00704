import { defineConfig } from 'drizzle-kit';

export default defineConfig({
	dialect: 'mysql',
	schema: ['./src/lib/server/db/schema/index.ts', './src/lib/server/db/schema/rate-windows.ts'],
	out: './drizzle',
	dbCredentials: { url: process.env.DATABASE_URL ?? '' }
});
