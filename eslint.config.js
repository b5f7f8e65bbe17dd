import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import svelte from 'eslint-plugin-svelte';
import globals from 'globals';
import ts from 'typescript-eslint';
import svelteConfig from './svelte.config.js';
import { importRules } from './scripts/importRules.js';

export default ts.config(
	{ ignores: ['build/', '.svelte-kit/', '.data/', 'test-results/', 'playwright-report/', 'drizzle/'] },
	js.configs.recommended,
	...ts.configs.recommended,
	...svelte.configs.recommended,
	prettier,
	...svelte.configs.prettier,
	{
		languageOptions: { globals: { ...globals.browser, ...globals.node } },
		rules: {
			'no-undef': 'off',
			'no-console': 'error',
			eqeqeq: 'error',
			'@typescript-eslint/no-explicit-any': 'error',
			'@typescript-eslint/consistent-type-imports': 'error',
			'@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
			'max-lines': ['error', { max: 400, skipBlankLines: true, skipComments: true }],
			'max-params': ['error', 4]
		}
	},
	{
		files: ['src/**/*.ts'],
		ignores: ['**/*.test.ts'],
		languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
		rules: {
			'@typescript-eslint/no-floating-promises': 'error',
			'@typescript-eslint/switch-exhaustiveness-check': 'error'
		}
	},
	{
		files: ['**/*.svelte', '**/*.svelte.ts'],
		languageOptions: {
			parserOptions: { projectService: true, extraFileExtensions: ['.svelte'], parser: ts.parser, svelteConfig }
		},
		rules: { 'max-lines': ['error', { max: 300, skipBlankLines: true, skipComments: true }] }
	},
	{ files: ['scripts/**'], rules: { 'no-console': 'off' } },
	{
		files: ['tests/**', '**/*.test.ts'],
		rules: { 'max-params': 'off', 'max-lines': ['error', { max: 600, skipBlankLines: true, skipComments: true }] }
	},
	...importRules
);
