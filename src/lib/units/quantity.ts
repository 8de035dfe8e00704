import type { Preferences } from './preferences';

/**
 * What a number measures. Engine units, the only ones numbers are kept in: length mm, area mm²,
 * modulus mm³, secondMoment mm⁴ (torsion constant too), warping mm⁶, stress N/mm², force kN,
 * moment kNm, curvature 1/m, massPerLength kg/m, strain plain (0.001 = 1 ‰), angle degrees,
 * surface mm (perimeter: mm² of surface per mm of member), ratio plain.
 */
export type Quantity =
	| 'length'
	| 'area'
	| 'modulus'
	| 'secondMoment'
	| 'warping'
	| 'stress'
	| 'force'
	| 'moment'
	| 'curvature'
	| 'massPerLength'
	| 'strain'
	| 'angle'
	| 'surface'
	| 'ratio';

/** One unit; `size` is what one of it is in engine units; `names` as typed, cleaned by `unitKey`. */
export interface Unit {
	label: string;
	size: number;
	names: readonly string[];
}

interface QuantityUnits {
	noun: string;
	si: Unit;
	us: Unit;
	others: readonly Unit[];
}

/** Exact by definition: international yard and pound agreement, 1959 (NIST SP 811, appendix B). */
const INCH = 25.4;
const FOOT = 304.8;
/** Pound-force in newtons: 0.45359237 kg × 9.80665 m/s², both exact. */
const POUND = 0.45359237;
const POUND_FORCE = POUND * 9.80665;

const unit = (label: string, size: number, ...names: string[]): Unit => ({ label, size, names });

/** The power-th powers of the length units, for area up to warping constant. */
function lengthPowers(noun: string, power: number, sign: string, si: 'mm' | 'cm'): QuantityUnits {
	const of = (name: string, size: number) =>
		unit(`${name}${sign}`, size ** power, `${name}${power}`);
	const mm = of('mm', 1);
	const cm = of('cm', 10);
	const rest = [of('m', 1000), of('dm', 100), of('ft', FOOT)];
	return si === 'mm'
		? { noun, si: mm, us: of('in', INCH), others: [cm, ...rest] }
		: { noun, si: cm, us: of('in', INCH), others: [mm, ...rest] };
}

const KSI = (1000 * POUND_FORCE) / INCH ** 2;
const perMetre = (metres: number) => 1 / metres;

const table: Record<Quantity, QuantityUnits> = {
	length: {
		noun: 'length',
		si: unit('mm', 1, 'mm'),
		us: unit('in', INCH, 'in', 'inch', 'inches', '"', "''"),
		others: [
			unit('cm', 10, 'cm'),
			unit('m', 1000, 'm'),
			unit('ft', FOOT, 'ft', 'foot', 'feet', "'")
		]
	},
	area: lengthPowers('area', 2, '²', 'cm'),
	modulus: lengthPowers('section modulus', 3, '³', 'cm'),
	secondMoment: lengthPowers('second moment of area', 4, '⁴', 'cm'),
	warping: lengthPowers('warping constant', 6, '⁶', 'cm'),
	stress: {
		noun: 'stress',
		si: unit('N/mm²', 1, 'n/mm2', 'mpa'),
		us: unit('ksi', KSI, 'ksi', 'kip/in2'),
		others: [
			unit('GPa', 1000, 'gpa', 'kn/mm2'),
			unit('kN/cm²', 10, 'kn/cm2'),
			unit('kPa', 0.001, 'kpa', 'kn/m2'),
			unit('psi', KSI / 1000, 'psi', 'lb/in2', 'lbf/in2')
		]
	},
	force: {
		noun: 'force',
		si: unit('kN', 1, 'kn'),
		us: unit('kip', POUND_FORCE, 'kip', 'kips', 'k'),
		others: [
			unit('N', 0.001, 'n'),
			unit('MN', 1000, 'mn'),
			unit('lb', POUND_FORCE / 1000, 'lb', 'lbs', 'lbf')
		]
	},
	moment: {
		noun: 'moment',
		si: unit('kNm', 1, 'knm'),
		us: unit(
			'kip·ft',
			(POUND_FORCE * FOOT) / 1000,
			...['kipft', 'kipsft', 'kft', 'ftkip', 'ftkips', 'ftk']
		),
		others: [
			unit('Nm', 0.001, 'nm'),
			unit('MNm', 1000, 'mnm'),
			unit('Nmm', 1e-6, 'nmm'),
			unit('kNmm', 0.001, 'knmm'),
			unit('kNcm', 0.01, 'kncm'),
			unit('kip·in', (POUND_FORCE * INCH) / 1000, 'kipin', 'kipsin', 'kin', 'inkip', 'inkips'),
			unit('lb·ft', (POUND_FORCE * FOOT) / 1e6, 'lbft', 'ftlb', 'ftlbs', 'lbfft'),
			unit('lb·in', (POUND_FORCE * INCH) / 1e6, 'lbin', 'inlb', 'inlbs', 'lbfin')
		]
	},
	curvature: {
		noun: 'curvature',
		si: unit('1/km', perMetre(1000), '/km', '1/km', 'mrad/m'),
		us: unit('µrad/in', 1e-6 / (INCH / 1000), 'µrad/in', 'urad/in'),
		others: [
			unit('1/m', 1, '/m', '1/m', 'rad/m'),
			unit('1/mm', perMetre(0.001), '/mm', '1/mm', 'rad/mm'),
			unit('1/in', perMetre(INCH / 1000), '/in', '1/in', 'rad/in'),
			unit('1/ft', perMetre(FOOT / 1000), '/ft', '1/ft', 'rad/ft')
		]
	},
	massPerLength: {
		noun: 'mass per length',
		si: unit('kg/m', 1, 'kg/m'),
		us: unit('lb/ft', (POUND * 1000) / FOOT, 'lb/ft', 'lbs/ft', 'plf'),
		others: [unit('t/m', 1000, 't/m')]
	},
	strain: {
		noun: 'strain',
		si: unit('‰', 0.001, '‰', 'mm/m'),
		us: unit('‰', 0.001, '‰'),
		others: [
			unit('%', 0.01, '%'),
			unit('µε', 1e-6, 'µε', 'µ', 'ue', 'µm/m'),
			unit('in/in', 1, 'in/in', 'mm/mm', 'm/m')
		]
	},
	angle: {
		noun: 'angle',
		si: unit('°', 1, '°', 'deg', 'degree', 'degrees'),
		us: unit('°', 1, '°'),
		others: [unit('rad', 180 / Math.PI, 'rad')]
	},
	surface: {
		noun: 'surface per length',
		si: unit('m²/m', 1000, 'm2/m'),
		us: unit('ft²/ft', FOOT, 'ft2/ft'),
		others: [unit('mm²/mm', 1, 'mm2/mm'), unit('in²/in', INCH, 'in2/in')]
	},
	ratio: { noun: 'ratio', si: unit('', 1), us: unit('', 1), others: [unit('%', 0.01, '%')] }
};

export const quantities = Object.keys(table) as Quantity[];

/** The quantity in words, for a sentence: "section modulus". */
export const quantityNoun = (quantity: Quantity): string => table[quantity].noun;

/** The unit a quantity is shown in, and typed in when no unit is typed. */
export const shownUnit = (quantity: Quantity, system: Preferences['system']): Unit =>
	table[quantity][system];

/** Every unit that may be typed for a quantity, the shown ones first, each once. */
export function typedUnits(quantity: Quantity): readonly Unit[] {
	const { si, us, others } = table[quantity];
	return si.label === us.label ? [si, ...others] : [si, us, ...others];
}

/** Label of the shown unit: `mm`, `cm³`, `kip·ft`; empty for a ratio. */
export const unitLabel = (quantity: Quantity, preferences: Pick<Preferences, 'system'>): string =>
	shownUnit(quantity, preferences.system).label;

/** An engine value in the shown unit: 25.4 (mm) is 1 (in). */
export const toShown = (value: number, quantity: Quantity, system: Preferences['system']): number =>
	value / shownUnit(quantity, system).size;

/** A value in the shown unit back in engine units. */
export const fromShown = (
	value: number,
	quantity: Quantity,
	system: Preferences['system']
): number => value * shownUnit(quantity, system).size;
