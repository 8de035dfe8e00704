import type { ISection } from '../../../section/definition';
import { iSizes } from '../../../section/kinds/i';
import { weldLegOf } from '../../../section/weld-leg';
import type { Flat } from './element';
import { outstands } from './outstands';

/** Rolled: c between root radii or from root to tip. Welded: from the toe of the fillet. */
export function iElements(definition: ISection): Flat[] {
	const { h, bTop, tfTop, bBottom, tfBottom, tw, r, middle } = iSizes(definition);
	const edge = definition.fabrication === 'rolled' ? r : weldLegOf(definition);
	const root = tw / 2 + edge;
	const bottom = Math.min(tfBottom + edge, h / 2);
	const web: Flat = {
		id: 'web',
		part: 'web',
		type: 'internal',
		t: tw,
		from: { y: middle, z: bottom },
		to: { y: middle, z: Math.max(h - tfTop - edge, bottom) }
	};
	const top = { part: 'topFlange', t: tfTop, z: h - tfTop / 2, middle };
	const low = { part: 'bottomFlange', t: tfBottom, z: tfBottom / 2, middle };
	return [...outstands(top, root, bTop / 2), web, ...outstands(low, root, bBottom / 2)];
}
