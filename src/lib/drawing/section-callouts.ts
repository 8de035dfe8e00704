import type { Point } from '$lib/engine/geometry/boundary';
import type { SectionDefinition } from '$lib/engine/section/definition';

/**
 * A size written on the drawing: above or below the steel or beside a point of it while it stands
 * upright, `room` mm being free there above and below, or the size of the `whole`, true however it is turned.
 */
export interface Callout {
	readonly text: string;
	readonly place: 'above' | 'below' | 'whole' | { readonly beside: Point; readonly room: number };
}

type Length = (millimetres: number) => string;

/** The sizes that make a section, in the trade's way of writing them. */
export function sectionCallouts(definition: SectionDefinition, length: Length): Callout[] {
	const by = (a: number, b: number) => `${length(a)} × ${length(b)}`;
	switch (definition.kind) {
		case 'i':
			return iCallouts(definition, by, length);
		case 'box':
			return [
				above(by(definition.b, definition.tfTop)),
				below(by(definition.bBottom ?? definition.b, definition.tfBottom)),
				beside(
					length(definition.tw),
					boxWebEdge(definition),
					definition.tfBottom,
					definition.h - definition.tfTop
				)
			];
		case 'channel':
			return [
				above(by(definition.b, definition.tf)),
				beside(length(definition.tw), definition.tw, definition.tf, definition.h - definition.tf)
			];
		case 'tee':
			return [
				above(by(definition.b, definition.tf)),
				beside(
					length(definition.tw),
					(definition.b + definition.tw) / 2,
					0,
					definition.h - definition.tf
				)
			];
		case 'angle':
			return [whole(`${length(definition.h)} × ${by(definition.b, definition.t)}`)];
		case 'rectangular-hollow':
			return [whole(`${length(definition.h)} × ${by(definition.b, definition.t)}`)];
		case 'circular-hollow':
			return [whole(`Ø ${by(definition.d, definition.t)}`)];
		case 'flat':
			return [whole(by(definition.b, definition.h))];
		case 'round':
			return [whole(`Ø ${length(definition.d)}`)];
		case 'plates':
		case 'outline':
			return [];
	}
}

const above = (text: string): Callout => ({ text, place: 'above' });
const below = (text: string): Callout => ({ text, place: 'below' });
const whole = (text: string): Callout => ({ text, place: 'whole' });
/** A web's thickness beside its edge at `y`, a third up its clear depth between `from` and `to`. */
const beside = (text: string, y: number, from: number, to: number): Callout => ({
	text,
	place: { beside: { y, z: from + (to - from) * 0.34 }, room: to - from }
});

const boxWebEdge = (box: { b: number; bBottom?: number; webGap: number }) =>
	Math.max(box.b, box.bBottom ?? box.b) / 2 - box.webGap / 2;

function iCallouts(
	i: Extract<SectionDefinition, { kind: 'i' }>,
	by: (a: number, b: number) => string,
	length: Length
): Callout[] {
	const middle = Math.max(i.b, i.bBottom ?? i.b) / 2;
	return [
		above(by(i.b, i.tf)),
		below(by(i.bBottom ?? i.b, i.tfBottom ?? i.tf)),
		beside(length(i.tw), middle + i.tw / 2, i.tfBottom ?? i.tf, i.h - i.tf)
	];
}
