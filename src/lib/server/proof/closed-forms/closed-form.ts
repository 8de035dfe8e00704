import { proofCheck, type ProofCheck, type ProofSource } from '../check';

/** A value known exactly, and the engine's own by its usual way, which knows nothing of the formula. */
export interface ClosedForm {
	readonly id: string;
	/** What it is of: shape factors, N and M, torsion … */
	readonly topic: string;
	readonly case: string;
	readonly quantity: string;
	readonly unit?: string;
	/** The formula, or the text that has it. */
	readonly formula: string;
	readonly value: number;
	readonly ours: () => number | null;
	/** Share of the value. */
	readonly tolerance: number;
	readonly why: string;
}

/** Why a closed form and the exact integration differ at all. */
export const rounding = 'both are exact: binary rounding only';

const sourceOf = ({ topic, formula }: ClosedForm): ProofSource => ({
	family: 'closed-form',
	source: `${topic}: ${formula}`,
	standard: 'Closed form',
	clause: null,
	fromMemory: false,
	memoryConfidence: null
});

export const closedFormCheck = (form: ClosedForm): ProofCheck =>
	proofCheck(sourceOf(form), {
		id: `closed-form/${form.id}`,
		case: form.case,
		quantity: form.quantity,
		unit: form.unit ?? '',
		published: form.value,
		printed: String(Number(form.value.toPrecision(6))),
		ours: form.ours(),
		tolerance: { kind: 'relative', value: form.tolerance, why: form.why }
	});

/** The value farthest from 1, for a relation that must give 1 all along a curve. */
export const farthestFromOne = (values: readonly number[]): number =>
	values.reduce((worst, value) => (Math.abs(value - 1) > Math.abs(worst - 1) ? value : worst), 1);
