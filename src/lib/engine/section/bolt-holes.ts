import { loopBounds } from '../geometry/bounds';
import { regionMoments } from '../geometry/moments';
import type { Issue, Note } from '../result';
import type { SectionDefinition } from './definition';
import { hasPart, unknownPart } from './part-materials';
import type { Shape, ShapePart } from './shape';
import { millimetres, needed, sizeIssues } from './sizes';

/** What is wrong with the bolt holes: unknown part, size, count, more than their part is wide. */
export function boltHoleIssues(definition: SectionDefinition, shape: Shape): Issue[] {
	const { boltHoles = [] } = definition;
	const issues = boltHoles.flatMap(({ part, diameter, count }, i): Issue[] => {
		const path = `boltHoles.${i}`;
		const found = sizeIssues([needed(`${path}.diameter`, 'Bolt hole diameter', diameter)]);
		if (!hasPart(shape, part))
			found.push({ path: `${path}.part`, message: unknownPart(shape, part) });
		if (!Number.isInteger(count) || count < 1)
			found.push({
				path: `${path}.count`,
				message: 'Number of bolt holes must be a whole number of 1 or more.'
			});
		return found;
	});
	return issues.length > 0 ? issues : widthIssues(definition, shape);
}

function widthIssues({ kind, boltHoles = [] }: SectionDefinition, { parts }: Shape): Issue[] {
	return parts.flatMap((shapePart): Issue[] => {
		const holes = boltHoles.filter(({ part }) => part === shapePart.name);
		const taken = holes.reduce((sum, { diameter, count }) => sum + diameter * count, 0);
		if (taken === 0) return [];
		const width = partWidth(shapePart, kind === 'plates');
		if (taken < width) return [];
		const first = boltHoles.findIndex(({ part }) => part === shapePart.name);
		const message = `Bolt holes in ${shapePart.name} take ${millimetres(taken)}, and must leave some of its width ${millimetres(width)}.`;
		return [{ path: `boltHoles.${first}.diameter`, message }];
	});
}

/** mm: the longer side of a part; of a plate at any angle and of a tube's wall, area over thickness. */
function partWidth({ region, thickness }: ShapePart, turned: boolean): number {
	if (turned || region.loops.length > 1) return Math.abs(regionMoments(region).area) / thickness;
	const { left, right, bottom, top } = loopBounds(region.loops);
	return Math.max(right - left, top - bottom);
}

/** Holes are kept with the section; only resistances take them off. */
export function boltHoleNotes({ boltHoles = [] }: SectionDefinition): Note[] {
	if (boltHoles.length === 0) return [];
	const message =
		'Bolt holes are not deducted from areas, moduli, first yield and the full plastic moment: those are of the gross section.';
	return [{ code: 'bolt-holes-not-deducted', message }];
}
