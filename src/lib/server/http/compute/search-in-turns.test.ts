import { describe, expect, it } from 'vitest';
import { searchInTurns } from './search-in-turns';

/** Steps that each take longer than a turn. */
function* slowly(steps: number): Generator<number, string> {
	for (let step = 0; step < steps; step++) {
		const until = performance.now() + 40;
		while (performance.now() < until);
		yield step;
	}
	return 'found';
}

describe('a search in turns', () => {
	it('lets others in between its steps', async () => {
		let others = 0;
		const other = () => {
			others += 1;
			if (others < 100) setImmediate(other);
		};
		setImmediate(other);
		expect(await searchInTurns(slowly(3))).toEqual({ ok: true, value: 'found' });
		expect(others).toBeGreaterThan(1);
	});

	it('ends when nobody waits for the answer any more', async () => {
		const gone = AbortSignal.abort();
		const ended = await searchInTurns(slowly(3), gone);
		expect(!ended.ok && ended.error.code).toBe('client_gone');
	});
});
