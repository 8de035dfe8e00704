import { describe, expect, it } from 'vitest';
import type { Ring, SectionDefinition } from '../../src/lib/engine/section/definition';
import { prepareSection } from '../../src/lib/engine/section/prepare';
import {
	numericalTorsion,
	type NumericalTorsion
} from '../../src/lib/engine/section/torsion/numerical';

const grade = 235;

function solved(definition: SectionDefinition): NumericalTorsion {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	const torsion = numericalTorsion(section.value);
	if (!('nodes' in torsion)) throw new Error(torsion.notes.map(({ message }) => message).join(' '));
	return torsion;
}

const outline = (outer: Ring, ...holes: Ring[]): SectionDefinition => ({
	kind: 'outline',
	outer,
	...(holes.length > 0 ? { holes } : {}),
	grade
});

const rectangle = (left: number, bottom: number, right: number, top: number): Ring => [
	[left, bottom],
	[right, bottom],
	[right, top],
	[left, top]
];

const curve = (count: number, at: (angle: number) => readonly [number, number]): Ring =>
	Array.from({ length: count }, (_, i) => at((2 * Math.PI * i) / count));

function expectWithin(value: number | null, expected: number, share: number): void {
	expect(value).not.toBeNull();
	expect(Math.abs(value! / expected - 1)).toBeLessThan(share);
}

describe('torsion constants of solid bars (Timoshenko & Goodier, Theory of Elasticity)', () => {
	it('square: 0.140577 a⁴ (art. 109, the series summed)', () =>
		expectWithin(
			solved({ kind: 'flat', b: 100, h: 100, grade }).torsionConstant,
			0.140577e8,
			1e-3
		));

	it.each([1.2, 2, 5, 20, 200])('rectangle of ratio %d: the series of art. 109', (ratio) => {
		const short = 10;
		const long = ratio * short;
		let sum = 0;
		for (let n = 1; n < 200; n += 2) sum += Math.tanh((n * Math.PI * long) / (2 * short)) / n ** 5;
		const expected = long * short ** 3 * (1 / 3 - (64 / Math.PI ** 5) * (short / long) * sum);
		const { torsionConstant, error } = solved({ kind: 'flat', b: long, h: short, grade });
		expectWithin(torsionConstant, expected, 1e-3);
		expect(error.torsionBelow).toBeLessThan(expected * (1 + 1e-9));
		expect(error.torsionAbove).toBeGreaterThan(expected * (1 - 1e-9));
	});

	it('ellipse: πa³b³/(a² + b²) (art. 106), drawn with 400 corners', () => {
		const [a, b] = [100, 50];
		const ellipse = curve(400, (t) => [a * Math.cos(t), b * Math.sin(t)]);
		const expected = (Math.PI * a ** 3 * b ** 3) / (a * a + b * b);
		expectWithin(solved(outline(ellipse)).torsionConstant, expected, 1e-3);
	});

	it('equilateral triangle: √3 a⁴/80 (art. 106)', () => {
		const a = 100;
		const triangle: Ring = [
			[0, 0],
			[a, 0],
			[a / 2, (a * Math.sqrt(3)) / 2]
		];
		const { torsionConstant, shearCentre } = solved(outline(triangle));
		expectWithin(torsionConstant, (Math.sqrt(3) * a ** 4) / 80, 1e-3);
		expect(shearCentre!.y).toBeCloseTo(a / 2, 1);
		expect(shearCentre!.z).toBeCloseTo(a / (2 * Math.sqrt(3)), 1);
	});

	it('round bar and tube: the polar second moment, and no warping (art. 101)', () => {
		const bar = solved({ kind: 'round', d: 60, grade });
		expectWithin(bar.torsionConstant, (Math.PI * 60 ** 4) / 32, 1e-3);
		expect(bar.warpingConstant).toBeLessThan(1e-9 * 60 ** 6);
		const tube = solved({ kind: 'circular-hollow', d: 219.1, t: 10, grade });
		expectWithin(tube.torsionConstant, (Math.PI / 32) * (219.1 ** 4 - 199.1 ** 4), 1e-5);
		expect(tube.warpingConstant).toBeLessThan(1e-9 * 219.1 ** 6);
	});
});

describe('torsion constants of rolled sections with their true root radii', () => {
	it('IPE 300: 19.76 cm⁴ (exact solution by other means); its table prints 20.1 from a fillet formula', () => {
		const { torsionConstant, error } = solved({
			kind: 'i',
			h: 300,
			b: 150,
			tw: 7.1,
			tf: 10.7,
			r: 15,
			fabrication: 'rolled',
			grade
		});
		expectWithin(torsionConstant, 19.76e4, 5e-3);
		expect(error.torsionShare).toBeLessThan(1e-3);
	});
});

describe('thin open sections (Timoshenko & Gere, Theory of Elastic Stability, table A-1)', () => {
	// middle-line sizes; walls of a hundredth of the width
	const [h, b, t] = [200, 100, 1];

	it('channel: e = 3b²/(h + 6b), Iw = tb³h²/12 · (3b + 2h)/(6b + h), J = Σst³/3', () => {
		const { torsionConstant, warpingConstant, shearCentre } = solved({
			kind: 'channel',
			h: h + t,
			b: b + t / 2,
			tw: t,
			tf: t,
			grade
		});
		expectWithin(torsionConstant, ((2 * b + h) * t ** 3) / 3, 1e-2);
		expectWithin(
			warpingConstant,
			((t * b ** 3 * h ** 2) / 12) * ((3 * b + 2 * h) / (6 * b + h)),
			1e-2
		);
		expectWithin(t / 2 - shearCentre!.y, (3 * b * b) / (h + 6 * b), 1e-2);
		expect(shearCentre!.z).toBeCloseTo((h + t) / 2, 2);
	});

	it('Z: Iw = b³h²t/12 · (2(b² + bh + h²) + 3bh)/(2b + h)², shear centre in the middle of the web', () => {
		const half = t / 2;
		const z = outline([
			[-half, half - h / 2],
			[-b, half - h / 2],
			[-b, -half - h / 2],
			[half, -half - h / 2],
			[half, h / 2 - half],
			[b, h / 2 - half],
			[b, h / 2 + half],
			[-half, h / 2 + half]
		]);
		const { warpingConstant, shearCentre } = solved(z);
		const shape = (2 * (b * b + b * h + h * h) + 3 * b * h) / (2 * b + h) ** 2;
		expectWithin(warpingConstant, ((b ** 3 * h ** 2 * t) / 12) * shape, 1e-2);
		expect(Math.hypot(shearCentre!.y, shearCentre!.z)).toBeLessThan(1e-2 * h);
	});

	it('I: Iw = tb³h²/24', () => {
		const { warpingConstant } = solved({
			kind: 'i',
			h: h + t,
			b,
			tw: t,
			tf: t,
			fabrication: 'welded',
			grade
		});
		expectWithin(warpingConstant, (t * b ** 3 * h ** 2) / 24, 1e-2);
	});

	it(
		'slit tube: J = 2πRt³/3, e = 2R from the middle, Iw = 2tR⁵/3 · (π³ − 6π)',
		{ timeout: 30_000 },
		() => {
			const [R, wall, slit, sides] = [100, 1, 1e-3, 90];
			const arc = (radius: number, back: boolean): Ring => {
				const points = Array.from({ length: sides + 1 }, (_, i) => {
					const angle = slit + ((2 * Math.PI - 2 * slit) * i) / sides;
					return [radius * Math.cos(angle), radius * Math.sin(angle)] as const;
				});
				return back ? points.reverse() : points;
			};
			const { torsionConstant, warpingConstant, shearCentre } = solved(
				outline([...arc(R + wall / 2, false), ...arc(R - wall / 2, true)])
			);
			expectWithin(torsionConstant, (2 * Math.PI * R * wall ** 3) / 3, 1e-2);
			expectWithin(-shearCentre!.y, 2 * R, 1e-2);
			expectWithin(warpingConstant, ((2 * wall * R ** 5) / 3) * (Math.PI ** 3 - 6 * Math.PI), 1e-2);
		}
	);
});

describe('thin closed sections (Bredt 1896; Megson, Aircraft Structures, closed and multi-cell tubes)', () => {
	it('rectangular box: J = 4A²/∮ds/t, and Iw from corners warping by b/2 · (h/2 − A/∮ds/t · 2/tf)', () => {
		const [b, h, tf, tw] = [200, 300, 3, 2];
		const box = outline(
			rectangle(-b / 2 - tw / 2, -h / 2 - tf / 2, b / 2 + tw / 2, h / 2 + tf / 2),
			rectangle(-b / 2 + tw / 2, -h / 2 + tf / 2, b / 2 - tw / 2, h / 2 - tf / 2)
		);
		const round = (2 * b) / tf + (2 * h) / tw;
		const { torsionConstant, warpingConstant, shearCentre } = solved(box);
		expectWithin(torsionConstant, (4 * (b * h) ** 2) / round, 1e-2);
		const corner = (b / 2) * (h / 2 - (2 * b * h) / round / tf);
		expectWithin(warpingConstant, (corner ** 2 * (2 * b * tf + 2 * h * tw)) / 3, 1e-2);
		expect(Math.hypot(shearCentre!.y, shearCentre!.z)).toBeLessThan(0.1);
	});

	it('two cells side by side: J = 4 Aᵀ M⁻¹ A of the flow matrix', () => {
		// cells a × h and b × h with walls of one thickness: M = [[2(a+h), −h], [−h, 2(b+h)]]/t
		const [a, b, h, t] = [300, 150, 200, 2];
		const two = outline(
			rectangle(-t / 2, -t / 2, a + b + t / 2, h + t / 2),
			rectangle(t / 2, t / 2, a - t / 2, h - t / 2),
			rectangle(a + t / 2, t / 2, a + b - t / 2, h - t / 2)
		);
		const [A1, A2] = [a * h, b * h];
		const [m11, m12, m22] = [(2 * (a + h)) / t, -h / t, (2 * (b + h)) / t];
		const inverse = m11 * m22 - m12 * m12;
		const expected = (4 * (m22 * A1 * A1 - 2 * m12 * A1 * A2 + m11 * A2 * A2)) / inverse;
		expectWithin(solved(two).torsionConstant, expected, 1e-2);
	});
});
