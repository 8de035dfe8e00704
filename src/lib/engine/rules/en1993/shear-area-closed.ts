import type { BoxSection, RectangularHollowSection } from '../../section/definition';
import { boxSizes } from '../../section/kinds/box';
import type { ShearArea, ShearAreas, ShearPanel } from './shear-area';
import { lengths } from './shear-area-open';

/** d) η Σ hw tw along both webs, e) A − Σ hw tw along the flanges. */
export function boxAreas(definition: BoxSection, gross: number, eta: number): ShearAreas {
	const { h, bTop, bBottom, tw, tfTop, tfBottom, webGap } = boxSizes(definition);
	const hw = h - tfTop - tfBottom;
	const held = (part: string, depth: number, thickness: number): ShearPanel => ({
		part,
		depth,
		thickness,
		support: 'both-edges'
	});
	const beyond = (part: string, width: number, thickness: number): ShearPanel => ({
		part,
		depth: (width - webGap) / 2 - tw,
		thickness,
		support: 'one-edge'
	});
	const y: ShearArea = {
		area: gross - 2 * hw * tw,
		shares: { topFlange: 1, bottomFlange: 1 },
		letter: 'e)',
		formula: 'A_v = A − 2·hw·tw',
		inputs: [
			{ symbol: 'A', value: gross, unit: 'mm²', from: 'gross.area' },
			...lengths({ hw, tw })
		],
		panels: [
			held('topFlange', webGap, tfTop),
			held('bottomFlange', webGap, tfBottom),
			beyond('topFlange', bTop, tfTop),
			beyond('bottomFlange', bBottom, tfBottom)
		],
		plate: 'flanges'
	};
	const z: ShearArea = {
		area: 2 * eta * hw * tw,
		shares: { leftWeb: 1, rightWeb: 1 },
		letter: 'd)',
		formula: 'A_v = 2·η·hw·tw',
		inputs: [
			{ symbol: 'η', value: eta, unit: '', from: 'chosen with the code' },
			...lengths({ hw, tw })
		],
		panels: [held('leftWeb', hw, tw), held('rightWeb', hw, tw)],
		plate: 'webs'
	};
	return { y, z };
}

/** f) A h/(b + h) along the depth, A b/(b + h) along the width. */
export function rectangularHollowAreas(
	{ h, b, t }: RectangularHollowSection,
	gross: number
): ShearAreas {
	const along = (side: number, symbol: 'h' | 'b', plate: string): ShearArea => ({
		area: (gross * side) / (b + h),
		shares: { wall: side / (b + h) },
		letter: 'f)',
		formula: `A_v = A·${symbol}/(b + h)`,
		inputs: [{ symbol: 'A', value: gross, unit: 'mm²', from: 'gross.area' }, ...lengths({ b, h })],
		panels: [{ part: 'wall', depth: side - 2 * t, thickness: t, support: 'tube' }],
		plate
	});
	return { y: along(b, 'b', 'flanges'), z: along(h, 'h', 'webs') };
}

/** g) 2A/π of a round tube in any direction; a round wall has no panel (class 4: EN 1993-1-6). */
export function circularHollowAreas(gross: number): ShearAreas {
	const tube: ShearArea = {
		area: (2 * gross) / Math.PI,
		shares: { wall: 1 },
		letter: 'g)',
		formula: 'A_v = 2·A/π',
		inputs: [
			{ symbol: 'A', value: gross, unit: 'mm²', from: 'gross.area' },
			{ symbol: 'π', value: Math.PI, unit: '' }
		],
		panels: [],
		plate: 'wall'
	};
	return { y: tube, z: tube };
}
