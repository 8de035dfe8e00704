import type { WorkingInput } from '../../explain/working';
import type { Standard } from '../result';
import { isLater } from './edition';
import type { JudgedElement } from './classify-element';
import {
	elasticBranch,
	internalTable,
	leastPsi,
	outstandRow,
	plasticBranch,
	sameRatio,
	type CompressedEnd
} from './limits';

/** The right side of a limit with the numbers of its branch. */
export interface LimitFormula {
	readonly formula: string;
	readonly inputs: readonly WorkingInput[];
}

/** Numbers that limits are made of; ψ is −3 where it lies below or nothing is compressed elastically. */
interface LimitInputs {
	readonly epsilon: WorkingInput;
	readonly alpha: WorkingInput;
	readonly psi: WorkingInput;
	readonly kSigma: WorkingInput;
}

/** What the limits of classes 1, 2 and 3 of a compressed part come from, in the branch that holds. */
export function limitFormulas(
	standard: Standard,
	judged: JudgedElement,
	given: LimitInputs
): readonly [LimitFormula, LimitFormula, LimitFormula] {
	const { row, plastic, elastic } = judged;
	const all = (own: LimitFormula) => [own, own, own] as const;
	switch (row.type) {
		case 'internal': {
			const formulas = internalFormulas(standard, given);
			return judged.held ? all(formulas[2]) : formulas;
		}
		case 'outstand': {
			const formulas = outstandFormulas(given, (plastic ?? elastic)?.end ?? 'tip');
			return judged.held ? all(formulas[2]) : formulas;
		}
		case 'tubular':
			return tubularFormulas(standard, given);
		case 'angle': {
			const own = { formula: `${row.limits[0]! / row.epsilon}·ε`, inputs: [given.epsilon] };
			return all(own);
		}
	}
}

function internalFormulas(standard: Standard, { epsilon, alpha, psi }: LimitInputs) {
	const { plastic, bending, compression, beyond, divisor } = internalTable(standard);
	const branch = plasticBranch(alpha.value);
	const byAlpha = (row: (typeof plastic)[0]): LimitFormula => {
		if (branch === 'bending' || branch === 'compression')
			return { formula: `${row[branch]}·ε`, inputs: [epsilon] };
		const low = branch === 'low';
		const formula = low ? `${row.low}·ε/α` : `${row.high}·ε/(${row.factor}·α − 1)`;
		return { formula, inputs: [epsilon, alpha] };
	};
	const [constant, linear, square] = divisor;
	const tail = square === 0 ? '' : ` + ${square}·ψ²`;
	const byPsi = {
		bending: `${bending}·ε`,
		over: `${compression}·ε/(${constant} + ${linear}·ψ${tail})`,
		beyond: `${beyond}·ε·(1 − ψ)${isLater(standard) ? '' : '·√(−ψ)'}`
	}[elasticBranch(psi.value)];
	const third = { formula: byPsi, inputs: byPsi.includes('ψ') ? [epsilon, psi] : [epsilon] };
	return [byAlpha(plastic[0]), byAlpha(plastic[1]), third] as const;
}

function outstandFormulas({ epsilon, alpha, psi, kSigma }: LimitInputs, end: CompressedEnd) {
	const [one, two, three] = outstandRow;
	const share = end === 'tip' ? 'α' : '(α·√(α))';
	const byAlpha = (factor: number): LimitFormula => ({
		formula: `${factor}·ε/${share}`,
		inputs: [epsilon, alpha]
	});
	const third =
		psi.value >= 1 - sameRatio
			? { formula: `${three}·ε`, inputs: [epsilon] }
			: { formula: '21·ε·√(kσ)', inputs: [epsilon, kSigma] };
	return [byAlpha(one), byAlpha(two), third] as const;
}

function tubularFormulas(standard: Standard, { epsilon, psi }: LimitInputs) {
	const plain = (factor: number): LimitFormula => ({
		formula: `${factor}·ε²`,
		inputs: [epsilon]
	});
	const third = isLater(standard)
		? { formula: '2520·ε²/(5·max(ψ, −1) + 23)', inputs: [epsilon, psi] }
		: plain(90);
	return [plain(50), plain(70), third] as const;
}

/** kσ of an outstand as EN 1993-1-5 Table 4.2 writes it for its ψ. */
export function bucklingFormula(psi: number, end: CompressedEnd): string {
	if (end === 'tip') return `0.57 − 0.21·max(ψ, −${-leastPsi}) + 0.07·max(ψ, −${-leastPsi})²`;
	return psi > 0 ? '0.578/(ψ + 0.34)' : '1.7 − 5·max(ψ, −1) + 17.1·max(ψ, −1)²';
}
