import type { Note } from '../../result';
import type { PreparedSection } from '../../section/prepared';
import type { Demand, Standard } from '../result';
import { clauseOf } from './edition';
import type { LateralOutcome } from './lateral-torsional';
import type { EnModel } from './model';

const lateral = (standard: Standard): Note => ({
	code: 'ltb-not-checked',
	message:
		'Lateral–torsional buckling is not checked: moment resistances are of the cross-section.',
	clause: clauseOf(standard, 'lateralTorsional')
});

const flexural = (standard: Standard): Note => ({
	code: 'member-buckling-not-checked',
	message: 'Buckling of the member under compression is not checked.',
	clause: clauseOf(standard, 'flexuralBuckling')
});

/**
 * Whether bending can let the member buckle sideways: round and square bars and tubes never; bars, tubes
 * and boxes in bending about their stronger axis (6.3.2.1(2)); angles and free plates in any bending;
 * other open sections in bending about y, and about z where that is the stronger axis.
 */
export function canBuckleSideways({ definition, gross }: PreparedSection, demand: Demand): boolean {
	const { My = 0, Mz = 0 } = demand;
	const { secondMomentY, secondMomentZ } = gross;
	const stiffer = secondMomentY - secondMomentZ;
	const even = Math.abs(stiffer) <= 1e-9 * secondMomentY;
	const aboutStronger = !even && (stiffer > 0 ? My !== 0 : Mz !== 0);
	switch (definition.kind) {
		case 'circular-hollow':
		case 'round':
			return false;
		case 'rectangular-hollow':
		case 'box':
		case 'flat':
			return aboutStronger;
		case 'angle':
		case 'plates':
		case 'outline':
			return My !== 0 || Mz !== 0;
		case 'i':
		case 'channel':
		case 'tee':
			return My !== 0 || aboutStronger;
	}
}

/**
 * Stability checks that a demand calls for by naming an unbraced length and that are not made: lateral–torsional
 * buckling without a figure, or beside a moment about the other axis (6.3.3), and member buckling
 * under compression.
 */
export function stabilityGaps(
	{ section, code: { standard } }: EnModel,
	demand: Demand,
	name: string,
	outcome: LateralOutcome | null = null
): Note[] {
	const { unbracedLength = 0, N = 0, My = 0, Mz = 0 } = demand;
	if (unbracedLength <= 0) return [];
	const gaps: Note[] = [];
	if (canBuckleSideways(section, demand)) {
		const what = 'Lateral–torsional buckling';
		if (!outcome?.value) gaps.push({ ...lateral(standard), message: missing(what, name) });
		else if (My !== 0 && Mz !== 0)
			gaps.push({
				...lateral(standard),
				message: missing(`${what} with bending about both axes`, name)
			});
	}
	if (N < 0) gaps.push({ ...flexural(standard), message: missing('Member buckling', name) });
	return gaps;
}

const missing = (what: string, name: string) =>
	`${what} applies to ${name}, which gives an unbraced length. It is not checked.`;

/** Whether a demand has neither N nor a moment: it is then answered with the moment +My. */
export const isUnbent = ({ N = 0, My = 0, Mz = 0 }: Demand): boolean =>
	N === 0 && My === 0 && Mz === 0;

/**
 * What is not checked for the member whatever the figures say; without an effect, for bending. A demand
 * whose lateral–torsional buckling `isChecked` needs no word of it.
 */
export function stabilityNotes(
	{ section, code: { standard } }: Pick<EnModel, 'section' | 'code'>,
	demands: readonly Demand[],
	isChecked: (demand: Demand) => boolean = () => false
): Note[] {
	const bent = { My: 1, Mz: 0 };
	const asked = demands.length === 0 ? [bent] : demands.map((one) => (isUnbent(one) ? bent : one));
	const notes: Note[] = [];
	if (asked.some((demand) => canBuckleSideways(section, demand) && !isChecked(demand)))
		notes.push(lateral(standard));
	if (demands.some(({ N = 0 }) => N < 0)) notes.push(flexural(standard));
	return notes;
}
