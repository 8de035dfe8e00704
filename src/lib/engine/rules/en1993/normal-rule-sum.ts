import type { WorkingInput } from '../../explain/working';
import { senseY, senseZ, type DemandCase } from './demand-case';
import type { NormalRule, NoRule } from './normal-rule';

/** Moment limits by sense (kNm, design) and what N alone uses with the moments it adds. */
export interface SumParts {
	readonly axial: number;
	/** kN, design; for words only where N acts. */
	readonly axialLimit: number | null;
	/** kNm that N adds about the axes of the effective section. */
	readonly addedY: number;
	readonly addedZ: number;
	readonly limitY: (sense: 'plusMy' | 'minusMy') => number | null;
	readonly limitZ: (sense: 'plusMz' | 'minusMz') => number | null;
}

type SumHead = Pick<NormalRule, 'topic' | 'basis' | 'reduced'> & { also?: string };

/** N/NRd + My/My,Rd + Mz/Mz,Rd ≤ 1, each moment with what N adds to it, in its own sense. */
export function sumRule(c: DemandCase, parts: SumParts, head: SumHead): NormalRule | NoRule {
	const { direction, size, effects } = c;
	const senses = { y: senseY(direction.y), z: senseZ(direction.z) };
	const limits = new Map<string, number>();
	for (const sense of ['plusMy', 'minusMy'] as const)
		if (senses.y === sense || parts.addedY !== 0) {
			const limit = direction.y === 0 && parts.addedY === 0 ? 1 : parts.limitY(sense);
			if (limit === null) return { gap: 'slender' };
			limits.set(sense, limit);
		}
	for (const sense of ['plusMz', 'minusMz'] as const)
		if (senses.z === sense || parts.addedZ !== 0) {
			const limit = direction.z === 0 && parts.addedZ === 0 ? 1 : parts.limitZ(sense);
			if (limit === null) return { gap: 'slender' };
			limits.set(sense, limit);
		}
	const shareOf = (M: number, sense: string) => (M === 0 ? 0 : Math.abs(M) / limits.get(sense)!);
	const use = (moment: number) => {
		const My = moment * direction.y + parts.addedY;
		const Mz = moment * direction.z + parts.addedZ;
		return parts.axial + shareOf(My, senseY(My)) + shareOf(Mz, senseZ(Mz));
	};
	const plain = parts.addedY === 0 && parts.addedZ === 0;
	const each = use(1) - parts.axial;
	return {
		...head,
		name: sumName(c),
		value: use(size),
		limit: 1,
		use,
		most: plain ? Math.max(0, (1 - parts.axial) / each) : null,
		kind: 'sum',
		working: () => {
			const My = size * direction.y + parts.addedY;
			const Mz = size * direction.z + parts.addedZ;
			return {
				...sumFormula([
					...term('N', effects.N, parts.axialLimit, 'kN', 0),
					...term('M_y', My, limits.get(senseY(My)) ?? 1, 'kNm', parts.addedY),
					...term('M_z', Mz, limits.get(senseZ(Mz)) ?? 1, 'kNm', parts.addedZ)
				]),
				result: { value: use(size), unit: '' }
			};
		}
	};
}

interface Term {
	readonly text: string;
	readonly inputs: WorkingInput[];
}

function term(
	symbol: string,
	value: number,
	limit: number | null,
	unit: string,
	added: number
): Term[] {
	if (value === 0 && added === 0) return [];
	const [own, most] = [`${symbol},Ed`, `${symbol},Rd`];
	const inputs: WorkingInput[] = [
		{ symbol: own, value: value - added, unit, from: 'demand' },
		{ symbol: most, value: limit ?? 1, unit, from: 'resistance for this class' }
	];
	if (added === 0) return [{ text: `abs(${own})/${most}`, inputs }];
	const more = {
		symbol: `Δ${symbol}`,
		value: added,
		unit,
		from: 'N times the shift of the effective centroid'
	};
	return [{ text: `abs(${own} + Δ${symbol})/${most}`, inputs: [...inputs, more] }];
}

const sumFormula = (terms: readonly Term[]) => ({
	formula: `U = ${terms.map(({ text }) => text).join(' + ') || '0'}`,
	inputs: terms.flatMap(({ inputs }) => inputs)
});

/** What acts together, in words. */
export function sumName({ effects: { N }, size, direction }: DemandCase): string {
	if (N === 0) return 'bending about both axes';
	if (size === 0) return N < 0 ? 'compression off the effective centroid' : 'tension';
	return direction.y !== 0 && direction.z !== 0
		? 'axial force with bending about both axes'
		: 'axial force with bending';
}
