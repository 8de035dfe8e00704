import { weightedLevel } from '../geometry/weighted-level';
import { frameAt } from '../geometry/frame';
import { profileOf } from '../geometry/profile';
import type { PreparedSection } from '../section/prepared';
import { partSplits } from './block-parts';
import type { GrossFigure } from './gross-workings';

/** Plastic moduli: first moments of the two halves of the area, part by part. */
export const plasticModulusWorkings = (section: PreparedSection): GrossFigure[] => [
	plasticFigure(section, 'plasticModulusY', 0),
	plasticFigure(section, 'plasticModulusZ', 90)
];

function plasticFigure(
	section: PreparedSection,
	figure: 'plasticModulusY' | 'plasticModulusZ',
	angle: number
): GrossFigure {
	const { parts, gross } = section;
	const loops = parts.flatMap(({ region }) => region.loops);
	const profile = profileOf(loops, frameAt(gross.centroid, (angle * Math.PI) / 180));
	const level = weightedLevel([profile], [1], gross.area / 2);
	const splits = partSplits(section, angle, level);
	const axis = angle === 0 ? 'y' : 'z';
	return {
		figure,
		title: `Plastic modulus about ${axis}–${axis}: first moments beyond less those before the equal-area axis`,
		value: gross[figure],
		unit: 'mm³',
		formula: `W_pl = ${splits.map((_, i) => `S_${i + 1} − T_${i + 1}`).join(' + ')}`,
		inputs: splits.flatMap(({ name, firstAbove, firstBelow }, i) => [
			{ symbol: `S_${i + 1}`, value: firstAbove, unit: 'mm³', from: `${name}, beyond the axis` },
			{ symbol: `T_${i + 1}`, value: firstBelow, unit: 'mm³', from: `${name}, before the axis` }
		])
	};
}
