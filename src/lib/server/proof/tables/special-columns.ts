import { fullPlastic } from '../../../engine/response/plastic';
import { iSizes } from '../../../engine/section/kinds/i';
import { cornerRadii } from '../../../engine/section/kinds/rectangular-hollow';
import { bredtHollowTorsion } from '../../../engine/section/torsion/hollow';
import { continentalITorsion } from '../../../engine/section/torsion/i';
import { inch, type Column } from './columns';

/** It of IPE and HE by the continental formula, cm⁴, as those tables print it. */
export const continentalTorsion: Column = {
	unit: 'cm⁴',
	remark:
		'Compared by the continental formula that the table prints; the engine’s own figure is by the formula for all other I shapes.',
	ours: ({ definition }) =>
		definition.kind === 'i' ? continentalITorsion(iSizes(definition)) / 1e4 : null
};

/** J of rectangular tubes by the closed-cell term alone, in⁴, as the American tables print it. */
export const bredtTorsion: Column = {
	unit: 'in⁴',
	remark:
		'Compared by the closed-cell term alone, as the table prints it; the engine’s own figure adds the wall’s pt³/3 as EN 10210-2 does, up to 2.2 % more.',
	ours: ({ definition }) =>
		definition.kind === 'rectangular-hollow'
			? bredtHollowTorsion({ ...definition, ...cornerRadii(definition) }) / inch ** 4
			: null
};

/** Centroid of a tee below the top of its flange, in. */
export const fromTop: Column = {
	unit: 'in',
	ours: ({ bounds, gross }) => (bounds.top - gross.centroid.z) / inch
};

/** Plastic neutral axis of a tee below the top of its flange, in. */
export const plasticFromTop: Column = {
	unit: 'in',
	ours: (section) => {
		const { plasticNeutralAxisZ } = fullPlastic(section);
		return plasticNeutralAxisZ === null ? null : (section.bounds.top - plasticNeutralAxisZ) / inch;
	}
};
