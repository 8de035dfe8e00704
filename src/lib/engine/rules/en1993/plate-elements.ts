import type { Point } from '../../geometry/boundary';
import type { ISection, RectangularHollowSection, BoxSection } from '../../section/definition';
import { boxSizes } from '../../section/kinds/box';
import { iSizes } from '../../section/kinds/i';
import { cornerRadii } from '../../section/kinds/rectangular-hollow';
import type { PreparedSection } from '../../section/prepared';
import { weldLegOf } from '../../section/weld-leg';
import { epsilonOf, type Strengths } from './strengths';

/**
 * A flat part as Table 5.2 measures it, mm: width c along its mid-thickness from `from` to `to`
 * (of an outstand from the supported root to the free tip).
 */
export interface PlateElement {
	readonly part: string;
	readonly type: 'internal' | 'outstand';
	readonly c: number;
	readonly t: number;
	readonly epsilon: number;
	readonly from: Point;
	readonly to: Point;
}

/** A round tube: outside diameter and wall, mm. */
export interface TubeElement {
	readonly part: string;
	readonly type: 'tubular';
	readonly c: number;
	readonly t: number;
	readonly epsilon: number;
}

export type SectionElements =
	| { readonly kind: 'plates'; readonly plates: readonly PlateElement[] }
	| { readonly kind: 'tube'; readonly tube: TubeElement };

type Flat = Omit<PlateElement, 'epsilon' | 'c'>;

/** The parts that Table 5.2 classifies, or null for a kind that is not built yet. */
export function elementsOf(
	{ definition }: PreparedSection,
	strengths: Strengths
): SectionElements | null {
	switch (definition.kind) {
		case 'i':
			return measured(iElements(definition), strengths);
		case 'box':
			return measured(boxElements(definition), strengths);
		case 'rectangular-hollow':
			return measured(hollowElements(definition), strengths);
		case 'circular-hollow': {
			const epsilon = epsilonOf(strengths.most, strengths.modulus);
			const { d: c, t } = definition;
			return { kind: 'tube', tube: { part: 'wall', type: 'tubular', c, t, epsilon } };
		}
		default:
			return null;
	}
}

const webs = new Set(['web', 'leftWeb', 'rightWeb']);

/** A web follows the strain of its flanges: its ε is that of the strongest part (EN 1993-1-5, 4.3(6)). */
function measured(flats: readonly Flat[], strengths: Strengths): SectionElements {
	const strength = (part: string) => (webs.has(part) ? strengths.most : strengths.of(part));
	const plates = flats.map(({ part, type, t, from, to }): PlateElement => {
		const [dy, dz] = [to.y - from.y, to.z - from.z];
		const c = Math.sqrt(dy * dy + dz * dz);
		return { part, type, c, t, epsilon: epsilonOf(strength(part), strengths.modulus), from, to };
	});
	return { kind: 'plates', plates };
}

/** Both outstands of a flange from its roots at middle ± root to its tips at middle ± half width. */
function outstands(part: string, t: number, z: number, middle: number, root: number, tip: number) {
	if (tip <= root) return [];
	return [-1, 1].map((side): Flat => ({
		part,
		type: 'outstand',
		t,
		from: { y: middle + side * root, z },
		to: { y: middle + side * tip, z }
	}));
}

/** Rolled: c between root radii or from root to tip. Welded: from the toe of the fillet. */
export function iElements(definition: ISection): Flat[] {
	const { h, bTop, tfTop, bBottom, tfBottom, tw, r, middle } = iSizes(definition);
	const edge = definition.fabrication === 'rolled' ? r : weldLegOf(definition);
	const root = tw / 2 + edge;
	const bottom = Math.min(tfBottom + edge, h / 2);
	const web: Flat = {
		part: 'web',
		type: 'internal',
		t: tw,
		from: { y: middle, z: bottom },
		to: { y: middle, z: Math.max(h - tfTop - edge, bottom) }
	};
	return [
		...outstands('topFlange', tfTop, h - tfTop / 2, middle, root, bTop / 2),
		web,
		...outstands('bottomFlange', tfBottom, tfBottom / 2, middle, root, bBottom / 2)
	];
}

/**
 * Box: the fillets stand outside, so they shorten the outstands only; flanges between the webs
 * and webs between the flanges are measured clear.
 */
export function boxElements(definition: BoxSection): Flat[] {
	const { h, bTop, bBottom, tw, tfTop, tfBottom, webGap, middle } = boxSizes(definition);
	const root = webGap / 2 + tw + weldLegOf(definition);
	const across = (part: string, t: number, z: number): Flat => ({
		part,
		type: 'internal',
		t,
		from: { y: middle - webGap / 2, z },
		to: { y: middle + webGap / 2, z }
	});
	const upright = (part: string, y: number): Flat => ({
		part,
		type: 'internal',
		t: tw,
		from: { y, z: tfBottom },
		to: { y, z: h - tfTop }
	});
	const web = (webGap + tw) / 2;
	return [
		across('topFlange', tfTop, h - tfTop / 2),
		...outstands('topFlange', tfTop, h - tfTop / 2, middle, root, bTop / 2),
		upright('leftWeb', middle - web),
		upright('rightWeb', middle + web),
		across('bottomFlange', tfBottom, tfBottom / 2),
		...outstands('bottomFlange', tfBottom, tfBottom / 2, middle, root, bBottom / 2)
	];
}

/**
 * Rectangular tube: c = b − 3t as in Table 5.2, or the flat b − 2t − 2ri where a tight corner
 * leaves more than that.
 */
export function hollowElements(definition: RectangularHollowSection): Flat[] {
	const { h, b, t } = definition;
	const { ri } = cornerRadii(definition);
	const edge = Math.min(1.5 * t, t + ri);
	const across = (part: string, z: number): Flat => ({
		part,
		type: 'internal',
		t,
		from: { y: Math.min(edge, b / 2), z },
		to: { y: Math.max(b - edge, b / 2), z }
	});
	const upright = (part: string, y: number): Flat => ({
		part,
		type: 'internal',
		t,
		from: { y, z: Math.min(edge, h / 2) },
		to: { y, z: Math.max(h - edge, h / 2) }
	});
	return [
		across('topFlange', h - t / 2),
		upright('leftWeb', t / 2),
		upright('rightWeb', b - t / 2),
		across('bottomFlange', t / 2)
	];
}
