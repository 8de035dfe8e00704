import type { RectangularHollowSection } from '../../../section/definition';
import { cornerRadii } from '../../../section/kinds/rectangular-hollow';
import type { Flat } from './element';

/**
 * Rectangular tube: c = b − 3t as in Table 5.2, or the flat b − 2t − 2ri where a tight corner
 * leaves more than that.
 */
export function hollowElements(definition: RectangularHollowSection): Flat[] {
	const { h, b, t } = definition;
	const { ri } = cornerRadii(definition);
	const edge = Math.min(1.5 * t, t + ri);
	const across = (part: string, z: number): Flat => ({
		id: part,
		part,
		type: 'internal',
		t,
		from: { y: Math.min(edge, b / 2), z },
		to: { y: Math.max(b - edge, b / 2), z }
	});
	const upright = (part: string, y: number): Flat => ({
		id: part,
		part,
		type: 'internal',
		t,
		from: { y, z: Math.min(edge, h / 2) },
		to: { y, z: Math.max(h - edge, h / 2) }
	});
	return [
		across('topFlange', h - t / 2),
		upright('leftWeb', t / 2),
		upright('rightWeb', b - t / 2),
		across('bottomFlange', t / 2)
	];
}
