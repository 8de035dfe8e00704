import {
	interactionCurve,
	type InteractionPoint,
	type InteractionRequest
} from '../../../engine/response/interaction';
import type { SectionDefinition } from '../../../engine/section/definition';
import { built } from '../examples/sections';
import { farthestFromOne, rounding, type ClosedForm } from './closed-form';

const [fy, b, h] = [250, 40, 120];
const bar: SectionDefinition = { kind: 'flat', b, h, grade: fy };
const squash = (fy * b * h) / 1e3;
const plasticY = (fy * b * h ** 2) / 4e6;
const plasticZ = (fy * h * b ** 2) / 4e6;
const [firstY, firstZ] = [plasticY / 1.5, plasticZ / 1.5];

type Relation = (point: InteractionPoint) => number;

/** The relation, which must be 1, where the curve lies farthest from it. */
function alongCurve(
	definition: SectionDefinition,
	request: InteractionRequest,
	relation: Relation
) {
	const curve = interactionCurve(built(definition), request);
	return curve.ok ? farthestFromOne(curve.value.points.map(relation)) : null;
}

const form = (
	id: string,
	formula: string,
	definition: SectionDefinition,
	request: InteractionRequest,
	relation: Relation
): ClosedForm => ({
	...{ id: `interaction/${id}`, topic: 'Interaction curves', value: 1, formula },
	case: `${caseOf(definition)}, ${request.limit} curve in ${request.plane}${under(request)}`,
	quantity: 'the formula where the curve lies farthest from it',
	ours: () => alongCurve(definition, request, relation),
	...{ tolerance: 5e-13, why: rounding }
});

const caseOf = ({ kind }: SectionDefinition) =>
	kind === 'flat' ? 'Bar 40×120' : kind === 'round' ? 'Round bar' : 'Thin tube';
const under = ({ N }: InteractionRequest) => (N ? ` at N = ${N} kN` : '');

const elastic: Relation = ({ N, My, Mz }) =>
	Math.abs(N) / squash + Math.abs(My) / firstY + Math.abs(Mz) / firstZ;

/** my + ¾mz² while the neutral axis leaves by the sides, mz + ¾my² after. */
const biaxial: Relation = ({ My, Mz }) => {
	const [my, mz] = [Math.abs(My) / plasticY, Math.abs(Mz) / plasticZ];
	return mz <= 2 / 3 ? my + 0.75 * mz ** 2 : mz + 0.75 * my ** 2;
};

/** Solid circle: n from m by m = sin³α, n = 1 − (2α − sin 2α)/π. */
const round: Relation = ({ N, My }) => {
	const alpha = Math.asin(Math.min(1, Math.cbrt(Math.abs(My) / ((fy * 4 * 40 ** 3) / 3e6))));
	const n = 1 - (2 * alpha - Math.sin(2 * alpha)) / Math.PI;
	return 1 + Math.abs(N) / ((fy * Math.PI * 1600) / 1e3) - n;
};

const [outer, inner] = [1000, 999.99];
const wallSquash = (fy * Math.PI * (outer ** 2 - inner ** 2)) / 1e3;
const wallPlastic = (fy * 4 * (outer ** 3 - inner ** 3)) / 3e6;
const tube: Relation = ({ N, Mz }) =>
	1 + Math.abs(Mz) / wallPlastic - Math.cos((Math.PI * N) / (2 * wallSquash));

const firstYield = 'first-yield' as const;
const plastic = 'plastic' as const;

/** Curves whose every point has a formula (any text on plastic design). */
export const interactionForms: readonly ClosedForm[] = [
	form(
		'bar/plastic/N-My',
		'my + n² = 1',
		bar,
		{ limit: plastic, plane: 'N-My' },
		(p) => Math.abs(p.My) / plasticY + (p.N / squash) ** 2
	),
	form(
		'bar/plastic/N-Mz',
		'mz + n² = 1',
		bar,
		{ limit: plastic, plane: 'N-Mz' },
		(p) => Math.abs(p.Mz) / plasticZ + (p.N / squash) ** 2
	),
	...(['N-My', 'N-Mz', 'My-Mz'] as const).map((plane) =>
		form(`bar/first-yield/${plane}`, 'n + my + mz = 1', bar, { limit: firstYield, plane }, elastic)
	),
	form(
		'bar/first-yield/My-Mz/500',
		'n + my + mz = 1',
		bar,
		{ limit: firstYield, plane: 'My-Mz', N: 500 },
		(p) => elastic({ ...p, N: 500 })
	),
	{
		...form(
			'bar/plastic/My-Mz',
			'my + ¾·mz² = 1 while mz ≤ ⅔',
			bar,
			{ limit: plastic, plane: 'My-Mz', points: 120 },
			biaxial
		),
		tolerance: 5e-12
	},
	{
		...form(
			'round/plastic/N-My',
			'm = sin³α at n = 1 − (2α − sin 2α)/π',
			{ kind: 'round', d: 80, grade: fy },
			{ limit: plastic, plane: 'N-My' },
			round
		),
		...{ tolerance: 5e-8, why: 'α from m is ill-conditioned near full plastic' }
	},
	{
		...form(
			'tube/plastic/N-Mz',
			'm = cos(πn/2) in the limit',
			{ kind: 'circular-hollow', d: 2 * outer, t: 0.01, grade: fy },
			{ limit: plastic, plane: 'N-Mz' },
			tube
		),
		...{ tolerance: 5e-5, why: 'the wall is not infinitely thin' }
	}
];
