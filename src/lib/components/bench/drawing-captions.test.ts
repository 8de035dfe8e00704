import { expect, it } from 'vitest';
import type { EffectiveProperties } from '$lib/engine/rules/en1993/effective/effective-section';
import { drawingCaptions } from './drawing-captions';

const si = { system: 'si', decimal: 'point' } as const;
const us = { system: 'us', decimal: 'comma' } as const;
const plain = (texts: string[]) => texts.map((text) => text.replace(/[\u00a0\u202f]/g, ' '));
const strip = { part: 'web', element: 'web', from: 1, to: 2, corners: [] };
const shown = (shiftY: number, shiftZ: number, removed = [strip]) =>
	({ centroidShiftY: shiftY, centroidShiftZ: shiftZ, removed }) as unknown as EffectiveProperties;

it('tells what the dashes are and where the centroid goes', () => {
	const view = { case: '+My', pass: 'once', drawn: shown(0, -22.34) } as const;
	expect(plain(drawingCaptions(view, {}, si))).toEqual([
		'Dashed: not counted under +My, one pass. Its centroid moves 22.3 mm down.'
	]);
});

it('tells both directions, in the reader’s units: 1 in is 25.4 mm', () => {
	const view = { case: 'N', pass: 'converged', drawn: shown(-25.4, 50.8) } as const;
	expect(plain(drawingCaptions(view, {}, us))).toEqual([
		'Dashed: not counted under compression, converged. Its centroid moves 2,00 in up and 1,00 in to the left.'
	]);
});

it('tells stiffeners, and nothing where all counts and there are none', () => {
	const view = { case: '+My', pass: 'once', drawn: shown(0, 0, []) } as const;
	expect(drawingCaptions(view, {}, si)).toEqual([]);
	const study = { stiffeners: { spacing: 1500, endPost: 'non-rigid' } } as const;
	expect(plain(drawingCaptions(view, study, si))).toEqual([
		'Not drawn: transverse stiffeners every 1500 mm, non-rigid end posts.'
	]);
});
