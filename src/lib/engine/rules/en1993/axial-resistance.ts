import { groupProfiles } from '../../response/law-groups';
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

/** The plastic forces of a hybrid balance about its gross centroid. */
function isCentred({ mechanics }: EnModel): boolean {
	const { groups, squash, reach } = mechanics;
	const profiles = mechanics.profiles(0);
	const strength = groups.map(({ fy, fyc }) => Math.min(fy, fyc));
	const about = (place: number) =>
		profiles.reduce((sum, { total }, i) => sum + strength[i]! * total[place]!, 0);
	return Math.hypot(about(1), about(2)) <= 1e-9 * squash * reach;
}
