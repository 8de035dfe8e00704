import type { EffectiveProperties, EffectiveSection } from './en1993/effective/effective-section';

/** The contract's name for a basis of an effective section. */
export type EffectiveName = '+My' | '−My' | 'Mz' | 'N';

/** The contract's `effective`, with every other case that is class 4 under `byCase`. */
export interface EffectiveAnswer extends EffectiveProperties {
	readonly basis: EffectiveName;
	readonly converged: EffectiveProperties;
	readonly byCase: Readonly<Partial<Record<EffectiveSection['basis'], EffectiveSection>>>;
}

/**
 * The effective section of the standing case with all others; null where nothing is class 4. Without a
 * section of its own the standing case takes the first of them.
 */
export function effectiveAnswer(
	found: readonly EffectiveSection[],
	standing: EffectiveSection | null
): EffectiveAnswer | null {
	const own = standing ?? found[0];
	if (!own) return null;
	const byCase = Object.fromEntries(found.map((section) => [section.basis, section]));
	const { notes: _notes, ...figures } = own;
	const basis = own.basis === '+Mz' || own.basis === '−Mz' ? 'Mz' : own.basis;
	return { ...figures, basis, byCase };
}
