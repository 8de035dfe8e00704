import type { MomentFigures } from '../rules/section-moments';
import type { PreparedSection } from '../section/prepared';
import { workingKey } from './keys';
import type { Workings } from './working';

/** Workings of places measured from the bottom and the left of the section, or from its centroid; mm. */
export function placeWorkings(
	workings: Workings,
	{ gross, bounds }: PreparedSection,
	moment: MomentFigures
): void {
	const { centroid, shearCentre } = gross;
	const edge = { y: bounds.left, z: bounds.bottom };
	const plastic = { y: moment.plasticNeutralAxisY, z: moment.plasticNeutralAxisZ };
	for (const axis of ['y', 'z'] as const) {
		const side = axis === 'y' ? 'left' : 'bottom';
		const from = { value: edge[axis], from: `the ${side} of the section` };
		const own = { value: centroid[axis], from: workingKey.gross(`centroid.${axis}`) };
		const main = {
			value: plastic[axis],
			from: workingKey.moment(`plasticNeutralAxis${axis.toUpperCase()}`)
		};
		const shear = {
			value: shearCentre?.[axis] ?? null,
			from: workingKey.gross(`shearCentre.${axis}`)
		};
		add(workings, `centroid.${axis}`, `Centroid from the ${side}`, axis, own, from);
		add(workings, `plasticAxis.${axis}`, `Plastic neutral axis from the ${side}`, axis, main, from);
		add(workings, `shearCentre.${axis}`, 'Shear centre from the centroid', axis, shear, own);
	}
}

interface Place {
	readonly value: number | null;
	readonly from: string;
}

function add(
	workings: Workings,
	figure: string,
	title: string,
	axis: 'y' | 'z',
	to: Place,
	from: Place
): void {
	if (to.value === null || from.value === null) return;
	const input = (symbol: string, value: number, source: string) => ({
		symbol,
		value,
		unit: 'mm',
		from: source
	});
	const inputs = [input(`${axis}_1`, to.value, to.from), input(`${axis}_0`, from.value, from.from)];
	const result = { value: to.value - from.value, unit: 'mm' };
	workings.add(workingKey.place(figure), () => ({
		title,
		clause: 'geometry',
		edition: '—',
		formula: `e_${axis} = ${axis}_1 − ${axis}_0`,
		inputs,
		result
	}));
}
