import { describe, expect, it } from 'vitest';
import { dark, light, type Token } from './tokens';

/** Relative luminance and contrast ratio as WCAG 2.2 defines them. */
function luminance(hex: string): number {
	const [red = 0, green = 0, blue = 0] = [1, 3, 5]
		.map((at) => parseInt(hex.slice(at, at + 2), 16) / 255)
		.map((share) => (share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4));
	return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}
function contrast(one: string, other: string): number {
	const [low = 0, high = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b);
	return (high + 0.05) / (low + 0.05);
}

const surfaces: Token[] = ['vellum', 'sheet'];
const texts: Token[] = [
	...(['ink', 'mute', 'layout-2', 'link', 'tension', 'compression'] as const),
	...(['hot-text', 'good', 'bad', 'line-button'] as const)
];
const onSurfaces = texts.flatMap((text) => surfaces.map((surface) => [text, surface] as const));
const onTints: (readonly [Token, Token])[] = [
	['ink', 'layout-tint'],
	['mute', 'layout-tint'],
	['line-button', 'layout-tint'],
	['ink', 'hot-tint'],
	['hot-text', 'hot-tint'],
	['ink', 'good-tint'],
	['good', 'good-tint'],
	['ink', 'bad-tint'],
	['bad', 'bad-tint'],
	['ink', 'grid'],
	['mute', 'grid'],
	['on-layout', 'layout'],
	['on-layout-mute', 'layout'],
	['on-layout', 'button'],
	['on-spark', 'spark']
];
const boundaries: (readonly [Token, Token])[] = [
	['edge', 'sheet'],
	['edge', 'vellum'],
	['focus', 'sheet'],
	['focus', 'vellum'],
	['spark', 'layout']
];

describe.each([
	['light', light],
	['dark', dark]
])('the %s theme', (_, theme) => {
	it('gives WCAG 2.2 its own example: black on white is 21 to 1', () => {
		expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 10);
	});

	it.each([...onSurfaces, ...onTints])('reads %s on %s at 4.5 to 1 or better', (text, ground) => {
		expect(contrast(theme[text], theme[ground])).toBeGreaterThanOrEqual(4.5);
	});

	it.each(boundaries)('sets %s off from %s at 3 to 1 or better', (edge, ground) => {
		expect(contrast(theme[edge], theme[ground])).toBeGreaterThanOrEqual(3);
	});
});
