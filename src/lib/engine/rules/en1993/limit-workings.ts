import { workingKey } from '../../explain/keys';
import type { Working, WorkingInput, Workings } from '../../explain/working';
import type { JudgedElement } from './classify-element';
import type { Judging } from './classify';
import { editionName } from './edition';
import { bucklingFormula, limitFormulas } from './limit-formulas';
import { leastPsi, outstandBuckling } from './limits';
import { modulusOfCode } from './strengths';

/** Keeps how c/t of every part came about, and of a compressed one ε, α, ψ, kσ and the limits. */
export function addLimitWorkings(
	judging: Judging,
	workings: Workings,
	judged: readonly JudgedElement[]
): void {
	for (const each of judged) addWorkings(judging, workings, each);
}

type Piece = Pick<Working, 'title' | 'formula' | 'inputs'> & {
	readonly value: number;
	readonly clause?: string;
};

function addWorkings(
	{ standard, modulus, caseName }: Judging,
	to: Workings,
	judged: JudgedElement
) {
	const { row } = judged;
	const { part, type } = row;
	const edition = editionName(standard);
	const keyOf = (figure: string) => workingKey.limitFigure(caseName, part, type, figure);
	const add = (key: string, { value, clause = row.clause, ...piece }: Piece) =>
		to.add(key, () => ({ ...piece, clause, edition, result: { value, unit: '' } }));
	const from = (symbol: string, value: number, figure: string): WorkingInput => ({
		symbol,
		value,
		unit: '',
		from: keyOf(figure)
	});
	const psiUsed = Math.max(row.psi ?? judged.elastic?.ratio ?? leastPsi, leastPsi);
	const end = (judged.elastic ?? judged.plastic)?.end ?? 'tip';
	const kSigma = outstandBuckling(psiUsed, end);
	const given = {
		epsilon: from('ε', row.epsilon, 'epsilon'),
		alpha: from('α', row.alpha ?? 1, 'alpha'),
		psi: from('ψ', psiUsed, 'psi'),
		kSigma: from('kσ', kSigma, 'kSigma')
	};
	add(keyOf('slenderness'), slendernessPiece(judged));
	if (row.limits.length === 0) return;
	add(keyOf('epsilon'), epsilonPiece(judged, modulus));
	if (row.alpha !== undefined) add(keyOf('alpha'), alphaPiece(judged, row.alpha));
	if (judged.elastic) add(keyOf('psi'), psiPiece(judged.elastic, psiUsed));
	if (type === 'outstand') add(keyOf('kSigma'), bucklingPiece(given.psi, end, kSigma));
	limitFormulas(standard, judged, given).forEach(({ formula, inputs }, i) => {
		const title = `Limit of class ${i + 1} on ${type === 'tubular' ? 'd/t' : 'c/t'}`;
		const piece = { title, formula: `λ_${i + 1} = ${formula}`, inputs, value: row.limits[i]! };
		add(keyOf(`${i + 1}`), piece);
		if (i === Math.min(row.class, 3) - 1) add(workingKey.limits(caseName, part, type), piece);
	});
}

const millimetres = (symbol: string, value: number): WorkingInput => ({
	symbol,
	value,
	unit: 'mm'
});

function slendernessPiece({ row: { type, c, t, slenderness } }: JudgedElement): Piece {
	const size = type === 'tubular' ? 'd' : 'c';
	return {
		title: 'Width over thickness',
		formula: `λ = ${size}/t`,
		inputs: [millimetres(size, c), millimetres('t', t)],
		value: slenderness
	};
}

function epsilonPiece({ fy, row }: JudgedElement, modulus: number): Piece {
	const strength = { symbol: 'fy', value: fy, unit: 'N/mm²' };
	const soft = modulus < modulusOfCode;
	return {
		title: 'Strength ratio ε',
		formula: soft ? `ε = √(235/fy·E/${modulusOfCode})` : 'ε = √(235/fy)',
		inputs: soft ? [strength, { symbol: 'E', value: modulus, unit: 'N/mm²' }] : [strength],
		value: row.epsilon
	};
}

/** From the plastic block; 0 where that leaves the part in tension. */
function alphaPiece({ plastic }: JudgedElement, alpha: number): Piece {
	const title = 'Compressed share α of the width';
	const { most = 1, least = 0 } = plastic ?? {};
	if (alpha === 1 || alpha === 0)
		return { title, formula: `α = ${alpha}`, inputs: [], value: alpha };
	const edge = 'distance from the plastic neutral axis';
	const inputs = [
		{ symbol: 'd1', value: most, unit: 'mm', from: `${edge}, more compressed edge` },
		{ symbol: 'd2', value: least, unit: 'mm', from: `${edge}, other edge` }
	];
	return { title, formula: 'α = d1/(d1 − d2)', inputs, value: alpha };
}

type Elastic = NonNullable<JudgedElement['elastic']>;

/** Only the ratio of the stresses counts, so that they stand at any scale. */
function psiPiece({ most, least }: Elastic, psi: number): Piece {
	const inputs = [
		{ symbol: 'σ1', value: most, unit: '', from: 'elastic stress, more compressed edge' },
		{ symbol: 'σ2', value: least, unit: '', from: 'elastic stress, other edge' }
	];
	return {
		title: 'Stress ratio ψ',
		formula: `ψ = max(σ2/σ1, −${-leastPsi})`,
		inputs,
		value: psi
	};
}

const bucklingPiece = (psi: WorkingInput, end: Elastic['end'], value: number): Piece => ({
	title: 'Buckling factor kσ',
	clause: 'EN 1993-1-5 Table 4.2',
	formula: `kσ = ${bucklingFormula(psi.value, end)}`,
	inputs: [psi],
	value
});
