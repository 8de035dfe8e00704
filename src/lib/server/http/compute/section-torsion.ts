import { inputHash } from '../../../engine/section/canonical';
import type { PreparedSection } from '../../../engine/section/prepared';
import {
	numericalTorsion,
	type NumericalTorsionOutcome
} from '../../../engine/section/torsion/numerical';
import {
	handbookTorsion,
	withNumericalTorsion,
	type SectionWithTorsion
} from '../../../engine/section/torsion/with-numerical';

/** Solutions kept: each is a few hundred bytes and costs tens of milliseconds to find again. */
const kept = 500;
const solutions = new Map<string, NumericalTorsionOutcome>();

/** The numerical solution, from the last ones asked for where it is among them. */
function solutionOf(section: PreparedSection): NumericalTorsionOutcome {
	const key = inputHash(section.definition);
	const solution = solutions.get(key) ?? numericalTorsion(section);
	// the newest stand last
	solutions.delete(key);
	solutions.set(key, solution);
	const oldest = solutions.keys().next();
	if (solutions.size > kept && !oldest.done) solutions.delete(oldest.value);
	return solution;
}

/** Free plates and outlines have no handbook: they are always solved, others when that is asked. */
export function sectionWithTorsion(section: PreparedSection, asked: boolean): SectionWithTorsion {
	const { kind } = section.definition;
	if (asked || kind === 'outline' || kind === 'plates')
		return withNumericalTorsion(section, solutionOf(section));
	return { ...section, torsion: { handbook: handbookTorsion(section), numerical: null } };
}
