import type { Note } from '../../result';
import type { Demand, ResistanceCheck } from '../result';
import type { AxisSense } from '../section-moments';
import { axialStrength } from './axial-resistance';
import { bendingResistance } from './bending-resistance';
import { holedParts, holesInTension } from './bolt-holes';
import type { ClassifiedCase } from './classify';
import { effectsOf } from './demand-class';
import { flangeInducedBuckling } from './flange-induced-buckling';
import { stabilityGaps } from './member-stability';
import type { EnModel } from './model';
import type { ShearResistances } from './shear-resistance';
import type { Effects } from './stress-case';

/** What a demand uses of the section: checks made, and why others that apply are missing. */
export interface DemandChecks {
	readonly checks: ResistanceCheck[];
	readonly missing: Note[];
	/** Shares of N and of M in the linear sum; null where a resistance is missing. */
	readonly axialShare: number | null;
	readonly bendingShare: number | null;
	/** Codes of the missing checks for which no moment, and no N alone, is counted. */
	readonly withheld: string[];
}

const code = 'EN 1993-1-1:2005';

/** All checks of one demand named `name` for the class that it puts the section in. */
export function demandChecks(
	model: EnModel,
	demand: Demand,
	name: string,
	classified: ClassifiedCase,
	shear: ShearResistances
): DemandChecks {
	const effects = effectsOf(demand);
	const axialShare = axialUse(model, effects, classified);
	const bendingShare = bendingUse(model, effects, classified);
	const sheared = shearChecks(demand, name, shear);
	const missing = [
		...strengthGaps(name, classified, axialShare === null || bendingShare === null),
		...shearGaps(demand, name, shear, sheared),
		...stabilityGaps(model, demand, name)
	];
	const highShear = sheared.some(isHigh) ? ['m-v-not-built'] : [];
	return {
		checks: [...normalChecks(model, effects, classified, name), ...sheared],
		missing: [...missing, ...flangeGaps(model, effects, classified)],
		axialShare,
		bendingShare,
		withheld: [...new Set([...highShear, ...missing.map(({ code }) => code)])]
	};
}

/** kN, design: of the whole section for this class and this sense; null where it has none. */
function axialLimit(model: EnModel, N: number, { overall }: ClassifiedCase): number | null {
	if (overall === 4 || (N > 0 && holedParts(model.section).length > 0)) return null;
	return axialStrength(model, overall <= 2) / model.code.gammaM0;
}

function axialUse(model: EnModel, { N }: Effects, classified: ClassifiedCase): number | null {
	if (N === 0) return 0;
	const limit = axialLimit(model, N, classified);
	return limit === null ? null : Math.abs(N) / limit;
}

const senseY = (My: number): AxisSense => (My < 0 ? 'minusMy' : 'plusMy');
const senseZ = (Mz: number): AxisSense => (Mz < 0 ? 'minusMz' : 'plusMz');

/** kNm; the web of 6.2.2.4 is for bending about y alone. */
function bendingLimit(
	model: EnModel,
	effects: Effects,
	sense: AxisSense,
	classified: ClassifiedCase
): number | null {
	if (holesInTension(model.section, sense)) return null;
	if (effects.N !== 0 && holedParts(model.section).length > 0) return null;
	return bendingResistance(model, sense, classified, bendsAlone(model, effects)).value;
}

/** Whether a class 3 web may be taken as class 2: bending about y with nothing else. */
const bendsAlone = ({ code: { allowEffectiveClass2 } }: EnModel, { N, Mz }: Effects): boolean =>
	N === 0 && Mz === 0 && allowEffectiveClass2;

function bendingUse(model: EnModel, effects: Effects, classified: ClassifiedCase): number | null {
	const share = (M: number, sense: AxisSense) => {
		if (M === 0) return 0;
		const limit = bendingLimit(model, effects, sense, classified);
		return limit === null ? null : Math.abs(M) / limit;
	};
	const [y, z] = [share(effects.My, senseY(effects.My)), share(effects.Mz, senseZ(effects.Mz))];
	return y === null || z === null ? null : y + z;
}

/** One force alone against its resistance; several by the linear sum 6.2.1(7). */
function normalChecks(
	model: EnModel,
	effects: Effects,
	classified: ClassifiedCase,
	demand: string
): ResistanceCheck[] {
	const { N, My, Mz } = effects;
	const bending = bendingUse(model, effects, classified);
	const axial = axialUse(model, effects, classified);
	if (bending === null || axial === null) return [];
	const acting = [N, My, Mz].filter((effect) => effect !== 0).length;
	if (acting === 0) return [];
	if (acting > 1) {
		const name = N === 0 ? 'bending about both axes' : 'axial force with bending';
		return [check(demand, name, `${code} 6.2.1(7)`, axial + bending, 1)];
	}
	if (N !== 0)
		return [
			N < 0
				? check(demand, 'compression', `${code} 6.2.4`, -N, -N / axial)
				: check(demand, 'tension', `${code} 6.2.3`, N, N / axial)
		];
	const M = Math.abs(My + Mz);
	const name = My === 0 ? 'bending about z–z' : 'bending about y–y';
	return [check(demand, name, `${code} 6.2.5`, M, M / bending)];
}

const check = (
	demand: string,
	name: string,
	clause: string,
	value: number,
	limit: number
): ResistanceCheck => ({ demand, name, clause, value, limit, utilisation: value / limit });

function shearChecks(
	{ Vy = 0, Vz = 0 }: Demand,
	demand: string,
	shear: ShearResistances
): ResistanceCheck[] {
	const one = (V: number, limit: number | null, name: string) =>
		V === 0 || limit === null ? [] : [check(demand, name, `${code} 6.2.6`, Math.abs(V), limit)];
	return [...one(Vz, shear.z, 'shear along z'), ...one(Vy, shear.y, 'shear along y')];
}

function strengthGaps(demand: string, { overall }: ClassifiedCase, absent: boolean): Note[] {
	if (overall === 4)
		return [
			{
				code: 'class-4-not-built',
				message: `Under ${demand} the section is class 4. Effective widths are not built yet, so nothing is counted.`,
				clause: 'EN 1993-1-5 4.4'
			}
		];
	if (!absent) return [];
	return [
		{
			code: 'resistance-missing',
			message: `${capital(demand)} pulls a part with bolt holes, for which no resistance is given.`,
			clause: `${code} 6.2.5(4)`
		}
	];
}

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);

/** Shear beyond half of its plastic resistance, rounding apart, lowers what bending may use. */
const isHigh = ({ utilisation }: ResistanceCheck): boolean => utilisation > 0.5 * (1 + 1e-12);

function flangeGaps(model: EnModel, effects: Effects, classified: ClassifiedCase): Note[] {
	const { My } = effects;
	if (My === 0) return [];
	const { basis } = bendingResistance(model, senseY(My), classified, bendsAlone(model, effects));
	const { overall } = classified;
	return flangeInducedBuckling(model, { overall, basis, topCompressed: My > 0 });
}

function shearGaps(
	{ Vy = 0, Vz = 0, N = 0, My = 0, Mz = 0 }: Demand,
	demand: string,
	shear: ShearResistances,
	checks: readonly ResistanceCheck[]
): Note[] {
	const unchecked = (Vz !== 0 && shear.z === null) || (Vy !== 0 && shear.y === null);
	const high = checks.some(isHigh);
	const notes: Note[] = [];
	if (unchecked)
		notes.push({
			code: 'shear-not-checked',
			message: `The shear of ${demand} has no resistance to be checked against.`,
			clause: `${code} 6.2.6`
		});
	if (high && (N !== 0 || My !== 0 || Mz !== 0))
		notes.push({
			code: 'm-v-not-built',
			message: `Shear under ${demand} is over half of the plastic shear resistance. Its effect on bending and axial force is not built yet.`,
			clause: `${code} 6.2.8`
		});
	return notes;
}
