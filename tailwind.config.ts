import type { Config } from 'tailwindcss';
import plugin from 'tailwindcss/plugin';

/** Colours of the marking-out table. Each token means one thing; see DEVELOPERS.md. */
const light = {
	layout: '#18265c',
	'layout-2': '#2c3f8f',
	vellum: '#f6f7f3',
	sheet: '#ffffff',
	grid: '#eaeee7',
	rule: '#d3d8d0',
	ink: '#1c2230',
	mute: '#5f6675',
	tension: '#0b7f86',
	compression: '#a8346d',
	hot: '#e58a00',
	'hot-text': '#8a5200',
	spark: '#ffb02e',
	good: '#2f7d4f',
	bad: '#a02a2a',
	'on-layout': '#ffffff'
} as const;

const dark: Record<keyof typeof light, string> = {
	layout: '#0d1535',
	'layout-2': '#9db0ff',
	vellum: '#12161f',
	sheet: '#1a202c',
	grid: '#1e2531',
	rule: '#333c4b',
	ink: '#e9ecf2',
	mute: '#a3abba',
	tension: '#3fc0c8',
	compression: '#ec7fb2',
	hot: '#ffab33',
	'hot-text': '#ffc168',
	spark: '#ffb02e',
	good: '#69c48d',
	bad: '#f08a8a',
	'on-layout': '#ffffff'
};

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
			}
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
