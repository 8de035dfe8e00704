import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../../../engine/section/definition';
import { analyseAnswer } from './analyse-answer';

const noShape = () => Promise.resolve(null);

async function asked(section: SectionDefinition, more: object = {}) {
	const answer = await analyseAnswer({ section, ...more }, noShape);
	if (!answer.ok) throw new Error(JSON.stringify(answer.error));
	return answer.value;
}

const ipe300: SectionDefinition = {
	...{ kind: 'i', h: 300, b: 150, tw: 7.1, tf: 10.7, r: 15 },
	...{ fabrication: 'rolled', grade: 'S355' }
};

/** Equilateral triangle, side 100 mm: J = √3 a⁴/80 (Timoshenko & Goodier, art. 106). */
const triangle: SectionDefinition = {
	kind: 'outline',
	grade: 300,
	outer: [
		[0, 0],
		[100, 0],
		[50, 50 * Math.sqrt(3)]
	]
};

/** Ribs standing side by side on a base: much to mesh. */
const combOf = (ribs: number): SectionDefinition => ({
	kind: 'plates',
	grade: 'S355',
	plates: [
		{ name: 'base', width: 50 * ribs, thickness: 20, y: 0, z: 0, angle: 0 },
		...Array.from({ length: ribs }, (_, i) => ({
			...{ name: `rib ${i + 1}`, width: 150, thickness: 12, angle: 90 },
			...{ y: 50 * (i - (ribs - 1) / 2), z: 85 }
		}))
	]
});

describe('torsion in the answer', () => {
	it('is solved for an outline without being asked, and says so', async () => {
		const { gross, torsion, notes } = await asked(triangle);
		expect(gross.torsionConstant! / ((Math.sqrt(3) / 80) * 1e8)).toBeCloseTo(1, 3);
		expect(torsion).toMatchObject({ handbook: null, numerical: { nodes: expect.any(Number) } });
		const codes = notes.map(({ code }) => code);
		expect(codes).toContain('torsion-numerical');
		expect(codes).not.toContain('torsion-not-covered');
	});

	it('keeps the handbook figures of a rolled shape, with the numerical ones beside them when asked', async () => {
		const plain = await asked(ipe300);
		expect(plain.torsion.numerical).toBeNull();
		const both = await asked(ipe300, { numericalTorsion: true });
		expect(both.gross).toEqual(plain.gross);
		expect(both.torsion.handbook).toEqual(plain.torsion.handbook);
		expect(both.torsion.numerical!.torsionConstant / 19.76e4).toBeCloseTo(1, 2);
		expect(both.notes.map(({ code }) => code)).not.toContain('ignored_field');
	});

	it('comes out the same from the store', async () => {
		const [first, second] = [await asked(triangle), await asked({ ...triangle })];
		expect(second.torsion).toEqual(first.torsion);
	});

	it('lets other requests be answered while it is solved', async () => {
		const answered: string[] = [];
		const comb = asked(combOf(30)).then(() => answered.push('comb'));
		const rolled = asked(ipe300).then(() => answered.push('rolled'));
		await Promise.all([comb, rolled]);
		expect(answered).toEqual(['rolled', 'comb']);
	});

	it('is given up when nobody waits for it any more', async () => {
		const gone = AbortSignal.abort();
		const answer = await analyseAnswer({ section: combOf(31) }, noShape, gone);
		expect(answer).toMatchObject({ ok: false, error: { code: 'client_gone' } });
	});
});
