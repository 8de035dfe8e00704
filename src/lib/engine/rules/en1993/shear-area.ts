import type { BoxSection, ISection, RectangularHollowSection } from '../../section/definition';
import { boxSizes } from '../../section/kinds/box';
import { iSizes } from '../../section/kinds/i';
import type { PreparedSection } from '../../section/prepared';

/** Shear area along one axis, mm², the parts whose strength holds, and their slenderness. */
export interface ShearArea {
	readonly area: number;
	readonly parts: readonly string[];
	readonly clause: string;
	/** Clear depth over thickness of the plate in shear; null where it cannot buckle. */
	readonly slenderness: number | null;
	/** The part in shear, for words. */
	readonly plate: string;
}

export interface ShearAreas {
	readonly y: ShearArea;
	readonly z: ShearArea;
}

const rule = (letter: string) => `EN 1993-1-1:2005 6.2.6(3) ${letter}`;

/** Shear areas of 6.2.6(3), or null for a kind that is not built yet. */
export function shearAreasOf(
	{ definition, gross }: PreparedSection,
	eta: number
): ShearAreas | null {
	switch (definition.kind) {
		case 'i':
			return definition.fabrication === 'rolled'
				? rolledI(definition, gross.area, eta)
				: weldedI(definition, eta);
		case 'box':
			return box(definition, gross.area, eta);
		case 'rectangular-hollow':
			return rectangularHollow(definition, gross.area);
		case 'circular-hollow': {
			const area = (2 * gross.area) / Math.PI;
			const tube = { area, parts: ['wall'], clause: rule('g)'), slenderness: null, plate: 'wall' };
			return { y: tube, z: tube };
		}
		default:
			return null;
	}
}

const flanges = ['topFlange', 'bottomFlange'];

/** A − 2btf + (tw + 2r)tf, not less than η hw tw, each flange with its own sizes. */
function rolledI(definition: ISection, gross: number, eta: number): ShearAreas {
	const { h, bTop, tfTop, bBottom, tfBottom, tw, r } = iSizes(definition);
	const hw = h - tfTop - tfBottom;
	const area = gross - bTop * tfTop - bBottom * tfBottom + ((tw + 2 * r) * (tfTop + tfBottom)) / 2;
	return {
		y: flangesAlong(definition),
		z: {
			area: Math.max(area, eta * hw * tw),
			parts: ['web'],
			clause: rule('a)'),
			slenderness: hw / tw,
			plate: 'web'
		}
	};
}

/** η hw tw along the web. */
function weldedI(definition: ISection, eta: number): ShearAreas {
	const { h, tfTop, tfBottom, tw } = iSizes(definition);
	const hw = h - tfTop - tfBottom;
	return {
		y: flangesAlong(definition),
		z: {
			area: eta * hw * tw,
			parts: ['web'],
			clause: rule('d)'),
			slenderness: hw / tw,
			plate: 'web'
		}
	};
}

/** Along the flanges: the flange plates alone, A − hw tw of a welded I. Outstands do not buckle in shear. */
function flangesAlong(definition: ISection): ShearArea {
	const { bTop, tfTop, bBottom, tfBottom } = iSizes(definition);
	return {
		area: bTop * tfTop + bBottom * tfBottom,
		parts: flanges,
		clause: rule('e)'),
		slenderness: null,
		plate: 'flanges'
	};
}

function box(definition: BoxSection, gross: number, eta: number): ShearAreas {
	const { h, tw, tfTop, tfBottom, webGap } = boxSizes(definition);
	const hw = h - tfTop - tfBottom;
	return {
		y: {
			area: gross - 2 * hw * tw,
			parts: flanges,
			clause: rule('e)'),
			slenderness: webGap / Math.min(tfTop, tfBottom),
			plate: 'flanges'
		},
		z: {
			area: 2 * eta * hw * tw,
			parts: ['leftWeb', 'rightWeb'],
			clause: rule('d)'),
			slenderness: hw / tw,
			plate: 'webs'
		}
	};
}

/** A h/(b + h) along the depth, A b/(b + h) along the width. */
function rectangularHollow({ h, b, t }: RectangularHollowSection, gross: number): ShearAreas {
	const along = (side: number, plate: string): ShearArea => ({
		area: (gross * side) / (b + h),
		parts: ['wall'],
		clause: rule('f)'),
		slenderness: (side - 2 * t) / t,
		plate
	});
	return { y: along(b, 'flanges'), z: along(h, 'webs') };
}
