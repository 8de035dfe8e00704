import { workingKey } from '$lib/engine/explain/keys';
import type { RulerModel } from '../ruler-model';
import type {
	Classification,
	ClassifiedElement,
	DemandState,
	Resistance,
	SectionClass
} from '$lib/engine/rules/result';
import type { VerdictFigure } from '$lib/engine/rules/verdict-tokens';
import type { FigureKey } from './explaining.svelte';

const pureCases: Readonly<Record<Classification['basis'], readonly string[]>> = {
	'+My': ['plusMy'],
	'−My': ['minusMy'],
	N: ['compression'],
	demand: ['plusMz', 'minusMz']
};

/** Names under which limits were found: the demand's own, or that of the pure case that it is. */
export function caseNames(
	basis: Classification['basis'],
	demand: string | null,
	axisAngle = 0
): string[] {
	const pure = pureCases[basis];
	if (basis !== 'demand') return [...pure];
	const turned = axisAngle < 0 ? [...pure].reverse() : pure;
	return demand === null ? [...turned] : [demand, ...turned];
}

type Element = Pick<ClassifiedElement, 'part' | 'type'>;

/** Key of a figure of a part against its limits: `slenderness`, `1`, `2`, `3`; empty for its class. */
export const limitKeys = (
	cases: readonly string[],
	{ part, type }: Element,
	figure = ''
): string[] =>
	cases.map((name) =>
		figure === ''
			? workingKey.limits(name, part, type)
			: workingKey.limitFigure(name, part, type, figure)
	);

/** Key of a figure in the verdict's sentences; without demands those of bending +My. */
export function verdictKeys(
	figure: VerdictFigure,
	state: DemandState | undefined,
	plain: Classification | null
): FigureKey {
	if (figure === 'slenderness' || figure === 'limit') return decidingKeys(figure, state, plain);
	if (state) return workingKey.demand(state.demand, figure);
	return figure === 'countable' ? workingKey.resistance('MyRd') : null;
}

function decidingKeys(
	figure: 'slenderness' | 'limit',
	state: DemandState | undefined,
	plain: Classification | null
): FigureKey {
	const judged = state ?? plain;
	if (!judged) return null;
	const overall: SectionClass = 'class' in judged ? judged.class : judged.overall;
	const { elements, governing, basis } = judged;
	const element = elements.find((one) => one.part === governing && one.class === overall);
	if (!element) return null;
	const cases = caseNames(basis, state?.demand ?? null, state?.axisAngle);
	return limitKeys(cases, element, figure === 'limit' ? `${Math.max(overall - 1, 1)}` : figure);
}

export type RulerKeys = Readonly<Record<'demand' | 'count' | 'first-yield' | 'plastic', FigureKey>>;

/** Keys of the ruler's marks: those of the demand where rules reach it, else the section's own. */
export function rulerKeys({ quantity, N }: RulerModel, state: DemandState | undefined): RulerKeys {
	const own = (figure: string) => (state ? workingKey.demand(state.demand, figure) : null);
	if (quantity === 'force') {
		const plastic = N < 0 ? workingKey.squashLoad : workingKey.yieldLoad;
		return { demand: own('use'), count: own('countableForce'), 'first-yield': null, plastic };
	}
	return {
		demand: own('use') ?? 'ruler.demand',
		count: own('countable'),
		'first-yield': own('firstYield') ?? 'ruler.firstYield',
		plastic: own('fullPlastic') ?? 'ruler.plastic'
	};
}

/** Key of the check that a demand uses most of. */
export function governingKey(resistance: Resistance | null, demand: string): FigureKey {
	const checks = resistance?.checks.filter((check) => check.demand === demand) ?? [];
	const [first, ...rest] = checks;
	if (!first) return null;
	const most = rest.reduce((a, b) => (b.utilisation > a.utilisation ? b : a), first);
	return workingKey.check(demand, most.name);
}

/** Key of what may be counted about the axis of bending, in its sense or against it. */
export function countKey(axisAngle: number, sense: 1 | -1): FigureKey {
	if (axisAngle === 90) return workingKey.resistance('MzRd');
	return workingKey.resistance(sense > 0 ? 'MyRd' : 'MyRdNegative');
}
