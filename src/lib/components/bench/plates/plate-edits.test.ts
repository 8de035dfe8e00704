import { describe, expect, it } from 'vitest';
import type { PlatesSection } from '$lib/engine/section/definition';
import { prepareSection } from '$lib/engine/section/prepare';
import { platePresets } from '$lib/engine/section/plates/presets';
import { withCopy, withNewPlate, withoutPlate, withPlate } from './plate-edits';
import { joinRows, withFoundJoins, withJoin } from './plate-joins';

const covered = platePresets[0]!.section({}, 'S355');
const stands = (section: PlatesSection) => prepareSection(section).ok;

describe('edits of free plates', () => {
	it('carry a new name to joins, grades and holes', () => {
		const section: PlatesSection = {
			...covered,
			joins: [{ a: 'web', b: 'topFlange' }],
			partGrades: { web: 'S275' },
			boltHoles: [{ part: 'web', diameter: 22, count: 1 }]
		};
		expect(withPlate(section, 2, { name: 'middle' })).toMatchObject({
			joins: [{ a: 'middle', b: 'topFlange' }],
			partGrades: { middle: 'S275' },
			boltHoles: [{ part: 'middle' }]
		});
	});

	it('add a plate that lies on the highest one, so that the section stands', () => {
		const next = withNewPlate(covered);
		expect(next.plates.at(-1)).toMatchObject({ name: 'plate2', z: 629, thickness: 10 });
		expect(stands(next)).toBe(true);
		expect(stands(withNewPlate({ ...next, joins: joinRows(next) }))).toBe(true);
	});

	it('copy a plate flush against its face', () => {
		expect(withCopy(covered, 2).plates.at(-1)).toMatchObject({ name: 'web2', y: -10, z: 312 });
		expect(stands(withCopy(covered, 2))).toBe(true);
	});

	it('remove a plate with what hung on its name, but never the last', () => {
		const section: PlatesSection = { ...covered, joins: joinRows(covered) };
		const left = withoutPlate(section, 0);
		expect(left.plates).toHaveLength(4);
		expect(left.joins?.some(({ a, b }) => a === 'topCover' || b === 'topCover')).toBe(false);
		const one = { ...covered, plates: covered.plates.slice(0, 1) };
		expect(withoutPlate(one, 0)).toBe(one);
	});
});

describe('joins of free plates', () => {
	it('are found by contact, and given one by one once a weld is', () => {
		const rows = joinRows(covered);
		expect(rows.map(({ a, b, joined }) => [a, b, joined])).toEqual([
			['topCover', 'topFlange', true],
			['topFlange', 'web', true],
			['web', 'bottomFlange', true],
			['bottomFlange', 'bottomCover', true]
		]);
		const welded = withJoin(covered, rows, { ...rows[1]!, leg: 6 });
		expect(welded.joins).toHaveLength(4);
		expect(joinRows(welded)[1]).toMatchObject({ a: 'topFlange', b: 'web', leg: 6 });
		expect(withFoundJoins(welded)).toEqual(covered);
	});

	it('stay in sight when they are taken away', () => {
		const rows = joinRows(covered);
		const apart = withJoin(covered, rows, { ...rows[0]!, joined: false });
		expect(joinRows(apart).find(({ a }) => a === 'topCover')).toMatchObject({ joined: false });
	});
});
