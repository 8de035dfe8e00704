import { describe, expect, it } from 'vitest';
import { exampleWorks, notCovered } from '../../src/lib/server/proof/examples/list';
import { workedExamples } from '../../src/lib/server/proof/examples/worked-example';
import { workedChecks } from '../../src/lib/server/proof/registry';

const checks = [...workedChecks()].flat();

describe('the engine gives what published examples print', () => {
	it.each(checks)('$id: $quantity, $case', ({ pass, ours, printed }) =>
		expect(pass, `printed ${printed}, ours ${ours}`).toBe(true)
	);
});

describe('nothing falls out', () => {
	const examples = workedExamples();

	it('has an evaluator or a reason for each of the 66 examples', () => {
		expect(examples).toHaveLength(66);
		const silent = examples.filter(({ id }) => notCovered(id) === undefined);
		expect(silent.map(({ id }) => id)).toEqual([]);
		expect(examples.filter(({ id }) => notCovered(id) === null)).toHaveLength(32);
	});

	it('has no evaluator without an example', () => {
		const known = examples.map(({ id }) => id);
		expect(Object.keys(exampleWorks).filter((id) => !known.includes(id))).toEqual([]);
	});

	it('holds every printed value that is not left out for a stated reason', () => {
		for (const { id, expected } of examples) {
			const work = exampleWorks[id];
			if (!work) continue;
			const held = checks.filter((check) => check.id.startsWith(`${id}/`)).length;
			const left = Object.keys(work.leftOut ?? {}).length;
			expect(held + left, id).toBe(Object.keys(expected).length);
		}
	});

	it('holds the values printed outside the data file: 25 classes, 3 shear areas, 4 of one beam', () => {
		const of = (start: string) => checks.filter(({ id }) => id.startsWith(start)).length;
		expect(of('classes/')).toBe(25);
		expect(of('shear-area/')).toBe(3);
		expect(of('lateral-torsional/')).toBe(4);
	});
});
