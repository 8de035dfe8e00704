import { describe, expect, it, vi } from 'vitest';
import { fail, ok } from '$lib/engine/result';
import { prepareSection } from '$lib/engine/section/prepare';
import { withNumericalTorsion } from '$lib/engine/section/torsion/with-numerical';
import { TorsionState, type Solve } from './torsion-state.svelte';

const built = prepareSection({ kind: 'flat', b: 20, h: 200, grade: 'S355' });
if (!built.ok) throw new Error('The flat does not stand.');
const section = built.value;
const other = { ...section };
const solved = withNumericalTorsion(section);
const answering =
	(end: Awaited<ReturnType<Solve>['result']>): Solve =>
	() => ({ id: 1, result: Promise.resolve(end), cancel: () => {} });

describe('the numerical torsion on the Bench', () => {
	it('computes, and then stands for the section it was asked for only', async () => {
		const state = new TorsionState(answering(ok(ok(solved))));
		state.ask(section);
		expect(state.standing(section).kind).toBe('computing');
		await vi.waitFor(() => expect(state.standing(section).kind).toBe('solved'));
		expect(state.standing(other).kind).toBe('idle');
	});

	it('says why it failed', async () => {
		const state = new TorsionState(answering(fail({ reason: 'failed', message: 'It stopped.' })));
		state.ask(section);
		await vi.waitFor(() =>
			expect(state.standing(section)).toEqual({ kind: 'failed', why: 'It stopped.' })
		);
	});

	it('fails in words where nothing can be computed in the background', () => {
		const state = new TorsionState(() => {
			throw new Error('no workers');
		});
		state.ask(section);
		expect(state.standing(section).kind).toBe('failed');
	});
});
