import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../definition';
import { prepareSection } from '../prepare';
import { rectangleTorsion } from './bars';

function gross(definition: SectionDefinition) {
	const result = prepareSection(definition);
	if (!result.ok) throw new Error(result.error.map(({ message }) => message).join(' '));
	return result.value.gross;
}

const grade = 235;

describe('torsion of bars (Timoshenko & Goodier, art. 109, table of k₁)', () => {
	it.each([
		[1, 0.1406],
		[1.2, 0.166],
		[1.5, 0.196],
		[2, 0.229],
		[3, 0.263],
		[5, 0.291],
		[10, 0.312]
	])('rectangle of ratio %d has J = %d a b³', (ratio, k) => {
		const digits = ratio === 1 ? 4 : 3;
		expect(rectangleTorsion(ratio, 1) / ratio).toBeCloseTo(k, digits);
		expect(rectangleTorsion(1, ratio)).toBe(rectangleTorsion(ratio, 1));
	});

	it('round bar: the polar second moment', () => {
		const bar = gross({ kind: 'round', d: 60, grade });
		expect(bar.torsionConstant).toBeCloseTo(bar.secondMomentY + bar.secondMomentZ, 4);
	});
});

describe('torsion of tubes and boxes', () => {
	it('a round tube has the polar second moment', () => {
		const tube = gross({ kind: 'circular-hollow', d: 219.1, t: 10, grade });
		expect(tube.torsionConstant! / (tube.secondMomentY + tube.secondMomentZ)).toBeCloseTo(1, 12);
	});

	it('a square box of even walls has a³t to the middle line (Bredt)', () => {
		const box = gross({
			kind: 'box',
			h: 510,
			b: 510,
			tw: 10,
			tfTop: 10,
			tfBottom: 10,
			webGap: 490,
			grade
		});
		expect(box.torsionConstant! / (500 ** 3 * 10)).toBeCloseTo(1, 12);
		expect(box.shearCentre).toEqual({ y: 255, z: 255 });
		expect(box.warpingConstant).toBeNull();
	});

	it('a box of unequal flanges is given no shear centre', () => {
		const box = gross({
			kind: 'box',
			h: 510,
			b: 510,
			tw: 10,
			tfTop: 10,
			tfBottom: 20,
			webGap: 490,
			grade
		});
		expect(box.shearCentre).toBeNull();
	});
});

describe('warping and shear centre of open shapes', () => {
	it('equal flanges: tf b³(h − tf)²/24, shear centre at the middle', () => {
		const i = gross({ kind: 'i', h: 300, b: 150, tw: 7, tf: 10, fabrication: 'welded', grade });
		expect(i.warpingConstant! / ((10 * 150 ** 3 * 290 ** 2) / 24)).toBeCloseTo(1, 12);
		expect(i.shearCentre?.z).toBeCloseTo(150, 10);
	});

	it('the shear centre of unequal flanges lies near the larger and turns over with the section', () => {
		const base = { kind: 'i', h: 300, tw: 7, fabrication: 'welded', grade } as const;
		const up = gross({ ...base, b: 200, tf: 12, bBottom: 100, tfBottom: 10 });
		const down = gross({ ...base, b: 100, tf: 10, bBottom: 200, tfBottom: 12 });
		expect(up.shearCentre!.z).toBeGreaterThan(250);
		expect(up.shearCentre!.z + down.shearCentre!.z).toBeCloseTo(300, 9);
		expect(up.warpingConstant).toBeCloseTo(down.warpingConstant!, 0);
	});

	it('a thin channel tends to e = 3b²tf/(6b tf + h tw) from its web (Timoshenko & Gere)', () => {
		const [h, b, t] = [200, 80, 0.02];
		const thin = gross({ kind: 'channel', h: h + t, b: b + t / 2, tw: t, tf: t, grade });
		const e = (3 * b * b) / (6 * b + h);
		expect(thin.shearCentre!.y).toBeCloseTo(t / 2 - e, 2);
		const warping = ((t * b ** 3 * h ** 2) / 12) * ((3 * b + 2 * h) / (6 * b + h));
		expect(thin.warpingConstant! / warping).toBeCloseTo(1, 3);
	});

	it('a tee and an angle have it where their middle lines cross', () => {
		const tee = gross({ kind: 'tee', h: 150, b: 150, tw: 8, tf: 12, fabrication: 'rolled', grade });
		expect(tee.shearCentre).toEqual({ y: 75, z: 144 });
		const angle = gross({ kind: 'angle', h: 100, b: 75, t: 10, grade });
		expect(angle.shearCentre).toEqual({ y: 5, z: 5 });
	});
});

describe('torsion of rolled and welded shapes', () => {
	it('a welded I counts no more than its rectangles, a rolled one adds its junctions', () => {
		const sizes = { kind: 'i', h: 300, b: 150, tw: 7.1, tf: 10.7, grade } as const;
		const welded = gross({ ...sizes, fabrication: 'welded' }).torsionConstant!;
		const rolled = gross({ ...sizes, r: 15, fabrication: 'rolled' }).torsionConstant!;
		expect(welded).toBeLessThan((2 * 150 * 10.7 ** 3 + 278.6 * 7.1 ** 3) / 3);
		expect(rolled).toBeGreaterThan(welded);
	});

	it('free plates are given figures where they are thin walls, and are told why where not', () => {
		const web = (width: number) => ({ name: 'web', width, thickness: 8, y: 0, z: 0, angle: 90 });
		const tee = (width: number) =>
			prepareSection({
				kind: 'plates',
				grade,
				plates: [
					{ name: 'flange', width: 100, thickness: 8, y: 0, z: width / 2 + 4, angle: 0 },
					web(width)
				]
			});
		const codes = (section: ReturnType<typeof tee>) =>
			section.ok ? section.value.notes.map(({ code }) => code) : [];
		const [thin, stocky] = [tee(100), tee(36)];
		expect(thin.ok && thin.value.gross.shearCentre!.z).toBeCloseTo(54, 9);
		expect(codes(thin)).not.toContain('torsion-not-covered');
		expect(stocky.ok && stocky.value.gross.torsionConstant).toBeNull();
		expect(codes(stocky)).toContain('torsion-not-covered');
	});
});
