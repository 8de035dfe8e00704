import type { AreaMoments } from '../../geometry/moments';
import type { TorsionFigures } from '../shape';
import { elDarwishJohnstonCorner } from './junction';

interface ChannelSizes {
	readonly h: number;
	readonly b: number;
	readonly tw: number;
	readonly tf: number;
	readonly r: number;
}

/**
 * Torsion figures of a channel; `moments` are those of its whole area about (y = tw/2, z = h/2), the
 * middle of the web. Tapered flanges go in at their mean thickness tf.
 */
export function channelTorsion(sizes: ChannelSizes, moments: AreaMoments): TorsionFigures {
	return { torsionConstant: channelConstant(sizes), ...channelWarping(sizes, moments) };
}

/** El Darwish & Johnston (1965), mm⁴, with the end losses of the UK section tables, 0.42 tf⁴. */
function channelConstant({ h, b, tw, tf, r }: ChannelSizes): number {
	const walls = (2 * b * tf ** 3 + (h - 2 * tf) * tw ** 3) / 3;
	return walls - 0.42 * tf ** 4 + 2 * elDarwishJohnstonCorner(tw, tf, r);
}

/**
 * Warping constant mm⁶ and shear centre by thin walls, written in the properties of the true area
 * as the explanatory notes of SCI P363 do: with hs = h − tf and c from the web's middle line to the
 * centroid, e = A c hs²/(4 Iy) from the web's middle line outwards and
 * Iw = hs²/4 [Iz − A c² (hs² A/(4 Iy) − 1)].
 */
function channelWarping({ h, tw, tf }: ChannelSizes, moments: AreaMoments) {
	const { area, firstZ, secondY, secondZ } = moments;
	const hs = h - tf;
	const c = firstZ / area;
	const Iz = secondZ - area * c * c;
	const stiff = (hs * hs * area) / (4 * secondY);
	return {
		warpingConstant: ((hs * hs) / 4) * (Iz - area * c * c * (stiff - 1)),
		shearCentre: { y: tw / 2 - c * stiff, z: h / 2 }
	};
}
