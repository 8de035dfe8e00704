import { sveltekit } from '@sveltejs/kit/vite';
import { svelteTesting } from '@testing-library/svelte/vite';
import { defineConfig } from 'vitest/config';

export default defineConfig({
	plugins: [sveltekit()],
	build: { chunkSizeWarningLimit: 900 },
	test: {
		reporters: ['default', './tests/setup/tally.ts'],
		projects: [
			{
				extends: true,
				test: {
					name: 'unit',
					sequence: { groupOrder: 0 },
					testTimeout: 30_000,
					environment: 'node',
					include: ['src/**/*.test.ts', 'tests/published/**/*.test.ts', 'tests/house/**/*.test.ts'],
					exclude: ['src/**/*.svelte.test.ts']
				}
			},
			{
				extends: true,
				plugins: [svelteTesting()],
				test: {
					name: 'component',
					sequence: { groupOrder: 1 },
					testTimeout: 30_000,
					environment: 'jsdom',
					include: ['src/**/*.svelte.test.ts'],
					setupFiles: ['tests/setup/component.ts']
				}
			},
			{
				extends: true,
				test: {
					name: 'e2e',
					sequence: { groupOrder: 2 },
					environment: 'node',
					include: ['tests/api/**/*.test.ts', 'tests/e2e/**/*.test.ts', 'tests/load/**/*.test.ts'],
					globalSetup: ['tests/setup/server.ts'],
					testTimeout: 60_000,
					hookTimeout: 120_000,
					fileParallelism: false
				}
			}
		]
	}
});
