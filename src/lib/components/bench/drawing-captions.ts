import { formatQuantity, type Preferences } from '$lib/units';
import type { EffectiveView } from './effective-view.svelte';
import type { Study } from './study';

/** What the drawing shows beside the bent section, in words: what is not counted, and stiffeners. */
export function drawingCaptions(
	view: Pick<EffectiveView, 'case' | 'pass' | 'drawn'>,
	study: Pick<Study, 'stiffeners'>,
	preferences: Preferences
): string[] {
	const { stiffeners } = study;
	const captions: string[] = [];
	if (view.drawn && view.drawn.removed.length > 0)
		captions.push(removedCaption(view, view.drawn, preferences));
	if (stiffeners)
		captions.push(
			`Not drawn: transverse stiffeners every ${formatQuantity(stiffeners.spacing, 'length', preferences, { digits: 5, trim: true, unit: true })}, ${stiffeners.endPost} end posts.`
		);
	return captions;
}

function removedCaption(
	{ case: on, pass }: Pick<EffectiveView, 'case' | 'pass'>,
	{ centroidShiftY, centroidShiftZ }: NonNullable<EffectiveView['drawn']>,
	preferences: Preferences
): string {
	const head = `Dashed: not counted under ${on === 'N' ? 'compression' : on}, ${pass === 'once' ? 'one pass' : 'converged'}.`;
	const moves = [
		shift(centroidShiftZ, 'up', 'down', preferences),
		shift(centroidShiftY, 'to the right', 'to the left', preferences)
	].filter((move) => move !== '');
	return moves.length === 0 ? head : `${head} Its centroid moves ${moves.join(' and ')}.`;
}

/** Shifts below this share of a millimetre are none. */
const nothing = 0.005;

function shift(by: number, plus: string, minus: string, preferences: Preferences): string {
	if (Math.abs(by) < nothing) return '';
	const decimals = preferences.system === 'us' ? 2 : 1;
	const size = formatQuantity(Math.abs(by), 'length', preferences, { decimals, unit: true });
	return `${size} ${by > 0 ? plus : minus}`;
}
