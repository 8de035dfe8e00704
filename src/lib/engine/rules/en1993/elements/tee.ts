import type { TeeSection } from '../../../section/definition';
import { weldLegOf } from '../../../section/weld-leg';
import type { Flat } from './element';
import { outstands } from './outstands';

/** Tee: flange outstands, and the stem as an outstand from its root or weld toe to its tip. */
export function teeElements(definition: TeeSection): Flat[] {
	const { h, b, tw, tf, r = 0 } = definition;
	const edge = definition.fabrication === 'rolled' ? r : weldLegOf(definition);
	const flange = { part: 'flange', t: tf, z: h - tf / 2, middle: b / 2 };
	const stem: Flat = {
		id: 'web',
		part: 'web',
		type: 'outstand',
		t: tw,
		from: { y: b / 2, z: Math.max(h - tf - edge, 0) },
		to: { y: b / 2, z: 0 }
	};
	return [...outstands(flange, tw / 2 + edge, b / 2), stem];
}
