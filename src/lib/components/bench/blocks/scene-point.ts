import { sideToPx } from '$lib/drawing/block-layout';
import { depthOf, sideOf } from '$lib/drawing/turned-frame';
import type { Point } from '$lib/engine/geometry/boundary';
import type { BlockScene } from '../block-scene.svelte';

/** Where a point of the section lies on the drawing, px; null where the drawing is broken off. */
export function scenePoint(scene: BlockScene, point: Point): { x: number; y: number } | null {
	const x = sideToPx(scene.layout, sideOf(scene.frame, point));
	return x === null ? null : { x, y: scene.depthPx(depthOf(scene.frame, point)) };
}

/** Points joined to a closed path; empty when one of them is not on the drawing. */
export function scenePath(scene: BlockScene, points: readonly Point[]): string {
	const places = points.map((point) => scenePoint(scene, point));
	if (places.some((place) => place === null)) return '';
	return `M${places.map((place) => `${place?.x} ${place?.y}`).join('L')}Z`;
}
