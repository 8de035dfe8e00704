import type { GradeDefinition } from '../../../engine/material/material';
import type { Note } from '../../../engine/result';
import type { SectionDefinition } from '../../../engine/section/definition';

const isUnbuilt = (grade: GradeDefinition | undefined) =>
	typeof grade === 'object' && grade.law?.type === 'ramberg-osgood';

const plain = <G extends GradeDefinition | undefined>(grade: G): G =>
	isUnbuilt(grade) ? ({ ...(grade as object), law: undefined } as G) : grade;

/** Every grade of a definition, the whole section's first. */
const gradesOf = (definition: SectionDefinition): (GradeDefinition | undefined)[] => [
	definition.grade,
	...Object.values(definition.partGrades ?? {}),
	...(definition.kind === 'plates' ? definition.plates.map(({ grade }) => grade) : []),
	...(definition.kind === 'outline' ? (definition.regions ?? []).map(({ grade }) => grade) : [])
];

const plainSteel = ({ grade, partGrades }: SectionDefinition) => ({
	grade: plain(grade),
	...(partGrades && {
		partGrades: Object.fromEntries(
			Object.entries(partGrades).map(([part, one]) => [part, plain(one)])
		)
	})
});

const plainPieces = <P extends { grade?: GradeDefinition }>(pieces: readonly P[]) =>
	pieces.map((piece) => (isUnbuilt(piece.grade) ? { ...piece, grade: plain(piece.grade) } : piece));

/** Whether any part asks for the Ramberg–Osgood law, which is not built yet. */
export const hasUnbuiltLaw = (definition: SectionDefinition) =>
	gradesOf(definition).some(isUnbuilt);

/**
 * The same section with the default law where the law asked for is not built: good for its
 * geometry and its checks of input, not for any figure of strength.
 */
export const withoutUnbuiltLaws = (definition: SectionDefinition): SectionDefinition => {
	const steel = { ...definition, ...plainSteel(definition) };
	if (steel.kind === 'plates') return { ...steel, plates: plainPieces(steel.plates) };
	if (steel.kind === 'outline' && steel.regions)
		return { ...steel, regions: plainPieces(steel.regions) };
	return steel;
};

/** Why the figures of strength are absent. */
export const unbuiltLawNote: Note = {
	code: 'law_not_built',
	message:
		'The Ramberg–Osgood law is not built yet: figures of strength are left out. Give the law as a curve instead.'
};
