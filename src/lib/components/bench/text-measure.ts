import { roughTextWidth, type TextMeasure } from '$lib/drawing/text-width';

/** Measures text as the browser sets it; by letter kind where there is no canvas. Widths are kept. */
export function browserTextMeasure(family: string): TextMeasure {
	if (typeof document === 'undefined' || !('fonts' in document)) return roughTextWidth;
	const context = document.createElement('canvas').getContext('2d');
	if (!context) return roughTextWidth;
	const kept = new Map<string, number>();
	return (text, size) => {
		const key = `${size} ${text}`;
		const known = kept.get(key);
		if (known !== undefined) return known;
		context.font = `500 ${size}px ${family}`;
		const width = context.measureText(text).width;
		if (kept.size > 4000) kept.clear();
		kept.set(key, width);
		return width;
	};
}
