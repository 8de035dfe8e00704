import type { Edge } from '../../geometry/boundary';
import { fail, ok, type Note, type Result } from '../../result';
import type { PreparedSection } from '../../section/prepared';
import type { LinearField } from '../../response/history/linear-field';
import { rolledPattern } from './rolled';
import { weldedPattern } from './welded';

export type ResidualPattern = 'none' | 'rolled' | 'welded';

/** A piece of one part with a residual stress that is linear over it, N/mm², from the gross centroid. */
export interface StressedPiece {
	readonly part: number;
	readonly edges: readonly Edge[];
	readonly stress: LinearField;
}

/**
 * Residual stresses at rest, in equilibrium plate by plate. They are self-balanced, so that they change
 * first yield and the path but never the full plastic resistance. Fails with a note where no published
 * pattern covers the section.
 */
export function residualPattern(
	section: PreparedSection,
	pattern: Exclude<ResidualPattern, 'none'>
): Result<readonly StressedPiece[], Note> {
	const pieces = piecesOf(section, pattern);
	return typeof pieces === 'string' ? fail(notCovered(pieces)) : ok(pieces);
}

/** Why no published pattern covers the section, in a sentence; null when one does. */
export function residualGap(
	section: PreparedSection,
	pattern: Exclude<ResidualPattern, 'none'>
): string | null {
	const pieces = piecesOf(section, pattern);
	return typeof pieces === 'string' ? pieces : null;
}

function piecesOf(section: PreparedSection, pattern: Exclude<ResidualPattern, 'none'>) {
	const pieces = pattern === 'rolled' ? rolledPattern(section) : weldedPattern(section);
	return typeof pieces === 'string' || isBearable(section, pieces) ? pieces : tooWeak;
}

const notCovered = (why: string): Note => ({
	code: 'residual-not-covered',
	message: `${why} No state is given. Send residual "none" or leave it out.`
});

const tooWeak =
	'The residual stresses of the published pattern are more than the yield strength of a part.';

/** Whether every piece bears its stress elastically (at the yield strength itself, too). */
function isBearable({ parts }: PreparedSection, pieces: readonly StressedPiece[]): boolean {
	return pieces.every(({ part, edges, stress }) => {
		const { fy, fyc } = parts[part]!.material;
		return edges.every((edge) => {
			if (edge.kind === 'arc') return true;
			const value = stress.c + stress.y * edge.from.y + stress.z * edge.from.z;
			return value <= fy * (1 + 1e-9) && value >= -fyc * (1 + 1e-9);
		});
	});
}

/** What the patterns rest on, said with every figure that they move. */
export function residualNote(pattern: ResidualPattern): Note | null {
	switch (pattern) {
		case 'none':
			return null;
		case 'rolled':
			return {
				code: 'residual-rolled',
				clause: 'ECCS 33 (1984)',
				message:
					'Residual stresses of rolling: triangular in each flange half and over the web, compression at the tips and at mid-web, tension at the junctions, peak 0.5 × 235 N/mm² for h/b ≤ 1.2 and 0.3 × 235 N/mm² above. Root fillets carry none, so that each plate is in equilibrium by itself. The pattern is from memory and must be checked.'
			};
		case 'welded':
			return {
				code: 'residual-welded',
				message:
					'Residual stresses of welding: tension fy at the welds over 20 % of each plate, compression 0.25 fy over the rest, each plate in equilibrium by itself. The pattern is common practice, from memory, and must be checked. Steel at the welds is at its yield strength before any load, so that first yield is at no moment at all.'
			};
	}
}
