import { describe, expect, it } from 'vitest';
import type { Plate, PlatesSection, SectionDefinition } from '../../section/definition';
import { prepareSection } from '../../section/prepare';
import { analyse } from '../analyse';
import type { Demand } from '../result';

function analysed(definition: SectionDefinition, demands: Demand[] = []) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	return analyse(section.value, { code: { eta: 1 }, demands });
}

const plate = (
	name: string,
	[y, z]: readonly [number, number],
	[width, thickness]: readonly [number, number],
	angle: number
): Plate => ({ name, y, z, width, thickness, angle });

/** Repeatable numbers from 0 to 1 (Park and Miller 1988). */
function numbers(seed: number) {
	let at = seed;
	return () => (at = (at * 48_271) % 2_147_483_647) / 2_147_483_647;
}

const next = numbers(20_261);
const size = (least: number, most: number) => least + (most - least) * next();

interface Pair {
	readonly name: string;
	readonly kind: SectionDefinition;
	readonly plates: PlatesSection;
}

const together = (plates: readonly Plate[], fy: number): PlatesSection => ({
	kind: 'plates',
	grade: fy,
	plates
});

function iPair(): Pair {
	const [h, b, bBottom, fy] = [size(250, 1200), size(100, 400), size(100, 400), size(235, 460)];
	const [tw, tf, tfBottom] = [size(5, 30), size(8, 40), size(8, 40)];
	const hw = h - tf - tfBottom;
	return {
		name: 'I',
		kind: { kind: 'i', fabrication: 'welded', h, b, bBottom, tw, tf, tfBottom, grade: fy },
		plates: together(
			[
				plate('topFlange', [0, h - tf / 2], [b, tf], 0),
				plate('web', [0, tfBottom + hw / 2], [hw, tw], 90),
				plate('bottomFlange', [0, tfBottom / 2], [bBottom, tfBottom], 0)
			],
			fy
		)
	};
}

function teePair(): Pair {
	const [h, b, fy] = [size(100, 300), size(100, 400), size(235, 460)];
	const [tw, tf] = [size(8, 30), size(8, 30)];
	return {
		name: 'tee',
		kind: { kind: 'tee', fabrication: 'welded', h, b, tw, tf, grade: fy },
		plates: together(
			[
				plate('flange', [0, h - tf / 2], [b, tf], 0),
				plate('web', [0, (h - tf) / 2], [h - tf, tw], 90)
			],
			fy
		)
	};
}

function boxPair(): Pair {
	const [h, webGap, fy] = [size(250, 900), size(150, 500), size(235, 460)];
	const [tw, tf] = [size(6, 25), size(8, 40)];
	const b = webGap + 2 * tw + size(20, 100);
	const hw = h - 2 * tf;
	const side = (webGap + tw) / 2;
	return {
		name: 'box',
		kind: { kind: 'box', h, b, tw, tfTop: tf, tfBottom: tf, webGap, grade: fy },
		plates: together(
			[
				plate('topFlange', [0, h - tf / 2], [b, tf], 0),
				plate('leftWeb', [-side, h / 2], [hw, tw], 90),
				plate('rightWeb', [side, h / 2], [hw, tw], 90),
				plate('bottomFlange', [0, tf / 2], [b, tf], 0)
			],
			fy
		)
	};
}

const pairs = [iPair, teePair, boxPair].flatMap((pair) => Array.from({ length: 25 }, () => pair()));

describe('welded sections entered as plates', () => {
	it('have the classes and the moments of their kind where the rules are the same', () => {
		for (const { name, kind, plates } of pairs) {
			const [own, free] = [analysed(kind), analysed(plates)];
			const said = `${name} ${JSON.stringify(kind)}`;
			expect(free.classification?.byCase, said).toEqual(own.classification?.byCase);
			for (const figure of ['MyRd', 'MyRdNegative', 'MzRd', 'NRd', 'NtRd'] as const) {
				const [a, b] = [free.resistance![figure], own.resistance![figure]];
				if (a === null || b === null) continue;
				expect(a / b, `${said} ${figure}`).toBeLessThan(1 + 1e-9);
				const sameRule = own.resistance!.basis !== 'effective-class-2' && name !== 'box';
				if (sameRule) expect(a / b, `${said} ${figure}`).toBeGreaterThan(1 - 1e-9);
			}
		}
	});

	it('never use less than their kind', () => {
		for (const { name, kind, plates } of pairs) {
			const own = analysed(kind);
			const { MyRd, VzRd } = own.resistance!;
			if (!MyRd || !VzRd) continue;
			for (const [m, v] of [
				[0.5, 0.3],
				[0.6, 0.7],
				[0.9, 0.9]
			] as const) {
				const demand = { My: m * MyRd, Vz: v * VzRd };
				const [a, b] = [kind, plates].map((one) => analysed(one, [demand]).demands[0]!);
				const said = `${name} ${JSON.stringify(kind)} ${JSON.stringify(demand)}`;
				if (a!.utilisation !== null && b!.utilisation !== null)
					expect(b!.utilisation, said).toBeGreaterThan(a!.utilisation * (1 - 1e-9));
				if (a!.countable !== null && b!.countable !== null)
					expect(b!.countable, said).toBeLessThan(a!.countable * (1 + 1e-9) + 1e-9);
			}
		}
	});

	it('a narrow flange holds its web: h 1352, flanges 410 and 254 × 32.3, as kind i class 1', () => {
		const [h, b, bBottom, t] = [1352.117, 409.76, 253.708, 32.2596];
		const kind: SectionDefinition = {
			kind: 'i',
			fabrication: 'welded',
			h,
			b,
			bBottom,
			tw: t,
			tf: t,
			grade: 355,
			partGrades: { web: 460 }
		};
		const plates: PlatesSection = {
			kind: 'plates',
			grade: 355,
			plates: [
				plate('topFlange', [0, h - t / 2], [b, t], 0),
				{ ...plate('web', [0, h / 2], [h - 2 * t, t], 90), grade: 460 },
				plate('bottomFlange', [0, t / 2], [bBottom, t], 0)
			]
		};
		const [free, own] = [analysed(plates), analysed(kind)];
		expect(own.classification?.byCase).toEqual(free.classification?.byCase);
		expect(free.resistance!.MyRdNegative! / own.resistance!.MyRdNegative!).toBeCloseTo(1, 9);
		expect(free.notes.map(({ code }) => code)).not.toContain('stiffener-too-weak');
		expect(free.classification?.byCase.plusMy).toBe(1);
	});
});
