import type { ChannelSection } from '../../../section/definition';
import { channelSizes } from '../../../section/kinds/channel';
import type { Flat } from './element';

/**
 * Channel: web between the roots, flanges as outstands from root to toe. The root ends where its
 * fillet of radius r leaves the straight face, r(√(1 + s²) − s) from the corner along each face for
 * an inner face that rises by s. A tapered flange has the thickness tf of its definition, that of
 * its middle, and is taken as level.
 */
export function channelElements(definition: ChannelSection): Flat[] {
	const { h, b, tw, tf, r, slope, tRoot } = channelSizes(definition);
	const length = Math.hypot(1, slope);
	const tangent = r * (length - slope);
	const low = Math.min(tRoot + tangent, h / 2);
	const root = Math.min(tw + tangent / length, b);
	const flange = (part: string, z: number): Flat => ({
		id: part,
		part,
		type: 'outstand',
		t: tf,
		from: { y: root, z },
		to: { y: b, z }
	});
	const web: Flat = {
		id: 'web',
		part: 'web',
		type: 'internal',
		t: tw,
		from: { y: tw / 2, z: low },
		to: { y: tw / 2, z: h - low }
	};
	return [flange('topFlange', h - tf / 2), web, flange('bottomFlange', tf / 2)];
}
