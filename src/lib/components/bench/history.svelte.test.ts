import { describe, expect, it } from 'vitest';
import { History } from './history.svelte';

describe('the history of a study', () => {
	it('goes back and forth', () => {
		const history = new History('a');
		history.change('b');
		history.change('c');
		history.undo();
		history.undo();
		expect([history.present, history.canUndo, history.canRedo]).toEqual(['a', false, true]);
		history.redo();
		expect(history.present).toBe('b');
	});

	it('takes the figures of one entry typed in one stroke as one step', () => {
		const history = new History(400);
		history.change(4, 'b', 0);
		history.change(45, 'b', 200);
		history.change(450, 'b', 400);
		history.undo();
		expect(history.present).toBe(400);
	});

	it('keeps changes of other entries, and later ones, apart', () => {
		const history = new History(1);
		history.change(2, 'b', 0);
		history.change(3, 'h', 100);
		history.change(4, 'h', 5000);
		history.undo();
		expect(history.present).toBe(3);
		history.undo();
		expect(history.present).toBe(2);
	});

	it('forgets what was undone once something new is done', () => {
		const history = new History('a');
		history.change('b');
		history.undo();
		history.change('c');
		expect(history.canRedo).toBe(false);
	});
});
