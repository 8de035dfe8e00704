import { describe, expect, it } from 'vitest';
import type { PlatesSection, SectionDefinition } from '../../section/definition';
import type { ClassifiedElement } from '../result';
import { elasticStress } from './stress-case';
import { classUnder, testModel } from './test-model';

const effects = [
	{ My: 60 },
	{ My: -60 },
	{ Mz: 8 },
	{ N: -150 },
	{ N: -150, My: 40 },
	{ N: 120, My: -40, Mz: 5 },
	{ N: -80, My: 20, Mz: -6 }
];

const welded = { fabrication: 'welded', weldLeg: 5, grade: 355 } as const;
const girder: SectionDefinition = {
	kind: 'i',
	...welded,
	h: 700,
	b: 220,
	tf: 14,
	bBottom: 300,
	tfBottom: 18,
	tw: 8
};
const sections: SectionDefinition[] = [
	girder,
	{ kind: 'tee', ...welded, h: 250, b: 200, tw: 9, tf: 14 },
	{ kind: 'channel', h: 300, b: 90, tw: 6, tf: 10, r: 8, grade: 355 },
	{ kind: 'angle', h: 150, b: 90, t: 9, r: 10, grade: 355 },
	{
		kind: 'rectangular-hollow',
		fabrication: 'cold-formed',
		h: 300,
		b: 150,
		t: 6,
		ro: 12,
		ri: 6,
		grade: 355
	},
	{ kind: 'circular-hollow', d: 320, t: 6, grade: 355 },
	{ kind: 'box', h: 600, b: 500, tw: 8, tfTop: 12, tfBottom: 14, webGap: 400, grade: 355 }
];

/** All lengths times a factor; strengths stay. */
function scaled(definition: SectionDefinition, factor: number): SectionDefinition {
	const kept = new Set(['grade', 'flangeSlopePercent']);
	return Object.fromEntries(
		Object.entries(definition).map(([name, value]) => [
			name,
			typeof value === 'number' && !kept.has(name) ? value * factor : value
		])
	) as unknown as SectionDefinition;
}

function expectSame(one: readonly ClassifiedElement[], other: readonly ClassifiedElement[]) {
	expect(other.map(({ type }) => type)).toEqual(one.map(({ type }) => type));
	one.forEach((row, i) => {
		const also = other[i]!;
		expect(also.class).toBe(row.class);
		expect(also.slenderness / row.slenderness).toBeCloseTo(1, 9);
		if (row.alpha !== undefined) expect(also.alpha).toBeCloseTo(row.alpha, 7);
		row.limits.forEach((limit, at) => expect(also.limits[at]! / limit).toBeCloseTo(1, 6));
	});
}

describe('classes do not change', () => {
	it.each(sections)('with the scale, forces grown alike: $kind', (definition) => {
		for (const factor of [1e-1, 50]) {
			for (const { N = 0, My = 0, Mz = 0 } of effects) {
				const grown = { N: N * factor ** 2, My: My * factor ** 3, Mz: Mz * factor ** 3 };
				const one = classUnder(definition, { N, My, Mz });
				const other = classUnder(scaled(definition, factor), grown);
				expect(other.overall).toBe(one.overall);
				expectSame(one.elements, other.elements);
			}
		}
	});

	it.each(sections.filter(({ kind }) => kind !== 'channel' && kind !== 'angle'))(
		'with the sense of Mz where left and right are alike: $kind',
		(definition) => {
			for (const { N = 0, My = 0, Mz = 0 } of effects) {
				const one = classUnder(definition, { N, My, Mz });
				const other = classUnder(definition, { N, My, Mz: -Mz });
				expect(other.overall).toBe(one.overall);
				expect(other.elements.map((row) => row.class).sort()).toEqual(
					one.elements.map((row) => row.class).sort()
				);
			}
		}
	);

	it('when an angle is seen in the mirror along its diagonal', () => {
		const angle = (h: number, b: number): SectionDefinition => ({
			kind: 'angle',
			h,
			b,
			t: 9,
			r: 10,
			grade: 355
		});
		for (const { N = 0, My = 0, Mz = 0 } of effects) {
			// Swapping y and z turns My into −Mz and Mz into −My.
			const one = classUnder(angle(150, 90), { N, My, Mz }).elements;
			const other = classUnder(angle(90, 150), { N, My: -Mz, Mz: -My }).elements;
			const at = (rows: typeof one, part: string, type: string) =>
				rows.find((row) => row.part === part && row.type === type);
			const [leg, swapped] = [
				at(one, 'verticalLeg', 'outstand'),
				at(other, 'horizontalLeg', 'outstand')
			];
			expect(swapped?.class).toBe(leg?.class);
			expect(swapped?.psi ?? 0).toBeCloseTo(leg?.psi ?? 0, 6);
		}
	});
});

/** The girder of the kind `i`, as three free plates. */
const asPlates = (y = 0, z = 0, factor = 1): PlatesSection => {
	const plate = (name: string, width: number, thickness: number, at: number, angle: number) => ({
		name,
		width: width * factor,
		thickness: thickness * factor,
		y: y + 150 * factor,
		z: z + at * factor,
		angle
	});
	return {
		kind: 'plates',
		plates: [
			plate('top', 220, 14, 693, 0),
			plate('web', 668, 8, 352, 90),
			plate('bottom', 300, 18, 9, 0)
		],
		joins: [
			{ a: 'top', b: 'web', weldLeg: 5 * factor },
			{ a: 'web', b: 'bottom', weldLeg: 5 * factor }
		],
		grade: 355
	};
};

describe('free plates', () => {
	it('in the shape of a girder have its classes, c, α, ψ and limits', () => {
		const names: Record<string, string> = { topFlange: 'top', bottomFlange: 'bottom', web: 'web' };
		for (const given of effects) {
			const [one, other] = [classUnder(girder, given), classUnder(asPlates(), given)];
			expect(other.overall).toBe(one.overall);
			for (const row of one.elements) {
				const also = other.elements.find(({ part }) => part === names[row.part]);
				expect(also).toMatchObject({ type: row.type, class: row.class });
				expect(also?.c).toBeCloseTo(row.c, 9);
				expect(also?.alpha ?? 0).toBeCloseTo(row.alpha ?? 0, 8);
				row.limits.forEach((limit, i) => expect((also?.limits[i] ?? 0) / limit).toBeCloseTo(1, 7));
			}
		}
	});

	it('keep their classes far from the origin', () => {
		for (const given of effects)
			expectSame(
				classUnder(asPlates(), given).elements,
				classUnder(asPlates(40_000, -25_000), given).elements
			);
	});

	it('take ε from the strongest plate that holds a stretch or that it is of', () => {
		const { plates, ...rest } = asPlates();
		const strong = plates.map((plate) => (plate.name === 'top' ? { ...plate, grade: 460 } : plate));
		const { elements } = classUnder({ ...rest, plates: strong }, { N: -1 });
		const epsilon = (part: string) => elements.find((row) => row.part === part)?.epsilon;
		expect(epsilon('top')).toBeCloseTo(Math.sqrt(235 / 460), 12);
		expect(epsilon('web')).toBeCloseTo(Math.sqrt(235 / 460), 12);
		expect(epsilon('bottom')).toBeCloseTo(Math.sqrt(235 / 355), 12);
	});
});

describe('elastic stress of an unsymmetric section', () => {
	it('is that about its principal axes', () => {
		const { section } = testModel({ kind: 'angle', h: 150, b: 90, t: 9, r: 10, grade: 355 });
		const { gross } = section;
		const turn = (gross.principalAngle * Math.PI) / 180;
		const [c, s] = [Math.cos(turn), Math.sin(turn)];
		const [N, My, Mz] = [-120, 7, -3];
		const value = elasticStress(gross, N, { N, My, Mz }, 1);
		for (const at of [
			{ y: 0, z: 0 },
			{ y: 90, z: 0 },
			{ y: 9, z: 150 }
		]) {
			const [dy, dz] = [at.y - gross.centroid.y, at.z - gross.centroid.z];
			const [along, over] = [dy * c + dz * s, dz * c - dy * s];
			const [Mu, Mv] = [(My * c + Mz * s) * 1e6, (Mz * c - My * s) * 1e6];
			const expected =
				(-N * 1e3) / gross.area +
				(Mu * over) / gross.secondMomentU -
				(Mv * along) / gross.secondMomentV;
			expect(value(at) / expected).toBeCloseTo(1, 9);
		}
	});
});
