import { z } from './zod';

const number = (unit: string, description?: string) =>
	z.number().meta({ 'x-unit': unit, ...(description ? { description } : {}) });
const place = z.object({ y: z.number(), z: z.number() });

/** Properties of the gross section, from the definition's dimensions. */
export const grossSchema = z
	.object({
		area: number('mm²'),
		mass: number('kg/m'),
		centroid: place,
		secondMomentY: number('mm⁴'),
		secondMomentZ: number('mm⁴'),
		productYZ: number('mm⁴', '+∫(y−yc)(z−zc)dA'),
		secondMomentU: number('mm⁴'),
		secondMomentV: number('mm⁴'),
		principalAngle: number('degrees', 'From y to u (major), in (−90, 90].'),
		elasticModulusYTop: number('mm³'),
		elasticModulusYBottom: number('mm³'),
		elasticModulusZLeft: number('mm³'),
		elasticModulusZRight: number('mm³'),
		radiusOfGyrationY: number('mm'),
		radiusOfGyrationZ: number('mm'),
		plasticModulusY: number('mm³', 'Equal-area axis, whatever the grades.'),
		plasticModulusZ: number('mm³', 'Equal-area axis, whatever the grades.'),
		torsionConstant: number('mm⁴').nullable(),
		warpingConstant: number('mm⁶').nullable(),
		shearCentre: place.nullable(),
		perimeter: number('mm'),
		height: number('mm'),
		width: number('mm')
	})
	.meta({ id: 'GrossProperties' });
