import { formulaTokens } from '$lib/engine/explain/formula';
import type { WorkingInput } from '$lib/engine/explain/working';
import { formatNumber, type Preferences } from '$lib/units';

/** A piece of a formula as set on the page. */
export interface FormulaPiece {
	readonly kind: 'plain' | 'symbol' | 'sub' | 'sup';
	readonly text: string;
}

/** A formula with its symbols, their indices set low and powers set high. */
export function formulaPieces(formula: string, preferences: Preferences): FormulaPiece[] {
	return pieces(formula, preferences, (symbol) => symbolPieces(symbol));
}

/** The right side with the numbers put in, in the units of the formula; empty when nothing goes in. */
export function putIn(
	formula: string,
	inputs: readonly WorkingInput[],
	preferences: Preferences
): FormulaPiece[] {
	if (inputs.length === 0) return [];
	const values = new Map(inputs.map(({ symbol, value }) => [symbol, value]));
	const right = formula.slice(formula.lastIndexOf('=') + 1).trim();
	return pieces(right, preferences, (symbol) => {
		const value = values.get(symbol);
		if (value === undefined) return symbolPieces(symbol);
		const text = formatNumber(value, preferences, { digits: 5, trim: true });
		return [{ kind: 'plain', text: value < 0 ? `(${text})` : text }];
	});
}

/** `M_y,Rd` as M with y,Rd below. */
export function symbolPieces(symbol: string): FormulaPiece[] {
	const at = symbol.indexOf('_');
	if (at < 0) return [{ kind: 'symbol', text: symbol }];
	const [head, index] = [symbol.slice(0, at), symbol.slice(at + 1).replaceAll('_', ',')];
	const prime = index.endsWith("'");
	return [
		{ kind: 'symbol', text: head },
		{ kind: 'sub', text: prime ? index.slice(0, -1) : index },
		...(prime ? [{ kind: 'symbol', text: '′' } as const] : [])
	];
}

function pieces(
	formula: string,
	preferences: Preferences,
	symbol: (text: string) => FormulaPiece[]
): FormulaPiece[] {
	const read = formulaTokens(formula);
	if (!read.ok) return [{ kind: 'plain', text: formula }];
	let power = false;
	return read.value.flatMap((token): FormulaPiece[] => {
		if (token.kind === 'mark' && token.text === '^') {
			power = true;
			return [];
		}
		const high = power;
		if (token.kind !== 'mark' || token.text !== '-') power = false;
		const kind = high ? 'sup' : 'plain';
		switch (token.kind) {
			case 'number':
				return [{ kind, text: localNumber(token.text, preferences) }];
			case 'symbol':
				return high ? [{ kind, text: token.text }] : symbol(token.text);
			case 'mark':
				return [{ kind, text: marks[token.text] ?? token.text }];
			case 'function':
			case 'space':
				return [{ kind, text: token.text }];
			default:
				return token satisfies never;
		}
	});
}

const marks: Readonly<Record<string, string>> = { '-': '−', '·': ' · ', '*': ' · ', '/': ' / ' };

const localNumber = (text: string, { decimal }: Preferences) =>
	decimal === 'comma' ? text.replace('.', ',') : text;
