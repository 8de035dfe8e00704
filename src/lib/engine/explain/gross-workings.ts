import type { GrossProperties, PreparedSection } from '../section/prepared';
import { areaWorkings } from './gross-area-workings';
import { modulusWorkings } from './gross-modulus-workings';
import { workingKey } from './keys';
import { partAreas } from './part-inputs';
import { plasticModulusWorkings } from './plastic-modulus-workings';
import type { Working, Workings } from './working';

/** How a geometric figure of the gross section came about. */
export type GrossFigure = Omit<Working, 'clause' | 'edition' | 'result'> & {
	readonly figure: string;
	readonly value: number;
	readonly unit: string;
};

const clause = 'geometry';
const edition = '—';

/** Workings of the gross section, written from its parts: area, centroid, second moments, moduli … */
export function grossWorkings(workings: Workings, section: PreparedSection): void {
	const parts = partAreas(section);
	const { gross } = section;
	const found: GrossFigure[] = [
		...areaWorkings(parts, gross),
		...modulusWorkings(section),
		...plasticModulusWorkings(section),
		...torsionWorkings(gross)
	];
	for (const { figure, value, unit, ...rest } of found)
		workings.add(workingKey.gross(figure), () => ({
			...rest,
			clause,
			edition,
			result: { value, unit }
		}));
}

/** Torsion figures come from published formulas for the kind; here they stand as one number. */
function torsionWorkings(gross: GrossProperties): GrossFigure[] {
	const { torsionConstant, warpingConstant, shearCentre } = gross;
	return [
		...asFound('torsionConstant', 'Torsion constant', 'I_t', torsionConstant, 'mm⁴'),
		...asFound('warpingConstant', 'Warping constant', 'I_w', warpingConstant, 'mm⁶'),
		...asFound('shearCentre.y', 'Shear centre, y', 'y_s', shearCentre?.y ?? null, 'mm'),
		...asFound('shearCentre.z', 'Shear centre, z', 'z_s', shearCentre?.z ?? null, 'mm'),
		...asFound('perimeter', 'Painted perimeter', 'u', gross.perimeter, 'mm')
	];
}

function asFound(
	figure: string,
	title: string,
	symbol: string,
	value: number | null,
	unit: string
): GrossFigure[] {
	if (value === null) return [];
	const from = figure === 'perimeter' ? 'length of the outline' : 'formula of the kind of section';
	return [
		{
			figure,
			title,
			value,
			unit,
			formula: `${symbol} = ${symbol}'`,
			inputs: [{ symbol: `${symbol}'`, value, unit, from }]
		}
	];
}
