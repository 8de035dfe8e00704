import type { SectionDefinition } from '../../../engine/section/definition';
import { numericalTorsion, type NumericalTorsion } from '../../../engine/section/torsion/numerical';
import { built } from '../examples/sections';
import type { ClosedForm } from './closed-form';

const grade = 235;
interface Accuracy {
	readonly tolerance: number;
	readonly why: string;
}

const mesh: Accuracy = { tolerance: 1e-3, why: 'solved on a mesh of quadratic triangles' };
const thin: Accuracy = { tolerance: 1e-2, why: 'the formula is of infinitely thin walls' };

function solved(definition: SectionDefinition): NumericalTorsion | null {
	const torsion = numericalTorsion(built(definition));
	return 'nodes' in torsion ? torsion : null;
}

type Read = (torsion: NumericalTorsion) => number | null | undefined;

interface Figure {
	readonly quantity: string;
	readonly unit: string;
	readonly formula: string;
	readonly value: number;
	readonly read: Read;
}

/** Figures of one solved section; it is solved once. */
function figures(
	id: string,
	topic: string,
	definition: SectionDefinition,
	accuracy: Accuracy,
	list: readonly Figure[]
): ClosedForm[] {
	let solution: NumericalTorsion | null | undefined;
	const once = () => (solution === undefined ? (solution = solved(definition)) : solution);
	return list.map(({ read, ...figure }) => ({
		...{ id: `torsion/${id}/${figure.quantity}`, topic, case: id, ...figure, ...accuracy },
		ours: () => {
			const torsion = once();
			return (torsion && read(torsion)) ?? null;
		}
	}));
}

const constant = (formula: string, value: number): Figure => ({
	...{ quantity: 'torsion constant', unit: 'mm⁴', formula, value },
	read: ({ torsionConstant }) => torsionConstant
});
const warping = (formula: string, value: number): Figure => ({
	...{ quantity: 'warping constant', unit: 'mm⁶', formula, value },
	read: ({ warpingConstant }) => warpingConstant
});

const goodier = 'Solid bars (Timoshenko & Goodier, Theory of Elasticity)';
const gere = 'Thin open sections (Timoshenko & Gere, Theory of Elastic Stability, table A-1)';
const bredt = 'Thin closed sections (Bredt 1896)';

/** Series of art. 109 for a rectangle. */
function rectangle(long: number, short: number): number {
	let sum = 0;
	for (let n = 1; n < 200; n += 2) sum += Math.tanh((n * Math.PI * long) / (2 * short)) / n ** 5;
	return long * short ** 3 * (1 / 3 - (64 / Math.PI ** 5) * (short / long) * sum);
}

const solid: readonly ClosedForm[] = [
	...figures('Square 100', goodier, { kind: 'flat', b: 100, h: 100, grade }, mesh, [
		constant('0.140577·a⁴ (art. 109)', 0.140577e8)
	]),
	...[1.2, 2, 5, 20, 200].flatMap((ratio) =>
		figures(
			`Rectangle ${10 * ratio}×10`,
			goodier,
			{ kind: 'flat', b: 10 * ratio, h: 10, grade },
			mesh,
			[constant('the series of art. 109', rectangle(10 * ratio, 10))]
		)
	),
	...figures(
		'Equilateral triangle, side 100',
		goodier,
		{
			kind: 'outline',
			outer: [
				[0, 0],
				[100, 0],
				[50, 50 * Math.sqrt(3)]
			],
			grade
		},
		mesh,
		[constant('√3·a⁴/80 (art. 106)', (Math.sqrt(3) * 100 ** 4) / 80)]
	),
	...figures('Round bar 60', goodier, { kind: 'round', d: 60, grade }, mesh, [
		constant('πd⁴/32 (art. 101)', (Math.PI * 60 ** 4) / 32)
	]),
	...figures(
		'Tube 219.1×10',
		goodier,
		{ kind: 'circular-hollow', d: 219.1, t: 10, grade },
		{ ...mesh, tolerance: 1e-5 },
		[constant('π(D⁴ − d⁴)/32 (art. 101)', (Math.PI / 32) * (219.1 ** 4 - 199.1 ** 4))]
	)
];

// sizes of the middle lines; walls of a hundredth of the width
const [h, b, t] = [200, 100, 1];

const open: readonly ClosedForm[] = [
	...figures(
		'Channel 200×100×1 (middle lines)',
		gere,
		{ kind: 'channel', h: h + t, b: b + t / 2, tw: t, tf: t, grade },
		thin,
		[
			constant('Σst³/3', ((2 * b + h) * t ** 3) / 3),
			warping(
				't·b³·h²/12·(3b + 2h)/(6b + h)',
				((t * b ** 3 * h ** 2) / 12) * ((3 * b + 2 * h) / (6 * b + h))
			),
			{
				...{ quantity: 'shear centre behind the web', unit: 'mm', formula: '3b²/(h + 6b)' },
				value: (3 * b * b) / (h + 6 * b),
				read: ({ shearCentre }) => shearCentre && t / 2 - shearCentre.y
			}
		]
	),
	...figures(
		'I 200×100×1 (middle lines)',
		gere,
		{ kind: 'i', fabrication: 'welded', h: h + t, b, tw: t, tf: t, grade },
		thin,
		[warping('t·b³·h²/24', (t * b ** 3 * h ** 2) / 24)]
	)
];

const [boxB, boxH, boxTf, boxTw] = [200, 300, 3, 2];
const round = (2 * boxB) / boxTf + (2 * boxH) / boxTw;
const corner = (boxB / 2) * (boxH / 2 - (2 * boxB * boxH) / round / boxTf);
const [y, z] = [boxB / 2, boxH / 2];
const ring = (dy: number, dz: number) =>
	[
		[-y - dy, -z - dz],
		[y + dy, -z - dz],
		[y + dy, z + dz],
		[-y - dy, z + dz]
	] as const;

const closed: readonly ClosedForm[] = figures(
	'Box 200×300, walls 3 and 2 (middle lines)',
	bredt,
	{
		kind: 'outline',
		outer: ring(boxTw / 2, boxTf / 2),
		holes: [ring(-boxTw / 2, -boxTf / 2)],
		grade
	},
	thin,
	[
		constant('4A²/∮ds/t', (4 * (boxB * boxH) ** 2) / round),
		warping(
			'corners warp by b/2·(h/2 − A/∮ds/t·2/tf)',
			(corner ** 2 * (2 * boxB * boxTf + 2 * boxH * boxTw)) / 3
		)
	]
);

/** Torsion by elements against what is known of simple shapes. */
export const torsionForms: readonly ClosedForm[] = [...solid, ...open, ...closed];
