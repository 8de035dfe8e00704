import type { Plate, SectionDefinition } from '../../section/definition';
import { boxSizes } from '../../section/kinds/box';
import { iSizes } from '../../section/kinds/i';
import { parallel } from './shear-area-solid';

/** A web, or two, between a top and a bottom flange, mm; with the names of its parts. */
export interface PlateGirder {
	readonly hw: number;
	readonly tw: number;
	readonly webs: readonly string[];
	readonly top: GirderFlange;
	readonly bottom: GirderFlange;
	/** Between the middles of the flanges. */
	readonly lever: number;
}

export interface GirderFlange {
	readonly part: string;
	readonly b: number;
	readonly t: number;
}

/** An I, a box, or three free plates that stand as an upright web between level flanges; else null. */
export function plateGirderOf(definition: SectionDefinition): PlateGirder | null {
	switch (definition.kind) {
		case 'i':
			return fromSizes(iSizes(definition), ['web']);
		case 'box':
			return fromSizes(boxSizes(definition), ['leftWeb', 'rightWeb']);
		case 'plates':
			return fromPlates(definition.plates);
		default:
			return null;
	}
}

type Sizes = Omit<ReturnType<typeof iSizes>, 'r' | 'middle'>;

function fromSizes(
	{ h, tw, bTop, tfTop, bBottom, tfBottom }: Sizes,
	webs: readonly string[]
): PlateGirder {
	return {
		hw: h - tfTop - tfBottom,
		tw,
		webs,
		top: { part: 'topFlange', b: bTop, t: tfTop },
		bottom: { part: 'bottomFlange', b: bBottom, t: tfBottom },
		lever: h - (tfTop + tfBottom) / 2
	};
}

/** Edges closer than this share of the web's depth touch. */
const touching = 1e-6;

function fromPlates(plates: readonly Plate[]): PlateGirder | null {
	const upright = plates.filter(({ angle }) => isAlong(angle, 90));
	const level = plates.filter(({ angle }) => isAlong(angle, 0)).sort((a, b) => b.z - a.z);
	const [web, top, bottom] = [upright[0], level[0], level[1]];
	if (plates.length !== 3 || upright.length !== 1 || !web || !top || !bottom) return null;
	const slack = touching * web.width;
	const gap = (flange: Plate) =>
		Math.abs(Math.abs(flange.z - web.z) - (web.width + flange.thickness) / 2);
	const carries = (flange: Plate) =>
		gap(flange) <= slack &&
		Math.abs(flange.y - web.y) <= (flange.width - web.thickness) / 2 + slack;
	if (!(top.z > web.z && bottom.z < web.z && carries(top) && carries(bottom))) return null;
	return {
		hw: web.width,
		tw: web.thickness,
		webs: [web.name],
		top: { part: top.name, b: top.width, t: top.thickness },
		bottom: { part: bottom.name, b: bottom.width, t: bottom.thickness },
		lever: top.z - bottom.z
	};
}

const isAlong = (angle: number, direction: number): boolean =>
	Math.abs(Math.sin(((angle - direction) * Math.PI) / 180)) <= parallel;
