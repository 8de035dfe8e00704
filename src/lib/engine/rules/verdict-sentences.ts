import type { ClassifiedElement } from './result';
import { force, moment, ratioPair, words, type VerdictToken } from './verdict-tokens';
import type { VerdictView } from './verdict';

export const noClassSentence = (): VerdictToken[] => [
	words('No class. Nothing may be counted yet.')
];

/** A limit this many times the slenderness is not worth naming: hardly anything is compressed. */
const farOff = 20;

/** "Class 3. Count 3110 kNm, up to first yield." */
export function countSentence(view: VerdictView): VerdictToken[] {
	if (view.axial) return forceSentence(view);
	const { countable } = view.ruler;
	if (countable === null) return [words(nothingCounted(view, `Class ${view.class}`, 'No moment'))];
	if (countable === 0) return [words(`Class ${view.class}. N leaves no moment to count.`)];
	const head =
		view.basis === 'effective-class-2' ? 'Class 3, web as Class 2' : `Class ${view.class}`;
	return [words(`${head}. Count `), moment(countable), ...countedAs(view)];
}

/** "Class 1 in tension. Count 2000 kN." */
function forceSentence(view: VerdictView): VerdictToken[] {
	const head = `Class ${view.class} in ${view.N < 0 ? 'compression' : 'tension'}`;
	if (view.countableForce === null) return [words(nothingCounted(view, head, 'Nothing'))];
	return [words(`${head}. Count `), force(view.countableForce), words('.')];
}

function nothingCounted(view: VerdictView, head: string, what: string): string {
	const { withheld } = view;
	if (view.class === 4 || withheld.length === 0) return `${head}. Nothing may be counted yet.`;
	const all = [withheld.slice(0, -1).join(', '), withheld.at(-1)].filter(Boolean).join(' and ');
	const are = withheld.length > 1 || all.startsWith('bolt holes') ? 'are' : 'is';
	return `${head}. ${what} may be counted: ${all} ${are} not checked.`;
}

function countedAs({ N, biaxial, basis, gammaM0 }: VerdictView): VerdictToken[] {
	const over = gammaM0 === 1 ? '' : ` over γM0 ${gammaM0.toFixed(2)}`;
	if (N !== 0) return [words(' beside '), force(N), words(', by the linear sum.')];
	if (biaxial) return [words(' about this axis, by the linear sum.')];
	switch (basis) {
		case 'plastic':
			return [words(`, the full plastic block${over}.`)];
		case 'effective-class-2':
			return [words(`, the plastic block of the effective section${over}.`)];
		default:
			return [words(gammaM0 === 1 ? ', up to first yield.' : `, first yield${over}.`)];
	}
}

/** Which part decides and what lies beyond. */
export function detailSentence(view: VerdictView): VerdictToken[] {
	return [...decidingPart(view), ...beyond(view)];
}

function decidingPart({ class: overall, element }: VerdictView): VerdictToken[] {
	if (!element || element.limits.length === 0) return [words('No part is in compression.')];
	const { slenderness, limits, type } = element;
	const name = partWords(element);
	const symbol = type === 'tubular' ? 'd/t' : 'c/t';
	const passed = Math.max(overall - 1, 1);
	const [own, limit] = ratioPair(slenderness, limits[passed - 1] ?? slenderness);
	if (overall === 1 && (limits[0] ?? 0) > farOff * slenderness)
		return [words('No part comes near its Class 1 limit.')];
	if (overall === 1)
		return [
			words(`The ${name} comes closest: ${symbol} `),
			own,
			words(' is within the Class 1 limit '),
			limit,
			words('.')
		];
	return [
		words(`The ${name} decides it: ${symbol} `),
		own,
		words(` is over the Class ${passed} limit `),
		limit,
		words('.')
	];
}

function beyond({ N, biaxial, axial, basis, gammaM0, ruler }: VerdictView): VerdictToken[] {
	if (axial) return [];
	const { firstYield, fullPlastic, countable } = ruler;
	if (firstYield === null || fullPlastic === null) return [];
	if (countable === null)
		return [
			words(' Neither the '),
			moment(firstYield),
			words(' at first yield nor anything beyond is to be counted.')
		];
	const reserve = fullPlastic - firstYield;
	if (N !== 0 || biaxial || gammaM0 !== 1 || basis === 'effective-class-2') {
		const left = fullPlastic - countable;
		return left > 0
			? [words(' The last '), moment(left), words(' of the full block are not to be counted.')]
			: [];
	}
	const may = basis === 'plastic' ? 'may be counted' : 'are not to be counted';
	return [words(' The '), moment(reserve), words(` beyond first yield ${may}.`)];
}

function partWords({ part }: ClassifiedElement): string {
	return part.replace(/([A-Z])/g, (capital) => ` ${capital.toLowerCase()}`);
}
