import type { EnModel } from '../model';
import type { PlateElement } from '../elements/element';

/**
 * The elements with the width b that EN 1993-1-5 4.4(2) takes: that of the classification, but of an angle
 * the full leg from its heel. Null for sections without plates.
 */
export function platesOf({ elements, section }: EnModel): readonly PlateElement[] | null {
	if (elements.kind !== 'plates') return null;
	const { definition } = section;
	if (definition.kind !== 'angle') return elements.plates;
	return elements.plates.map((leg) =>
		leg.part === 'verticalLeg'
			? { ...leg, c: definition.h, from: { y: leg.to.y, z: leg.to.z - definition.h } }
			: { ...leg, c: definition.b, from: { y: leg.to.y - definition.b, z: leg.to.z } }
	);
}
