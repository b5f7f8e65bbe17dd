import type { Config } from 'tailwindcss';

// Colours, type and radii are tokens in src/app.css (@theme); only what cannot be a token stands here.
export default {
	content: ['./src/**/*.{html,svelte,ts}'],
	darkMode: ['selector', '[data-theme="dark"]']
} satisfies Config;
