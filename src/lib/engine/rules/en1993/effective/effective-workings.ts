import { workingKey } from '../../../explain/keys';
import type { WorkingInput, Workings } from '../../../explain/working';
import type { PreparedSection } from '../../../section/prepared';
import type { EffectiveProperties } from './effective-properties';
import type { Reduced } from './reduce';
import type { Strip } from './strip';
import { widthWorkings, type ExplainedBasis } from './width-workings';
import { clause, edition, input } from './working-parts';

/** Workings of every effective width, and of area, centroid, second moments and moduli of what remains. */
export function effectiveWorkings(
	workings: Workings,
	section: PreparedSection,
	basis: ExplainedBasis,
	reduced: Reduced,
	figures: EffectiveProperties
): void {
	for (const width of reduced.widths) widthWorkings(workings, basis, width);
	const add: Add = (figure, title, formula, inputs, value, unit) =>
		workings.add(workingKey.effective(basis, figure), () => ({
			title,
			clause,
			edition,
			formula,
			inputs,
			result: { value, unit }
		}));
	addArea(add, section, reduced, figures);
	addShifts(add, section, reduced, figures);
	addSecondMoments(add, section, reduced, figures);
	addModuli(add, figures);
}

type Add = (
	figure: string,
	title: string,
	formula: string,
	inputs: readonly WorkingInput[],
	value: number,
	unit: string
) => void;

/** One term for each strip, joined: ` − A1 − A2`. */
const each = (strips: readonly Strip[], term: (i: number) => string): string =>
	strips.map((_, i) => term(i + 1)).join('');

const areas = (strips: readonly Strip[]): WorkingInput[] =>
	strips.map(({ area, element }, i) =>
		input(`A${i + 1}`, area, 'mm²', `strip taken out of ${element.id}`)
	);

function addArea(
	add: Add,
	{ gross }: PreparedSection,
	{ strips }: Reduced,
	{ area }: EffectiveProperties
): void {
	const inputs = [input('A', gross.area, 'mm²', workingKey.gross('area')), ...areas(strips)];
	const formula = `A_eff = A${each(strips, (i) => ` − A${i}`)}`;
	add('area', 'Effective area', formula, inputs, area, 'mm²');
}

function addShifts(
	add: Add,
	{ gross: { centroid } }: PreparedSection,
	{ strips }: Reduced,
	{ area, centroidShiftY, centroidShiftZ }: EffectiveProperties
): void {
	for (const axis of ['y', 'z'] as const) {
		const levers = strips.map(({ middle }, i) =>
			input(`${axis}${i + 1}`, middle[axis] - centroid[axis], 'mm', 'from the gross centroid')
		);
		const sum = strips.map((_, i) => `A${i + 1}·${axis}${i + 1}`).join(' + ');
		const figure = axis === 'y' ? 'centroidShiftY' : 'centroidShiftZ';
		const shift = axis === 'y' ? centroidShiftY : centroidShiftZ;
		add(
			figure,
			`Shift of the centroid along ${axis}`,
			shift === 0 ? `e_${axis} = 0` : `e_${axis} = −(${sum})/A_eff`,
			[...areas(strips), ...levers, input('A_eff', area, 'mm²', 'effective area')],
			shift,
			'mm'
		);
	}
}

function addSecondMoments(
	add: Add,
	section: PreparedSection,
	{ strips }: Reduced,
	figures: EffectiveProperties
): void {
	const { gross } = section;
	for (const axis of ['y', 'z'] as const) {
		const across = axis === 'y' ? 'z' : 'y';
		const whole = axis === 'y' ? gross.secondMomentY : gross.secondMomentZ;
		const shift = axis === 'y' ? figures.centroidShiftZ : figures.centroidShiftY;
		const inputs = [
			input('I', whole, 'mm⁴', workingKey.gross(`secondMoment${axis.toUpperCase()}`)),
			...areas(strips),
			...strips.flatMap((strip, i) => [
				input(`I${i + 1}`, axis === 'y' ? strip.ownY : strip.ownZ, 'mm⁴', 'about its own middle'),
				input(
					`${across}${i + 1}`,
					strip.middle[across] - gross.centroid[across],
					'mm',
					'from the gross centroid'
				)
			]),
			input('A_eff', figures.area, 'mm²', 'effective area'),
			input(`e_${across}`, shift, 'mm', 'shift of the centroid')
		];
		const lost = each(strips, (i) => ` − (I${i} + A${i}·${across}${i}²)`);
		add(
			axis === 'y' ? 'secondMomentY' : 'secondMomentZ',
			`Effective second moment about ${axis}`,
			`I_eff = I${lost} − A_eff·e_${across}²`,
			inputs,
			axis === 'y' ? figures.secondMomentY : figures.secondMomentZ,
			'mm⁴'
		);
	}
}

const fibres = [
	['elasticModulusYTop', 'top', 'secondMomentY'],
	['elasticModulusYBottom', 'bottom', 'secondMomentY'],
	['elasticModulusZLeft', 'left', 'secondMomentZ'],
	['elasticModulusZRight', 'right', 'secondMomentZ']
] as const;

function addModuli(add: Add, figures: EffectiveProperties): void {
	for (const [figure, side, second] of fibres) {
		const [I, W] = [figures[second], figures[figure]];
		const from = `effective centroid to the extreme fibre that remains, ${side}`;
		const inputs = [
			input('I_eff', I, 'mm⁴', 'effective second moment'),
			input('d', I / W, 'mm', from)
		];
		add(figure, `Effective modulus, ${side}`, 'W_eff = I_eff/d', inputs, W, 'mm³');
	}
}
