import { fail, ok, type Result } from '../result';
import { schemaVersion } from '../version';
import type { SectionDefinition } from './definition';

/** A definition as it was stored, with the version of its form. */
export interface StoredDefinition {
	readonly schemaVersion: number;
	readonly definition: unknown;
}

type Stored = Readonly<Record<string, unknown>>;

/** What turns a stored definition of version n into version n + 1; index 0 goes from 1 to 2. */
const steps: readonly ((stored: Stored) => Stored)[] = [];

/**
 * A stored definition in today's form. Fails with a sentence when it comes from a newer program or
 * is no definition at all; sizes are checked by `prepareSection`, not here.
 */
export function migratedDefinition(stored: StoredDefinition): Result<SectionDefinition, string> {
	const { schemaVersion: version, definition } = stored;
	if (!Number.isInteger(version) || version < 1)
		return fail(`The stored section has no valid version (${String(version)}).`);
	if (version > schemaVersion)
		return fail(
			`The section was stored by a newer program (version ${version}; this one knows ${schemaVersion}).`
		);
	if (!isStored(definition)) return fail('The stored section is not a section definition.');
	const today = steps.slice(version - 1).reduce((form, step) => step(form), definition);
	return ok(today as unknown as SectionDefinition);
}

const isStored = (value: unknown): value is Stored =>
	typeof value === 'object' && value !== null && typeof (value as Stored).kind === 'string';
