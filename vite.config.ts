import { sveltekit } from '@sveltejs/kit/vite';
import tailwindcss from '@tailwindcss/vite';
import { svelteTesting } from '@testing-library/svelte/vite';
import { defineConfig } from 'vitest/config';

export default defineConfig({
	plugins: [tailwindcss(), sveltekit()],
	build: { target: 'es2022' },
	test: {
		expect: { requireAssertions: true },
		projects: [
			{
				extends: true,
				test: {
					name: 'unit',
					environment: 'node',
					include: ['src/**/*.test.ts', 'tests/golden/**/*.test.ts'],
					exclude: ['src/**/*.svelte.test.ts']
				}
			},
			{
				extends: true,
				plugins: [svelteTesting()],
				test: { name: 'client', environment: 'jsdom', include: ['src/**/*.svelte.test.ts'] }
			},
			{
				extends: true,
				test: {
					name: 'db',
					environment: 'node',
					include: ['tests/integration/**/*.test.ts'],
					fileParallelism: false
				}
			}
		]
	}
});
