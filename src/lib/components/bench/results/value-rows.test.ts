import { expect, it } from 'vitest';
import { analyse } from '$lib/engine/rules/analyse';
import { prepareSection } from '$lib/engine/section/prepare';
import { singleRows } from './value-rows';

const si = { system: 'si', decimal: 'point' } as const;

it('gives the shear area of a rolled I along z: IPE 300, Av 25.7 cm² (producers’ tables after EN 1993-1-1 6.2.6(3))', () => {
	const built = prepareSection({
		kind: 'i',
		h: 300,
		b: 150,
		tw: 7.1,
		tf: 10.7,
		r: 15,
		fabrication: 'rolled',
		grade: 'S355'
	});
	if (!built.ok) throw new Error('cannot be built');
	const rows = singleRows(analyse(built.value), built.value, si);
	const row = rows.find(({ name }) => name === 'Shear area, along z');
	expect(Number(row?.figures[0])).toBeCloseTo(25.7, 1);
	expect(row?.unit).toBe('cm²');
});
