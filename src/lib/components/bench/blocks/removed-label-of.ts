import { removedLabelPlace, type RemovedLabelPlace } from '$lib/drawing/removed-label';
import { sectionCallouts } from '$lib/drawing/section-callouts';
import { depthOf } from '$lib/drawing/turned-frame';
import type { BlockScene } from '../block-scene.svelte';
import { browserTextMeasure } from '../text-measure';

export const removedWords = 'not counted';
/** Size of its letters, px. */
export const removedSize = 11.5;
const measure = browserTextMeasure("'Archivo Variable', sans-serif");

/** Width of the words, px. */
export const removedWidth = () => measure(removedWords, removedSize);

/** Where the words stand that say what the dashed strips are; null where there are none. */
export function removedLabelOf(scene: BlockScene): RemovedLabelPlace | null {
	const taken = sectionCallouts(scene.definition, String).flatMap(({ place }) =>
		typeof place === 'string' ? [] : [scene.depthPx(depthOf(scene.frame, place.beside))]
	);
	const strips = scene.removed.map(({ corners }) => corners);
	return removedLabelPlace(strips, scene.frame, scene.layout, removedWidth(), taken);
}
