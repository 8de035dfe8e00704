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
	if (countable === 0) return [words(`Class ${view.class}. ${nothingLeft(view)}`)];
	const head =
		view.basis === 'effective-class-2' ? 'Class 3, web as Class 2' : `Class ${view.class}`;
	return [words(`${head}. Count `), moment(countable, 'countable'), ...countedAs(view)];
}

/** "Class 1 in tension. Count 2000 kN." */
function forceSentence(view: VerdictView): VerdictToken[] {
	const head = `Class ${view.class} in ${view.N < 0 ? 'compression' : 'tension'}`;
	if (view.countableForce === null) return [words(nothingCounted(view, head, 'Nothing'))];
	return [words(`${head}. Count `), force(view.countableForce, 'countableForce'), words('.')];
}

function nothingCounted(view: VerdictView, head: string, what: string): string {
	const { withheld } = view;
	if (withheld.length === 0) return `${head}. Nothing may be counted yet.`;
	const all = [withheld.slice(0, -1).join(', '), withheld.at(-1)].filter(Boolean).join(' and ');
	const are = withheld.length > 1 || all.startsWith('bolt holes') ? 'are' : 'is';
	return `${head}. ${what} may be counted: ${all} ${are} not checked.`;
}

/** Why a moment of zero is all that passes. */
function nothingLeft({ limitedBy }: VerdictView): string {
	switch (limitedBy) {
		case 'flange-induced-buckling':
			return 'Nothing may be counted: the compression flange may buckle into the web.';
		case 'shear':
			return 'No moment may be counted: the shear is more than the section resists.';
		default:
			return 'N leaves no moment to count.';
	}
}

function countedAs(view: VerdictView): VerdictToken[] {
	const { N, biaxial, besideShear, limitedBy, gammaM0 } = view;
	const over = gammaM0 === 1 ? '' : ` over γM0 ${gammaM0.toFixed(2)}`;
	const beside =
		N === 0
			? [words(besideShear ? ' beside the shear' : '')]
			: [words(' beside '), force(N), words(besideShear ? ' and the shear' : '')];
	const about = biaxial && N === 0 ? ' about this axis' : '';
	return [...beside, words(`${about}${limitWords(limitedBy) ?? countedBy(view, over)}.`)].filter(
		(token) => !('text' in token) || token.text !== ''
	);
}

function limitWords(limitedBy: VerdictView['limitedBy']): string | null {
	switch (limitedBy) {
		case 'lateral-torsional':
			return ', limited by lateral–torsional buckling';
		case 'web-shear':
			return ', limited by the web that buckles in shear';
		case 'shear':
			return ', limited by the shear that the flanges help to carry';
		default:
			return null;
	}
}

function countedBy(
	{ N, biaxial, together, besideShear, basis, gammaM0 }: VerdictView,
	over: string
): string {
	if (N !== 0 || biaxial) {
		if (together === 'fibre') return ', up to first yield';
		return together === 'sum' ? ', by the linear sum' : ', by the plastic interaction';
	}
	if (besideShear) return '';
	switch (basis) {
		case 'plastic':
			return `, the full plastic block${over}`;
		case 'effective-class-2':
			return `, the plastic block of the effective section${over}`;
		case 'effective':
			return `, on the effective section${over}`;
		case 'interpolated':
			return `, between first yield and the full block${over}`;
		default:
			return gammaM0 === 1 ? ', up to first yield' : `, first yield${over}`;
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

function beyond(view: VerdictView): VerdictToken[] {
	if (view.axial) return [];
	const { firstYield, fullPlastic, countable } = view.ruler;
	if (firstYield === null || fullPlastic === null) return [];
	if (countable === null)
		return [
			words(' Neither the '),
			moment(firstYield, 'firstYield'),
			words(' at first yield nor anything beyond is to be counted.')
		];
	if (!isPlain(view)) {
		const left = fullPlastic - countable;
		return left > 0
			? [
					words(' The last '),
					moment(left, 'left'),
					words(' of the full block are not to be counted.')
				]
			: [];
	}
	const may = view.basis === 'plastic' ? 'may be counted' : 'are not to be counted';
	return [
		words(' The '),
		moment(fullPlastic - firstYield, 'beyond'),
		words(` beyond first yield ${may}.`)
	];
}

/** Whether what counts ends just at first yield or at the full block. */
function isPlain({ N, biaxial, besideShear, limitedBy, basis, gammaM0 }: VerdictView): boolean {
	if (N !== 0 || biaxial || besideShear || gammaM0 !== 1) return false;
	if (limitedBy !== null && limitedBy !== 'section') return false;
	return basis === 'plastic' || basis === 'elastic';
}

function partWords({ part }: ClassifiedElement): string {
	return part.replace(/([A-Z])/g, (capital) => ` ${capital.toLowerCase()}`);
}
