import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import svelte from 'eslint-plugin-svelte';
import globals from 'globals';
import ts from 'typescript-eslint';
import { doorsRule } from './scripts/eslint/doors.js';
import svelteConfig from './svelte.config.js';

const noExportAll = {
	selector: 'ExportAllDeclaration[exported=null]',
	message: 'Name what is exported: no export *.'
};

export default ts.config(
	{ ignores: ['build/', '.svelte-kit/', '.local/', 'node_modules/', 'tests/output/', 'drizzle/'] },
	js.configs.recommended,
	...ts.configs.strict,
	...ts.configs.stylistic,
	...svelte.configs.recommended,
	prettier,
	...svelte.configs.prettier,
	{
		languageOptions: { globals: { ...globals.browser, ...globals.node } },
		linterOptions: { noInlineConfig: true, reportUnusedDisableDirectives: 'error' },
		plugins: { house: { rules: { doors: doorsRule } } },
		rules: {
			'house/doors': 'error',
			'no-restricted-syntax': ['error', noExportAll],
			'no-undef': 'off',
			eqeqeq: 'error',
			'no-console': 'error',
			'@typescript-eslint/consistent-type-definitions': 'off',
			'@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
			'@typescript-eslint/no-unused-vars': [
				'error',
				{ argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true }
			],
			// indexing within known bounds, in hot loops
			'@typescript-eslint/no-non-null-assertion': 'off',
			'@typescript-eslint/no-empty-function': 'off',
			'svelte/no-navigation-without-resolve': 'off'
		}
	},
	{
		files: ['src/**/*.ts', 'tests/**/*.ts'],
		ignores: ['**/*.svelte.ts'],
		languageOptions: { parserOptions: { projectService: true } },
		rules: {
			'@typescript-eslint/no-floating-promises': 'error',
			'@typescript-eslint/no-misused-promises': 'error',
			'@typescript-eslint/switch-exhaustiveness-check': [
				'error',
				{ considerDefaultExhaustiveForUnions: true }
			]
		}
	},
	{
		files: ['**/*.svelte', '**/*.svelte.ts'],
		languageOptions: {
			parserOptions: { parser: ts.parser, extraFileExtensions: ['.svelte'], svelteConfig }
		}
	},
	{
		files: ['src/lib/engine/**/*.ts', 'src/lib/units/**/*.ts', 'src/lib/drawing/**/*.ts'],
		ignores: ['**/*.test.ts'],
		rules: {
			'no-restricted-globals': ['error', 'window', 'document', 'fetch', 'process', 'performance'],
			'no-restricted-properties': [
				'error',
				{ object: 'Math', property: 'random', message: 'The same input gives the same figures.' },
				{ object: 'Date', property: 'now', message: 'The same input gives the same figures.' }
			]
		}
	},
	{
		files: ['tests/bench/**/*.ts'],
		rules: { 'no-console': 'off' }
	}
);
