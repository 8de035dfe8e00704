import { fail, ok, type Result } from '../result';
import type { WorkingInput } from './working';

/**
 * Grammar of a working's formula, one line:
 * `figure = expression`, with `+ − - · × * / ^`, brackets, numbers with a decimal point, the superscripts
 * `² ³`, and the functions `√( )`, `min( , )`, `max( , )`, `abs( )`, `cos( )`, `sin( )`. A symbol is a
 * letter followed by letters, digits, `,` between letters, `_`, `'` or subscripts (`M_y,Rd`, `γM0`, `σ1`).
 * Units are converted by plain factors that stand in the formula (`10^-6`).
 */
export type FormulaToken =
	| { readonly kind: 'number'; readonly text: string; readonly value: number }
	| { readonly kind: 'symbol'; readonly text: string }
	| { readonly kind: 'function'; readonly text: string }
	| { readonly kind: 'mark'; readonly text: string }
	| { readonly kind: 'space'; readonly text: string };

const functions: Readonly<Record<string, (...values: number[]) => number>> = {
	'√': Math.sqrt,
	min: Math.min,
	max: Math.max,
	abs: Math.abs,
	cos: Math.cos,
	sin: Math.sin
};

const pattern =
	/(?<space>\s+)|(?<number>\d+(?:\.\d+)?)|(?<root>√)|(?<symbol>\p{L}(?:[\p{L}\p{M}\d_'₀-₉+*]|,(?=\p{L}))*)|(?<mark>[-+−·×*/^()=²³,])/uy;

/** The pieces of a formula in order, or what cannot be read in it. */
export function formulaTokens(formula: string): Result<FormulaToken[], string> {
	const tokens: FormulaToken[] = [];
	let at = 0;
	while (at < formula.length) {
		pattern.lastIndex = at;
		const groups = pattern.exec(formula)?.groups;
		if (!groups) return fail(`“${formula.slice(at)}” cannot be read in “${formula}”.`);
		const token = tokenOf(groups);
		tokens.push(token);
		at += token.text.length;
	}
	return ok(tokens);
}

function tokenOf(groups: Record<string, string | undefined>): FormulaToken {
	const { space, number, root, symbol, mark } = groups;
	if (space !== undefined) return { kind: 'space', text: space };
	if (number !== undefined) return { kind: 'number', text: number, value: Number(number) };
	if (root !== undefined) return { kind: 'function', text: root };
	if (symbol !== undefined)
		return { kind: Object.hasOwn(functions, symbol) ? 'function' : 'symbol', text: symbol };
	return { kind: 'mark', text: mark ?? '' };
}

/** Value of the right side of a formula with its inputs put in, or what is wrong with it. */
export function formulaValue(
	formula: string,
	inputs: readonly WorkingInput[]
): Result<number, string> {
	const tokens = formulaTokens(formula);
	if (!tokens.ok) return tokens;
	const visible = tokens.value.filter(({ kind }) => kind !== 'space');
	const equals = visible.findLastIndex(({ text }) => text === '=');
	const values = new Map(inputs.map(({ symbol, value }) => [symbol, value]));
	const reader = new Reader(visible.slice(equals + 1), values);
	const value = reader.sum();
	if (reader.wrong !== null) return fail(`${reader.wrong} in “${formula}”.`);
	if (!reader.done) return fail(`“${formula}” goes on where it should end.`);
	return ok(value);
}

/** Reads an expression from left to right; the first thing that is wrong is kept. */
class Reader {
	#at = 0;
	wrong: string | null = null;

	constructor(
		private readonly tokens: readonly FormulaToken[],
		private readonly values: ReadonlyMap<string, number>
	) {}

	get done(): boolean {
		return this.#at === this.tokens.length;
	}

	sum(): number {
		let value = this.#product();
		for (;;) {
			if (this.#take('+')) value += this.#product();
			else if (this.#take('−') || this.#take('-')) value -= this.#product();
			else return value;
		}
	}

	#product(): number {
		let value = this.#signed();
		for (;;) {
			if (this.#take('·') || this.#take('×') || this.#take('*')) value *= this.#signed();
			else if (this.#take('/')) value /= this.#signed();
			else return value;
		}
	}

	#signed(): number {
		if (this.#take('−') || this.#take('-')) return -this.#signed();
		return this.#power();
	}

	#power(): number {
		let value = this.#single();
		for (;;) {
			if (this.#take('²')) value **= 2;
			else if (this.#take('³')) value **= 3;
			else if (this.#take('^')) value **= this.#signed();
			else return value;
		}
	}

	#single(): number {
		const token = this.tokens[this.#at++];
		if (!token) return this.#fault('Something is missing');
		if (token.kind === 'number') return token.value;
		if (token.kind === 'function') return this.#call(token.text);
		if (token.kind === 'symbol')
			return this.values.get(token.text) ?? this.#fault(`${token.text} has no value`);
		if (token.text !== '(') return this.#fault(`“${token.text}” stands where a value should`);
		const value = this.sum();
		return this.#take(')') ? value : this.#fault('A bracket is not closed');
	}

	#call(name: string): number {
		if (!this.#take('(')) return this.#fault(`${name} needs a bracket`);
		const given = [this.sum()];
		while (this.#take(',')) given.push(this.sum());
		if (!this.#take(')')) return this.#fault('A bracket is not closed');
		return functions[name]!(...given);
	}

	#take(mark: string): boolean {
		if (this.tokens[this.#at]?.text !== mark) return false;
		this.#at++;
		return true;
	}

	#fault(words: string): number {
		this.wrong ??= words;
		return Number.NaN;
	}
}
