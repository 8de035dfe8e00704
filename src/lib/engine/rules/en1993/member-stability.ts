import type { Note } from '../../result';
import type { PreparedSection } from '../../section/prepared';
import type { Demand } from '../result';
import type { EnModel } from './model';

const lateral: Note = {
	code: 'ltb-not-checked',
	message:
		'Lateral–torsional buckling is not checked: moment resistances are of the cross-section.',
	clause: 'EN 1993-1-1:2005 6.3.2'
};

const flexural: Note = {
	code: 'member-buckling-not-checked',
	message: 'Buckling of the member under compression is not checked.',
	clause: 'EN 1993-1-1:2005 6.3.1'
};

/**
 * Whether bending can let the member buckle sideways: an open section in bending about y, a tube or
 * box in bending about its stronger axis. Round and square tubes cannot (6.3.2.1(2)).
 */
export function canBuckleSideways({ definition, gross }: PreparedSection, demand: Demand): boolean {
	const { My = 0, Mz = 0 } = demand;
	const { secondMomentY, secondMomentZ } = gross;
	if (definition.kind === 'circular-hollow') return false;
	const closed = definition.kind === 'rectangular-hollow' || definition.kind === 'box';
	if (!closed && My !== 0) return true;
	const even = Math.abs(secondMomentY - secondMomentZ) <= 1e-9 * secondMomentY;
	if (even) return false;
	return secondMomentY > secondMomentZ ? My !== 0 : Mz !== 0;
}

/** Stability checks that a demand calls for by naming an unbraced length; none is built yet. */
export function stabilityGaps({ section }: EnModel, demand: Demand, name: string): Note[] {
	const { unbracedLength = 0, N = 0 } = demand;
	if (unbracedLength <= 0) return [];
	const gaps: Note[] = [];
	if (canBuckleSideways(section, demand))
		gaps.push({ ...lateral, message: missing('Lateral–torsional buckling', name) });
	if (N < 0) gaps.push({ ...flexural, message: missing('Member buckling', name) });
	return gaps;
}

const missing = (what: string, name: string) =>
	`${what} applies to ${name}, which gives an unbraced length. It is not built yet.`;

/** Whether a demand has neither N nor a moment: it is then answered with the moment +My. */
export const isUnbent = ({ N = 0, My = 0, Mz = 0 }: Demand): boolean =>
	N === 0 && My === 0 && Mz === 0;

/** What is not checked for the member whatever the figures say; without an effect, for bending. */
export function stabilityNotes(section: PreparedSection, demands: readonly Demand[]): Note[] {
	const bent = { My: 1, Mz: 0 };
	const asked = demands.length === 0 ? [bent] : demands.map((one) => (isUnbent(one) ? bent : one));
	const notes: Note[] = [];
	if (asked.some((demand) => canBuckleSideways(section, demand))) notes.push(lateral);
	if (demands.some(({ N = 0 }) => N < 0)) notes.push(flexural);
	return notes;
}
