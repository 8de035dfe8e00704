import type { Note } from '../../result';
import type { AxisSense } from '../section-moments';
import type { BendingResistance } from './bending-resistance';
import { clauseOf } from './edition';
import type { JudgedDemand } from './judged-demand';
import { lawNotes } from './law-cover';
import type { EnModel, PureCases } from './model';

type Bent = Readonly<Record<AxisSense, BendingResistance>>;

/** How class 3, class 4 and hybrid figures were taken. */
export function strengthNotes(
	model: EnModel,
	cases: PureCases,
	bent: Bent,
	judged: readonly JudgedDemand[]
): Note[] {
	const { standard } = model.code;
	const notes: Note[] = lawNotes(model.section.parts, standard);
	const bases = [
		...Object.values(bent).map(({ basis, value }) => (value === null ? null : basis)),
		...judged.map(({ state }) => state.countableBasis)
	];
	if (bases.includes('effective-class-2'))
		notes.push({
			code: 'effective-class-2',
			message:
				'The class 3 web is taken as an effective class 2 web: only 20 εtw beside the compression flange and beside the plastic neutral axis is counted of its compressed part.',
			clause: clauseOf(standard, 'effectiveClassTwo')
		});
	if (bases.includes('interpolated'))
		notes.push({
			code: 'interpolated-modulus',
			message:
				'A class 3 moment is interpolated between the elastic and the plastic modulus by the slenderness of its parts (Annex B, from memory). It is given in place of the effective class 2 section, even where that would be more.',
			clause: clauseOf(standard, 'interpolated')
		});
	if (Object.values(bent).some(({ effective }) => effective !== null))
		notes.push({
			code: 'effective-section',
			message:
				'Class 4: the moment is of the effective section found in one pass (flange from the gross section, then the web), as the code’s examples do; the converged section is given beside it. Longitudinal stiffeners are not covered.',
			clause: 'EN 1993-1-5 4.4(3)'
		});
	if (model.elements.kind === 'tube' && Object.values(cases).some(({ overall }) => overall === 4))
		notes.push({
			code: 'class-4-not-built',
			message:
				'The round tube is class 4 in some case: it is a shell for EN 1993-1-6, which is not built, so it has no resistance there.',
			clause: 'EN 1993-1-6'
		});
	if (bent.plusMy.webRefused || bent.minusMy.webRefused) notes.push(webNotTaken(model));
	return [...notes, ...hybridNotes(model, cases)];
}

function webNotTaken({ code }: EnModel): Note {
	return {
		code: 'effective-class-2-not-used',
		message:
			'The class 3 web is not taken as an effective class 2 web: the plastic neutral axis of that section would not lie in the clear web. First yield counts, which is on the safe side.',
		clause: clauseOf(code.standard, 'effectiveClassTwo')
	};
}

function hybridNotes({ strengths, code }: EnModel, cases: PureCases): Note[] {
	if (!strengths.hybrid) return [];
	const bent = [cases.plusMy, cases.minusMy, cases.plusMz, cases.minusMz];
	const notes: Note[] = [];
	if (bent.some(({ overall }) => overall === 3))
		notes.push({
			code: 'hybrid-first-yield',
			message:
				'Parts of different strength: class 3 moments end where the first fibre of any part yields, which is on the safe side.',
			clause: 'EN 1993-1-5 4.3(6)'
		});
	notes.push({
		code: 'axial-at-centroid',
		message:
			'N acts at the gross centroid. Where parts of different strength do not balance about it, or the section is class 3 or 4, axial resistances take the weakest strength.',
		clause: clauseOf(code.standard, 'compression')
	});
	return notes;
}
