import type { Issue, Note } from '../result';
import type { SectionDefinition } from './definition';
import { hasPart, unknownPart } from './part-materials';
import type { Shape } from './shape';
import { needed, sizeIssues } from './sizes';

/** What is wrong with the bolt holes: unknown part, size, count. */
export function boltHoleIssues({ boltHoles = [] }: SectionDefinition, shape: Shape): Issue[] {
	return boltHoles.flatMap(({ part, diameter, count }, i): Issue[] => {
		const path = `boltHoles.${i}`;
		const issues = sizeIssues([needed(`${path}.diameter`, 'Bolt hole diameter', diameter)]);
		if (!hasPart(shape, part))
			issues.push({ path: `${path}.part`, message: unknownPart(shape, part) });
		if (!Number.isInteger(count) || count < 1)
			issues.push({
				path: `${path}.count`,
				message: 'Number of bolt holes must be a whole number of 1 or more.'
			});
		return issues;
	});
}

/** Holes are kept with the section; no figure takes them off yet. */
export function boltHoleNotes({ boltHoles = [] }: SectionDefinition): Note[] {
	if (boltHoles.length === 0) return [];
	const message =
		'Bolt holes are not deducted: areas, moduli and strengths are of the gross section.';
	return [{ code: 'bolt-holes-not-deducted', message }];
}
