import type { VerdictFigure, VerdictToken } from '$lib/engine/rules/verdict-tokens';
import { formatNumber, formatQuantity, type Preferences } from '$lib/units';

/** A piece of a sentence as shown: `strong` for the figures in it. */
export interface ShownPiece {
	readonly text: string;
	readonly strong: boolean;
	/** Which of the engine's figures it is; absent for words and for what was put in. */
	readonly figure?: VerdictFigure | undefined;
}

/** The verdict's tokens in the reader's units. */
export const shownPieces = (
	tokens: readonly VerdictToken[],
	preferences: Preferences
): ShownPiece[] =>
	tokens.map((token) => {
		if ('text' in token) return { text: token.text, strong: false };
		const text =
			token.quantity === 'ratio'
				? formatNumber(token.value, preferences, { decimals: token.decimals })
				: formatQuantity(token.value, token.quantity, preferences, { digits: 4, unit: true });
		return { text, strong: true, figure: token.figure };
	});

/** "a, b and c". */
export function listed(names: readonly string[]): string {
	if (names.length < 2) return names.join('');
	return `${names.slice(0, -1).join(', ')} and ${names.at(-1)}`;
}
