import type { Note } from '../../result';
import type { Demand, Resistance } from '../result';
import { lawNotes } from './law-cover';
import type { EnModel, PureCases, PureClasses } from './model';

const caseWords: Readonly<Record<keyof PureClasses, string>> = {
	plusMy: 'bending with the bottom in tension',
	minusMy: 'bending with the top in tension',
	plusMz: 'bending with the right in tension',
	minusMz: 'bending with the left in tension',
	compression: 'pure compression'
};

/** Which pure cases are class 4, for which effective widths would be needed. */
export function classFourNotes(classes: PureClasses): Note[] {
	const slender = (Object.keys(caseWords) as (keyof PureClasses)[]).filter(
		(name) => classes[name] === 4
	);
	if (slender.length === 0) return [];
	const list = slender.map((name) => caseWords[name]).join(', ');
	return [
		{
			code: 'class-4-not-built',
			message: `The section is class 4 in ${list}. Effective widths are not built yet, so it has no resistance there.`,
			clause: 'EN 1993-1-5 4.4'
		}
	];
}

/** How class 3 and hybrid figures were taken. */
export function strengthNotes(
	model: EnModel,
	cases: PureCases,
	{ basis, webRefused }: { basis: Resistance['basis']; webRefused: boolean }
): Note[] {
	const notes: Note[] = lawNotes(model.section.parts, model.code.standard);
	const bent = [cases.plusMy, cases.minusMy, cases.plusMz, cases.minusMz];
	if (basis === 'effective-class-2')
		notes.push({
			code: 'effective-class-2',
			message:
				'The class 3 web is taken as an effective class 2 web: only 20 εtw beside the compression flange and beside the plastic neutral axis is counted of its compressed part.',
			clause: 'EN 1993-1-1:2005 6.2.2.4'
		});
	if (webRefused) notes.push(webNotTaken(model));
	if (model.strengths.hybrid && bent.some(({ overall }) => overall === 3))
		notes.push({
			code: 'hybrid-first-yield',
			message:
				'Parts of different strength: class 3 moments end where the first fibre of any part yields, which is on the safe side.',
			clause: 'EN 1993-1-5 4.3(6)'
		});
	if (model.strengths.hybrid)
		notes.push({
			code: 'axial-at-centroid',
			message:
				'N acts at the gross centroid. Where parts of different strength do not balance about it, or the section is class 3, axial resistances take the weakest strength.',
			clause: 'EN 1993-1-1:2005 6.2.4'
		});
	return notes;
}

function webNotTaken({ section: { definition } }: EnModel): Note {
	const why =
		definition.kind === 'rectangular-hollow'
			? 'that is not built for rectangular hollow sections'
			: 'the plastic neutral axis of that section would not lie in the clear web';
	return {
		code: 'effective-class-2-not-used',
		message: `The class 3 web is not taken as an effective class 2 web: ${why}. First yield counts, which is on the safe side.`,
		clause: 'EN 1993-1-1:2005 6.2.2.4'
	};
}

/** Several effects together are checked by the linear sum only. */
export function interactionNotes(demands: readonly Demand[]): Note[] {
	const together = demands.some(
		({ N, My, Mz }) => [N, My, Mz].filter((effect) => (effect ?? 0) !== 0).length > 1
	);
	if (!together) return [];
	return [
		{
			code: 'linear-sum-only',
			message:
				'Axial force and moments that act together are checked by the linear sum only, which is on the safe side.',
			clause: 'EN 1993-1-1:2005 6.2.1(7)'
		}
	];
}
