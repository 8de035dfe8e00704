import type { AngleSection } from '../../../section/definition';
import type { AngleElement, Flat } from './element';

/** Angle: each leg as an outstand from its root to its tip. */
export function angleElements({ h, b, t, r = 0 }: AngleSection): Flat[] {
	const root = t + r;
	const leg = (part: string, from: Flat['from'], to: Flat['to']): Flat => ({
		id: part,
		part,
		type: 'outstand',
		t,
		from,
		to
	});
	return [
		leg('verticalLeg', { y: t / 2, z: Math.min(root, h) }, { y: t / 2, z: h }),
		leg('horizontalLeg', { y: Math.min(root, b), z: t / 2 }, { y: b, z: t / 2 })
	];
}

/** The full legs, as the row for angles in compression measures them. */
export const angleWhole = ({ h, b, t }: AngleSection): Omit<AngleElement, 'fy' | 'epsilon'> => ({
	part: h >= b ? 'verticalLeg' : 'horizontalLeg',
	longer: Math.max(h, b),
	shorter: Math.min(h, b),
	t
});
