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

/** A piece with the mark that closes it, so that no line begins with a comma. */
export interface GluedPiece extends ShownPiece {
	readonly mark: string;
}

/** Moves a mark at the start of a piece to the figure before it. */
export function gluedPieces(pieces: readonly ShownPiece[]): GluedPiece[] {
	const markOf = (piece: ShownPiece | undefined) =>
		piece && !piece.strong ? (/^[.,;:]+/.exec(piece.text)?.[0] ?? '') : '';
	return pieces.map((piece, at) => ({
		...piece,
		text: pieces[at - 1]?.strong ? piece.text.slice(markOf(piece).length) : piece.text,
		mark: piece.strong ? markOf(pieces[at + 1]) : ''
	}));
}

/** "a, b and c". */
export function listed(names: readonly string[]): string {
	if (names.length < 2) return names.join('');
	return `${names.slice(0, -1).join(', ')} and ${names.at(-1)}`;
}
