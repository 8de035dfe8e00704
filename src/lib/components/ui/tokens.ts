/** Colours of the marking-out table. Each token means one thing, in either theme. */
export const light = {
	/** Top bar, neutral axis. */
	layout: '#18265c',
	/** Curves, strain, links, demand. */
	'layout-2': '#2c3f8f',
	/** The page, and a raised surface on it. */
	vellum: '#f6f7f3',
	sheet: '#ffffff',
	/** Drawing grid, hairlines, and the edge of a control. */
	grid: '#eaeee7',
	rule: '#d3d8d0',
	edge: '#828a97',
	/** Text and secondary text. */
	ink: '#1c2230',
	mute: '#5f6675',
	tension: '#0a7c83',
	compression: '#a8346d',
	/** Yielding, as colour and as text. */
	hot: '#e58a00',
	'hot-text': '#8a5200',
	/** The one thing to grab. */
	spark: '#ffb02e',
	good: '#2f7d4f',
	bad: '#a02a2a',
	/** Quiet grounds behind chosen, yielding, passing and faulty things. */
	'layout-tint': '#e4e8f7',
	'hot-tint': '#fff5e4',
	'good-tint': '#edf7f0',
	'bad-tint': '#fbeaea',
	/** Ground and outline of a button, the ring of what has focus. */
	button: '#18265c',
	'line-button': '#18265c',
	focus: '#2c3f8f',
	link: '#2c3f8f',
	/** Text on layout, on a button, and on spark. */
	'on-layout': '#ffffff',
	'on-layout-mute': '#c8d0ee',
	'on-spark': '#1c2230'
} as const;

export type Token = keyof typeof light;

export const dark: Record<Token, string> = {
	layout: '#0d1535',
	'layout-2': '#9db0ff',
	vellum: '#12161f',
	sheet: '#1a202c',
	grid: '#1e2531',
	rule: '#333c4b',
	edge: '#717c90',
	ink: '#e9ecf2',
	mute: '#a3abba',
	tension: '#3fc0c8',
	compression: '#ec7fb2',
	hot: '#ffab33',
	'hot-text': '#ffc168',
	spark: '#ffb02e',
	good: '#69c48d',
	bad: '#f08a8a',
	'layout-tint': '#232c4d',
	'hot-tint': '#2c2416',
	'good-tint': '#182b20',
	'bad-tint': '#331d20',
	button: '#3a4fae',
	'line-button': '#b4c2ff',
	focus: '#ffb02e',
	link: '#9db0ff',
	'on-layout': '#ffffff',
	'on-layout-mute': '#b6c0e4',
	'on-spark': '#1c2230'
};
