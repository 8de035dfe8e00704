import type { ProofSource, ProofValue, Tolerance } from '../check';
import { analysed, step } from './sections';

export const lateralTorsionalSource: ProofSource = {
	family: 'resistance',
	source:
		'Gardner & Nethercot, Designers’ Guide to EN 1993-1-1 (Thomas Telford), Example 6.8, segment BC',
	standard: 'EN 1993-1-1:2005',
	clause: 'EN 1993-1-1:2005 6.3.2.2',
	fromMemory: true,
	memoryConfidence: null
};

const share = (value: number, why: string): Tolerance => ({ kind: 'relative', value, why });
const digits: Tolerance = { kind: 'absolute', value: 0.005, why: 'half the last digit printed' };

/** 762×267×173 UB, S275 taken as 275 N/mm², over 3.2 m with C1 = 1.052. */
export function lateralTorsionalValues(): ProofValue[] {
	const sizes = { h: 762.2, b: 266.7, tw: 14.3, tf: 21.6, r: 16.5 };
	const demands = [{ name: 'BC', My: 1362, unbracedLength: 3200, C1: 1.052 }];
	const analysis = analysed(
		{ kind: 'i', fabrication: 'rolled', ...sizes, grade: 275 },
		{ demands, explain: true }
	);
	const value = (
		quantity: string,
		key: string,
		unit: string,
		published: number,
		tolerance: Tolerance
	): ProofValue => ({
		id: `lateral-torsional/${key}`,
		case: '762×267×173 UB, fy 275, 3.2 m unbraced, C1 1.052',
		...{ quantity, unit, published, tolerance },
		ours: step(analysis, `reduced.BC.${key}`)
	});
	return [
		value('Mcr', 'Mcr', 'kNm', 5699, share(0.01, 'rounded It and Iw go into the example: 1 %')),
		value('λLT', 'lambdaLT', '', 0.55, digits),
		value('χLT', 'chiLT', '', 0.86, digits),
		value('Mb,Rd', 'MbRd', 'kNm', 1469, share(0.005, 'χLT is printed to two digits: 0.5 %'))
	];
}
