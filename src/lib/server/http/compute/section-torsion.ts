import { inputHash } from '../../../engine/section/canonical';
import type { PreparedSection } from '../../../engine/section/prepared';
import { ok, type Note, type Result } from '../../../engine/result';
import {
	torsionSolving,
	type NumericalTorsionOutcome
} from '../../../engine/section/torsion/numerical';
import {
	handbookTorsion,
	withNumericalTorsion,
	type SectionWithTorsion
} from '../../../engine/section/torsion/with-numerical';
import type { Refusal } from '../refusal';
import { searchInTurns } from './search-in-turns';

/** Solutions kept: each is a few hundred bytes and costs tens of milliseconds to find again. */
const kept = 500;
const solutions = new Map<string, NumericalTorsionOutcome>();

/** Longest work on one solution, ms: several times what any outline within the limits takes. */
const mostWork = 3000;

const tookTooLong: Note = {
	code: 'torsion-took-too-long',
	message: `The numerical torsion solution took more than ${mostWork / 1000} s and was given up: no torsion figures from it.`
};

/** The numerical solution, from the last ones asked for where it is among them; in turns with other requests. */
async function solutionOf(
	section: PreparedSection,
	signal: AbortSignal | undefined
): Promise<Result<NumericalTorsionOutcome, Refusal>> {
	const key = inputHash(section.definition);
	const known = solutions.get(key);
	const solved = known ? ok(known) : await searchInTurns(torsionSolving(section), signal, mostWork);
	if (!solved.ok)
		return solved.error.code === 'too_much_work' ? ok({ notes: [tookTooLong] }) : solved;
	keep(key, solved.value);
	return solved;
}

function keep(key: string, solution: NumericalTorsionOutcome): void {
	// the newest stand last
	solutions.delete(key);
	solutions.set(key, solution);
	const oldest = solutions.keys().next();
	if (solutions.size > kept && !oldest.done) solutions.delete(oldest.value);
}

/**
 * Free plates and outlines have no handbook: they are always solved, others when that is asked. Fails
 * only when the caller has gone.
 */
export async function sectionWithTorsion(
	section: PreparedSection,
	asked: boolean,
	signal?: AbortSignal
): Promise<Result<SectionWithTorsion, Refusal>> {
	const { kind } = section.definition;
	if (!asked && kind !== 'outline' && kind !== 'plates')
		return ok({ ...section, torsion: { handbook: handbookTorsion(section), numerical: null } });
	const solution = await solutionOf(section, signal);
	return solution.ok ? ok(withNumericalTorsion(section, solution.value)) : solution;
}
