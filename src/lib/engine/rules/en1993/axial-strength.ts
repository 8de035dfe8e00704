import { regionMoments } from '../../geometry/moments';
import type { EnModel } from './model';

/**
 * Yield resistance of the whole section under N at the gross centroid, kN, without γM0: every part
 * at its own strength where the resultant of those forces lies at that centroid, otherwise (and
 * where parts may not yield beyond their own strain: `plastic` false) the weakest strength everywhere.
 */
export function axialStrength(model: EnModel, plastic: boolean): number {
	const { mechanics, strengths, section } = model;
	if (!strengths.hybrid) return section.gross.area * strengths.least * 1e-3;
	const together = plastic && isCentred(model);
	return (together ? mechanics.squash : section.gross.area * strengths.least) * 1e-3;
}

/** Whether the plastic forces of a hybrid balance about its gross centroid. */
export function isCentred({ section, mechanics }: EnModel): boolean {
	let [aboutY, aboutZ] = [0, 0];
	for (const { region, material } of section.parts) {
		const { firstY, firstZ } = regionMoments(region, section.gross.centroid);
		const strength = Math.min(material.fy, material.fyc);
		aboutY += strength * firstY;
		aboutZ += strength * firstZ;
	}
	return Math.hypot(aboutY, aboutZ) <= 1e-9 * mechanics.squash * mechanics.reach;
}
