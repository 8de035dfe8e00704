import type { Config } from 'tailwindcss';
import plugin from 'tailwindcss/plugin';
import { dark, light } from './src/lib/components/ui/tokens';

const variables = (tokens: Record<string, string>) =>
	Object.fromEntries(Object.entries(tokens).map(([name, value]) => [`--${name}`, value]));

export default {
	content: ['./src/**/*.{html,svelte,ts}'],
	darkMode: ['selector', '[data-theme="dark"]'],
	theme: {
		extend: {
			colors: Object.fromEntries(Object.keys(light).map((name) => [name, `var(--${name})`])),
			fontFamily: {
				sans: ['Archivo Variable', 'system-ui', 'sans-serif'],
				mono: ['Spline Sans Mono Variable', 'ui-monospace', 'monospace']
			},
			// Widths at which the bar and the Bench change their arrangement.
			screens: { bar: '56.25rem', wide: '75rem' }
		}
	},
	plugins: [
		plugin(({ addBase }) => {
			addBase({
				':root': { ...variables(light), 'color-scheme': 'light' },
				'[data-theme="dark"]': { ...variables(dark), 'color-scheme': 'dark' }
			});
		})
	]
} satisfies Config;
