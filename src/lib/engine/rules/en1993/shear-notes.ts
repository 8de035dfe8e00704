import type { Note } from '../../result';
import { clauseOf } from './edition';
import type { EnModel } from './model';
import type { ShearArea, ShearAreas, ShearPanel } from './shear-area';

/** A plate too slender for its shear resistance to be given. */
export function outsideNote(
	{ code }: EnModel,
	{ part, depth, thickness, support }: ShearPanel,
	limit: number,
	axis: 'y' | 'z'
): Note {
	const why =
		support === 'tube'
			? 'EN 1993-1-5 gives no rule for the walls of rectangular hollow sections beyond 72ε/η'
			: 'a plate with a free edge is given a resistance only where it is sure not to buckle';
	return {
		code: 'shear-buckling-not-built',
		message: `Shear buckling of the part “${part}” is outside the rules: its depth over thickness ${(depth / thickness).toFixed(1)} is over ${limit.toFixed(1)}, and ${why}. V${axis} has no resistance.`,
		clause: `${clauseOf(code.standard, 'shear')}(6)`
	};
}

/** What stands behind a check of shear buckling. */
export function bucklingNotes({ stiffeners }: EnModel, { plate }: ShearArea): Note[] {
	const between =
		stiffeners === null
			? 'none between them, and end posts that are not rigid'
			: `rigid ones every ${stiffeners.spacing} mm between them, and ${stiffeners.endPost} end posts`;
	return [
		{
			code: 'shear-buckling-assumptions',
			message: `Shear buckling of the ${plate} is checked with rigid transverse stiffeners at the supports, ${between}. Longitudinal stiffeners are not covered; the stiffeners themselves are not checked.`,
			clause: 'EN 1993-1-5 5.1'
		}
	];
}

const shapeWords = {
	angle:
		'The code names no shear area for angles: one leg alone is counted by the rule for the stem of a welded tee (common practice, no source).',
	flat: 'The code names no shear area for solid bars: the whole area is counted, as in ENV 1993-1-1:1992 5.4.6(2)(h), from memory.',
	round:
		'The code names no shear area for solid bars: the whole area is counted, as in ENV 1993-1-1:1992 5.4.6(2)(h), from memory.',
	plates:
		'The code names no shear area for free plates: only plates whose width runs along the force are counted, as in ENV 1993-1-1:1992 5.4.6(2)(h), from memory.'
} as const;

/** Shapes whose shear area is not the code's own, and axes that have none. */
export function areaNotes({ section: { definition }, code }: EnModel, areas: ShearAreas): Note[] {
	const clause = `${clauseOf(code.standard, 'shear')}(3)`;
	const notes: Note[] = [];
	if (definition.kind in shapeWords) {
		const message = shapeWords[definition.kind as keyof typeof shapeWords];
		notes.push({ code: 'shear-area-from-practice', message, clause });
	}
	if (definition.kind === 'channel' && (definition.flangeSlopePercent ?? 0) > 0)
		notes.push({
			code: 'tapered-flange-shear',
			message: 'The shear area takes the tapered flanges at their mean thickness tf.',
			clause
		});
	for (const axis of ['y', 'z'] as const)
		if (areas[axis] === null)
			notes.push({
				code: 'shear-area-unknown',
				message: `No plate runs along ${axis}, so V${axis} has no resistance.`,
				clause
			});
	return notes;
}
