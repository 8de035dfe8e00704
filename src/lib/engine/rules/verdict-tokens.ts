/** Which figure of the demand, or of the part that decides, a number in a sentence is. */
export type VerdictFigure =
	'countable' | 'countableForce' | 'firstYield' | 'beyond' | 'left' | 'slenderness' | 'limit';

/** A piece of a sentence: words, or a number that the screen writes in the reader's units. */
export type VerdictToken =
	| { readonly text: string }
	| {
			readonly quantity: 'moment' | 'force';
			readonly value: number;
			/** Absent for what was put in. */
			readonly figure?: VerdictFigure;
	  }
	| {
			readonly quantity: 'ratio';
			readonly value: number;
			readonly decimals: number;
			readonly figure: VerdictFigure;
	  };

export const words = (text: string): VerdictToken => ({ text });
export const moment = (value: number, figure: VerdictFigure): VerdictToken => ({
	quantity: 'moment',
	value,
	figure
});
export const force = (value: number, figure?: VerdictFigure): VerdictToken =>
	figure ? { quantity: 'force', value, figure } : { quantity: 'force', value };

/** A slenderness beside its limit, with as many decimals as it takes to tell them apart. */
export function ratioPair(a: number, b: number): [VerdictToken, VerdictToken] {
	const written = (value: number, more: number) => value.toFixed(decimals(value) + more);
	let more = 0;
	while (more < 6 && written(a, more) === written(b, more)) more++;
	const ratio = (value: number, figure: VerdictFigure): VerdictToken => ({
		quantity: 'ratio',
		value,
		decimals: decimals(value) + more,
		figure
	});
	return [ratio(a, 'slenderness'), ratio(b, 'limit')];
}

const decimals = (value: number) => (Math.abs(value) < 10 ? 2 : 1);

/** The sentence in kNm and kN with a decimal point. */
export const plainSentence = (tokens: readonly VerdictToken[]): string =>
	tokens.map(plainToken).join('');

function plainToken(token: VerdictToken): string {
	if ('text' in token) return token.text;
	if (token.quantity === 'ratio') return token.value.toFixed(token.decimals);
	return `${plainNumber(token.value)} ${token.quantity === 'moment' ? 'kNm' : 'kN'}`;
}

function plainNumber(value: number): string {
	const size = Math.abs(value);
	const written = size.toFixed(size >= 100 ? 0 : size >= 10 ? 1 : size >= 1 ? 2 : 3);
	return value < 0 ? `−${written}` : written;
}
