import type { Note } from '../../result';
import { clauseOf, editionNotes, isLater, memoryNote } from './edition';
import type { EnModel } from './model';
import type { Effects } from './stress-case';

/** How classes were found: the edition, rules from memory, N in α, and what a kind's rows ask for. */
export function classNotes(model: EnModel, demands: readonly Effects[]): Note[] {
	return [
		...editionNotes(model.code.standard),
		...memoryNotes(model),
		...alphaNotes(model, demands),
		...kindNotes(model)
	];
}

function memoryNotes({ code: { standard }, elements }: EnModel): Note[] {
	if (!isLater(standard)) return [];
	if (elements.kind === 'tube')
		return [
			memoryNote(
				'The class 3 limit of round tubes, 2520ε²/(5ψ + 23) and 140ε² in bending,',
				clauseOf(standard, 'tubular')
			)
		];
	if (elements.kind === 'solid') return [];
	const outstand = memoryNote(
		'That the limits of outstands are those of the 2005 edition',
		clauseOf(standard, 'outstand')
	);
	const angle = memoryNote(
		'That the row for angles in compression is that of the 2005 edition',
		clauseOf(standard, 'angle')
	);
	const hasOutstands = elements.plates.some(({ type }) => type === 'outstand');
	return [...(hasOutstands ? [outstand] : []), ...(elements.angle ? [angle] : [])];
}

/** Which of both conventions N enters the plastic block by. */
function alphaNotes({ code, elements }: EnModel, demands: readonly Effects[]): Note[] {
	const together = demands.some(({ N, My, Mz }) => N !== 0 && (My !== 0 || Mz !== 0));
	if (!together || elements.kind !== 'plates') return [];
	const message =
		code.classAlpha === 'actual-N'
			? 'α of the plastic block is taken for the demanded N with the moment filling the rest of the section.'
			: 'α of the plastic block is taken for N and moment grown in proportion until the section is full.';
	return [{ code: 'class-alpha', message, clause: clauseOf(code.standard, 'internal') }];
}

function kindNotes({ section: { definition }, elements, code: { standard } }: EnModel): Note[] {
	switch (definition.kind) {
		case 'channel':
			if (!definition.flangeSlopePercent) return [];
			return [
				{
					code: 'tapered-flange-mean',
					message:
						'The tapered flanges are classified by the thickness given for them, that of their middle.',
					clause: clauseOf(standard, 'outstand')
				}
			];
		case 'angle':
			return [
				{
					code: 'angle-alone',
					message:
						'The angle is taken as standing alone: its row in compression is not for angles in continuous contact with other parts.',
					clause: clauseOf(standard, 'angle')
				}
			];
		case 'flat':
		case 'round':
			return elements.kind === 'solid' ? [solidNote(definition.kind, standard)] : [];
		default:
			return [];
	}
}

function solidNote(kind: 'flat' | 'round', standard: EnModel['code']['standard']): Note {
	const why =
		kind === 'round'
			? 'it has no plate that could buckle locally'
			: 'its width is within 18ε times its thickness, so that each half is a class 1 outstand under any stress';
	return {
		code: 'solid-class-1',
		message: `The table has no row for a solid bar. This one is taken as class 1: ${why}.`,
		clause: clauseOf(standard, 'classification')
	};
}
