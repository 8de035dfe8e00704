import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Plate, PlatesSection } from '../definition';
import { prepareSection } from '../prepare';
import { platePresets } from './presets';
import { plateStretches } from './stretches';

const placed = (
	definition: PlatesSection,
	{ dy, dz, turn, mirror }: { dy: number; dz: number; turn: number; mirror: boolean }
): PlatesSection => {
	const [c, s] = [Math.cos((turn * Math.PI) / 180), Math.sin((turn * Math.PI) / 180)];
	const place = (one: Plate): Plate => {
		const y = mirror ? -one.y : one.y;
		const angle = (mirror ? 180 - one.angle : one.angle) + turn;
		return { ...one, y: dy + y * c - one.z * s, z: dz + y * s + one.z * c, angle };
	};
	return { ...definition, plates: definition.plates.map(place) };
};

/** What must not change: plates, kind, thickness, clear width and holders of every stretch, in one order. */
const told = (definition: PlatesSection): string[] =>
	plateStretches(definition)
		.stretches!.map(({ plate, type, thickness, from, to, heldBy }) =>
			[
				plate,
				type,
				thickness,
				Math.hypot(to.y - from.y, to.z - from.z).toFixed(4),
				...[...heldBy].sort()
			].join(' ')
		)
		.sort();

const preset = fc.constantFrom(...platePresets.map(({ section }) => section({}, 355)));
const move = fc.record({
	dy: fc.double({ min: -1e5, max: 1e5, noNaN: true }),
	dz: fc.double({ min: -1e5, max: 1e5, noNaN: true }),
	turn: fc.double({ min: -360, max: 360, noNaN: true }),
	mirror: fc.boolean()
});

const near = (a: number, b: number) => expect(Math.abs(a / b - 1)).toBeLessThan(1e-8);
function gross(definition: PlatesSection) {
	const prepared = prepareSection(definition);
	if (!prepared.ok) throw new Error(prepared.error[0]!.message);
	return prepared.value.gross;
}

describe('stretches of plates', () => {
	it('stay the same when the section is moved, turned and mirrored', () => {
		fc.assert(
			fc.property(preset, move, (section, to) => {
				expect(told(placed(section, to))).toEqual(told(section));
			}),
			{ numRuns: 100 }
		);
	});

	it('do not mind the order of the plates', () => {
		fc.assert(
			fc.property(preset, fc.infiniteStream(fc.nat(1000)), (section, keys) => {
				const order = new Map(section.plates.map((one) => [one, keys.next().value as number]));
				const plates = [...section.plates].sort((a, b) => order.get(a)! - order.get(b)!);
				expect(told({ ...section, plates })).toEqual(told(section));
			}),
			{ numRuns: 60 }
		);
	});

	it('and gross values stay the same when a plate is cut in two along its length', () => {
		fc.assert(
			fc.property(
				preset,
				fc.nat(50),
				fc.double({ min: 0.2, max: 0.8, noNaN: true }),
				(section, k, share) => {
					const which = k % section.plates.length;
					const one = section.plates[which]!;
					const radians = (one.angle * Math.PI) / 180;
					const part = (name: string, from: number, to: number): Plate => {
						const off = ((from + to) / 2 - 0.5) * one.width;
						const [y, z] = [one.y + off * Math.cos(radians), one.z + off * Math.sin(radians)];
						return { ...one, name, width: (to - from) * one.width, y, z };
					};
					const others = section.plates.filter((_, i) => i !== which);
					const cut = {
						...section,
						plates: [...others, part(one.name, 0, share), part('rest', share, 1)]
					};
					const widths = (list: string[]) =>
						list.map((row) => row.split(' ').slice(1, 4).join(' ')).sort();
					expect(widths(told(cut))).toEqual(widths(told(section)));
					const [a, b] = [gross(cut), gross(section)];
					near(a.area, b.area);
					near(a.secondMomentU, b.secondMomentU);
					near(a.plasticModulusY, b.plasticModulusY);
					near(a.perimeter, b.perimeter);
				}
			),
			{ numRuns: 60 }
		);
	});

	it('of a box with 36 stiffeners are those of its 38 panels and 36 stiffeners', () => {
		const box = platePresets.find(({ id }) => id === 'stiffened-box')!;
		const many = box.section({ b: 4000, stiffeners: 18 }, 355);
		expect(many.plates).toHaveLength(40);
		const { stretches } = plateStretches(many);
		// clear between the webs 4000 − 24, 18 stiffeners of 12 at equal spaces: 3976/19 less their halves
		const inner = stretches!.filter(
			({ plate, stiffenedBy }) => plate === 'topFlange' && stiffenedBy.length === 2
		);
		expect(stretches).toHaveLength(2 * 19 + 2 + 36);
		expect(inner).toHaveLength(17);
		for (const { from, to } of inner) expect(to.y - from.y).toBeCloseTo(3976 / 19 - 12, 6);
	});
});
