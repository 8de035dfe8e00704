import type { PlateElement } from '../elements/element';
import { sameRatio } from '../limits';
import type { GrossProperties } from '../../../section/prepared';
import { elementWidth, type ElementWidth, type StressUse } from './element-width';
import { remainingOf, type Remaining } from './remaining';
import { stressField, stressOf, type EffectiveBasis, type StressField } from './stress-field';
import { stripOf, type Strip } from './strip';

/** A section with its elements reduced: one width for each compressed element, in their order. */
export interface Reduced {
	readonly widths: readonly ElementWidth[];
	readonly strips: readonly Strip[];
	readonly remaining: Remaining;
}

/** The gross section, nothing taken out. */
export const wholeOf = (gross: GrossProperties): Reduced => ({
	widths: [],
	strips: [],
	remaining: remainingOf(gross, [])
});

export interface ReduceSource {
	readonly gross: GrossProperties;
	readonly plates: readonly PlateElement[];
	readonly basis: EffectiveBasis;
	readonly use: StressUse | undefined;
}

/** Iteration of the neutral axis stops when the centroid moves by less than this share of the section's size. */
const stillness = 1e-12;
const mostRounds = 200;

/**
 * EN 1993-1-5 4.4(3), in one pass: elements that lie along the neutral axis (inclined to it by at most
 * 45°: the flange role) by the stresses of the gross section, then the others by those of the section
 * with the first reduced. In compression all are stressed alike.
 */
export function reducedOnce(source: ReduceSource): Reduced {
	const { gross, plates, basis } = source;
	const whole = remainingOf(gross, []);
	const field = stressField(whole, basis);
	if (basis === 'N') return reducedBy(source, plates, () => field);
	const first = plates.filter((plate) => liesAlong(plate, field));
	const flanges = reducedBy(source, first, () => field);
	if (first.length === plates.length) return flanges;
	const second = flanges.strips.length > 0 ? stressField(flanges.remaining, basis) : field;
	return reducedBy(source, plates, (plate) => (first.includes(plate) ? field : second));
}

/** The same with the neutral axis at rest; null where it does not come to rest. */
export function reducedAtRest(source: ReduceSource, once: Reduced): Reduced | null {
	if (source.basis === 'N' || once.strips.length === 0) return once;
	let last = once;
	for (let round = 0; round < mostRounds; round++) {
		const field = stressField(last.remaining, source.basis);
		const next = reducedBy(source, source.plates, () => field);
		if (isAtRest(last.remaining, next.remaining)) return next;
		last = next;
	}
	return null;
}

function isAtRest(a: Remaining, b: Remaining): boolean {
	const size = Math.sqrt((b.secondY + b.secondZ) / b.area);
	return (
		Math.abs(a.y - b.y) <= stillness * size &&
		Math.abs(a.z - b.z) <= stillness * size &&
		Math.abs(a.product - b.product) <= stillness * (b.secondY + b.secondZ)
	);
}

function liesAlong({ from, to }: PlateElement, { alongY, alongZ }: StressField): boolean {
	const [dy, dz] = [to.y - from.y, to.z - from.z];
	const across = dy * alongY + dz * alongZ;
	const along = dz * alongY - dy * alongZ;
	return Math.abs(across) <= Math.abs(along) * (1 + sameRatio);
}

function reducedBy(
	{ gross, plates, use }: ReduceSource,
	among: readonly PlateElement[],
	fieldOf: (plate: PlateElement) => StressField
): Reduced {
	const zero = sameRatio * greatestStress(plates, fieldOf);
	const widths: ElementWidth[] = [];
	const strips: Strip[] = [];
	for (const plate of among) {
		const field = fieldOf(plate);
		const atFrom = stressOf(field, plate.from);
		const width = elementWidth(plate, atFrom, stressOf(field, plate.to), zero, use);
		if (width === null) continue;
		widths.push(width);
		if (width.removed) strips.push(stripOf(plate, width.removed[0], width.removed[1]));
	}
	return { widths, strips, remaining: remainingOf(gross, strips) };
}

function greatestStress(
	plates: readonly PlateElement[],
	fieldOf: (plate: PlateElement) => StressField
): number {
	let most = 0;
	for (const plate of plates) {
		const field = fieldOf(plate);
		most = Math.max(
			most,
			Math.abs(stressOf(field, plate.from)),
			Math.abs(stressOf(field, plate.to))
		);
	}
	return most;
}
