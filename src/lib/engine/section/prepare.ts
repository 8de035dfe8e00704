import { loopBounds, loopLength } from '../geometry/bounds';
import type { Loop } from '../geometry/boundary';
import { regionMoments } from '../geometry/moments';
import { edgeStart } from '../geometry/bounds';
import type { StrengthBasis } from '../material/material';
import { fail, ok, type Issue, type Note, type Result } from '../result';
import { boltHoleIssues, boltHoleNotes } from './bolt-holes';
import type { SectionDefinition } from './definition';
import { grossProperties } from './gross';
import { partsOf, partGradeIssues } from './part-materials';
import type { PreparedSection } from './prepared';
import type { Shape } from './shape';
import { materialNotes } from './transformed';
import { shapeOf } from './shape-of';

/**
 * Checks a definition and turns it into steel, once; everything else takes the result. Parts carry
 * exact regions (straight edges and true arcs) from the definition's origin, mm, and their
 * materials. `gross.perimeter` is the painted surface: outer contours only, insides of tubes and
 * boxes left out. Fails with every issue found, each naming its field and limit.
 */
export function prepareSection(
	definition: SectionDefinition,
	basis: StrengthBasis = 'product-standard'
): Result<PreparedSection, Issue[]> {
	const shape = shapeOf(definition);
	if (!shape.ok) return shape;
	const issues = [
		...partGradeIssues(definition, shape.value),
		...boltHoleIssues(definition, shape.value)
	];
	const parts = partsOf(definition, shape.value, basis);
	if (!parts.ok) return fail([...issues, ...parts.error]);
	if (issues.length > 0) return fail(issues);
	const { contours, torsion } = shape.value;
	return ok({
		definition,
		strengthBasis: basis,
		parts: parts.value,
		contours,
		bounds: loopBounds(contours),
		gross: grossProperties(parts.value, { ...torsion, perimeter: outerLength(contours) }),
		notes: [
			...shape.value.notes,
			...torsionNotes(shape.value),
			...boltHoleNotes(definition),
			...materialNotes(parts.value)
		]
	});
}

/** Length of the outer contours, mm: those that run anticlockwise. */
function outerLength(contours: readonly Loop[]): number {
	const outer = contours.filter((loop) => {
		const first = loop[0];
		return first && regionMoments({ loops: [loop] }, edgeStart(first)).area > 0;
	});
	return outer.reduce((sum, loop) => sum + loopLength(loop), 0);
}

function torsionNotes({ torsion }: Shape): Note[] {
	const missing = [
		torsion.torsionConstant === null ? 'torsion constant' : '',
		torsion.warpingConstant === null ? 'warping constant' : '',
		torsion.shearCentre === null ? 'shear centre' : ''
	].filter((name) => name !== '');
	if (missing.length === 0) return [];
	const message = `No published formula covers this shape: ${missing.join(', ')} not given.`;
	return [{ code: 'torsion-not-covered', message }];
}
