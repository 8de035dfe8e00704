import type { SectionClass } from '../../../engine/rules/result';
import type { ProofSource, ProofValue } from '../check';
import { analysed, step } from './sections';

/** h, b, tw, tf, r in mm, as EN 10365 has them. */
type Sizes = readonly [h: number, b: number, tw: number, tf: number, r: number];

const beam = ([h, b, tw, tf, r]: Sizes, fy: number) =>
	({ kind: 'i', fabrication: 'rolled', ...{ h, b, tw, tf, r }, grade: fy }) as const;

const from = {
	standard: 'EN 1993-1-1:2005',
	fromMemory: true,
	memoryConfidence: null
} as const;

const catalogue = 'ArcelorMittal, Sections and Merchant Bars';

export const classColumns: ProofSource = {
	...from,
	family: 'classification',
	source: `${catalogue}: class columns`,
	clause: 'EN 1993-1-1:2005 Table 5.2'
};

export const shearAreaColumn: ProofSource = {
	...from,
	family: 'shear',
	source: `${catalogue}: column Avz`,
	clause: 'EN 1993-1-1:2005 6.2.6(3)'
};

const bending: readonly [name: string, sizes: Sizes, expected: SectionClass][] = [
	['HE 160 A', [152, 160, 6, 9, 15], 1],
	['HE 180 A', [171, 180, 6, 9.5, 15], 2],
	['HE 200 A', [190, 200, 6.5, 10, 18], 2],
	['HE 220 A', [210, 220, 7, 11, 18], 2],
	['HE 240 A', [230, 240, 7.5, 12, 21], 2],
	['HE 260 A', [250, 260, 7.5, 12.5, 24], 3],
	['HE 280 A', [270, 280, 8, 13, 24], 3],
	['HE 300 A', [290, 300, 8.5, 14, 27], 3],
	['HE 320 A', [310, 300, 9, 15.5, 27], 2],
	['HE 340 A', [330, 300, 9.5, 16.5, 27], 1],
	['HE 300 B', [300, 300, 11, 19, 27], 1]
];

const compression: readonly [
	name: string,
	sizes: Sizes,
	mild: SectionClass,
	strong: SectionClass
][] = [
	['IPE 200', [200, 100, 5.6, 8.5, 12], 1, 2],
	['IPE 240', [240, 120, 6.2, 9.8, 15], 1, 2],
	['IPE 270', [270, 135, 6.6, 10.2, 15], 2, 3],
	['IPE 300', [300, 150, 7.1, 10.7, 15], 2, 4],
	['IPE 400', [400, 180, 8.6, 13.5, 21], 3, 4],
	['IPE 500', [500, 200, 10.2, 16, 21], 3, 4],
	['IPE 600', [600, 220, 12, 19, 24], 4, 4]
];

const shearAreas: readonly [name: string, sizes: Sizes, expected: number][] = [
	['IPE 300', [300, 150, 7.1, 10.7, 15], 25.68],
	['HE 300 A', [290, 300, 8.5, 14, 27], 37.28],
	['HE 300 B', [300, 300, 11, 19, 27], 47.43]
];

function classValue(
	[name, sizes]: readonly [string, Sizes, ...unknown[]],
	fy: 235 | 355,
	act: 'plusMy' | 'compression',
	published: SectionClass
): ProofValue {
	const words = act === 'plusMy' ? 'bent about y–y' : 'in compression';
	return {
		id: `classes/${name}/S${fy}/${act}`,
		case: `${name}, S${fy}, ${words}`,
		quantity: 'class of the section',
		unit: '',
		published,
		ours: analysed(beam(sizes, fy)).classification?.byCase[act] ?? null,
		tolerance: { kind: 'exact' }
	};
}

/** Classes printed in the producer's catalogue. */
export const classValues = (): ProofValue[] => [
	...bending.map((row) => classValue(row, 355, 'plusMy', row[2])),
	...compression.flatMap((row) => [
		classValue(row, 235, 'compression', row[2]),
		classValue(row, 355, 'compression', row[3])
	])
];

/** Shear areas printed there; η = 1 as the table has it. */
export const shearAreaValues = (): ProofValue[] =>
	shearAreas.map(([name, sizes, published]) => {
		const analysis = analysed(beam(sizes, 235), { code: { eta: 1 }, explain: true });
		const area = step(analysis, 'shear.z.area');
		return {
			...{ id: `shear-area/${name}`, case: `${name}, η = 1`, quantity: 'Av,z', unit: 'cm²' },
			published,
			ours: area === null ? null : area / 100,
			tolerance: { kind: 'absolute', value: 0.01, why: 'a unit of the last digit printed' }
		};
	});
