import type { WorkingInput } from '../../explain/working';
import type { AngleSection, ChannelSection, ISection, TeeSection } from '../../section/definition';
import { channelSizes } from '../../section/kinds/channel';
import { iSizes, type ISizes } from '../../section/kinds/i';
import type { ShearArea, ShearAreas, ShearPanel } from './shear-area';

export const lengths = (sizes: Readonly<Record<string, number>>): WorkingInput[] =>
	Object.entries(sizes).map(([symbol, value]) => ({ symbol, value, unit: 'mm' }));

const areaInput = (value: number): WorkingInput => ({
	symbol: 'A',
	value,
	unit: 'mm²',
	from: 'gross.area'
});

const etaInput = (value: number): WorkingInput => ({
	symbol: 'η',
	value,
	unit: '',
	from: 'chosen with the code'
});

const clearDepth = ({ h, tfTop, tfBottom }: ISizes): number => h - tfTop - tfBottom;

const webOf = (depth: number, thickness: number): ShearPanel => ({
	part: 'web',
	depth,
	thickness,
	support: 'both-edges'
});

/** a) A − 2btf + (tw + 2r)tf, not less than η hw tw, each flange with its own sizes. */
export function rolledIAreas(definition: ISection, gross: number, eta: number): ShearAreas {
	const sizes = iSizes(definition);
	const { bTop, tfTop, bBottom, tfBottom, tw, r } = sizes;
	const hw = clearDepth(sizes);
	const flanges = bTop * tfTop + bBottom * tfBottom;
	const within = ((tw + 2 * r) * (tfTop + tfBottom)) / 2;
	const share = within / flanges;
	const z: ShearArea = {
		area: Math.max(gross - flanges + within, eta * hw * tw),
		shares: { web: 1, topFlange: share, bottomFlange: share },
		letter: 'a)',
		formula: 'A_v = max(A − b1·t1 − b2·t2 + (tw + 2·r)·(t1 + t2)/2, η·hw·tw)',
		inputs: [
			areaInput(gross),
			...lengths({ b1: bTop, t1: tfTop, b2: bBottom, t2: tfBottom, tw, r, hw }),
			etaInput(eta)
		],
		panels: [webOf(hw, tw)],
		plate: 'web'
	};
	return { y: alongFlanges(sizes), z };
}

/** d) η hw tw along the web. */
export function weldedIAreas(definition: ISection, eta: number): ShearAreas {
	const sizes = iSizes(definition);
	const hw = clearDepth(sizes);
	const { tw } = sizes;
	const z: ShearArea = {
		area: eta * hw * tw,
		shares: { web: 1 },
		letter: 'd)',
		formula: 'A_v = η·hw·tw',
		inputs: [...lengths({ hw, tw }), etaInput(eta)],
		panels: [webOf(hw, tw)],
		plate: 'web'
	};
	return { y: alongFlanges(sizes), z };
}

const outstand = (part: string, depth: number, thickness: number): ShearPanel => ({
	part,
	depth,
	thickness,
	support: 'one-edge'
});

/** e) Along the flanges: the flange plates alone, A − hw tw of a welded I. */
function alongFlanges({ bTop, tfTop, bBottom, tfBottom, tw }: ISizes): ShearArea {
	return {
		area: bTop * tfTop + bBottom * tfBottom,
		shares: { topFlange: 1, bottomFlange: 1 },
		letter: 'e)',
		formula: 'A_v = b1·t1 + b2·t2',
		inputs: lengths({ b1: bTop, t1: tfTop, b2: bBottom, t2: tfBottom }),
		panels: [
			outstand('topFlange', (bTop - tw) / 2, tfTop),
			outstand('bottomFlange', (bBottom - tw) / 2, tfBottom)
		],
		plate: 'flanges'
	};
}

/**
 * b) A − 2btf + (tw + r)tf along the web, tapered flanges at their mean thickness tf; e) A − hw tw
 * along the flanges, where fillets count no more than two plain flanges do.
 */
export function channelAreas(definition: ChannelSection, gross: number): ShearAreas {
	const { h, b, tw, tf, r, tToe } = channelSizes(definition);
	const hw = h - 2 * tf;
	const flanges = 2 * b * tf;
	const within = (tw + r) * tf;
	const share = Math.min(1, within / flanges);
	const z: ShearArea = {
		area: gross - flanges + within,
		shares: { web: 1, topFlange: share, bottomFlange: share },
		letter: 'b)',
		formula: 'A_v = A − 2·b·tf + (tw + r)·tf',
		inputs: [areaInput(gross), ...lengths({ b, tf, tw, r })],
		panels: [webOf(hw, tw)],
		plate: 'web'
	};
	const y: ShearArea = {
		area: Math.min(gross - hw * tw, flanges),
		shares: { topFlange: 1, bottomFlange: 1 },
		letter: 'e)',
		formula: 'A_v = min(A − hw·tw, 2·b·tf)',
		inputs: [areaInput(gross), ...lengths({ hw, tw, b, tf })],
		panels: [outstand('topFlange', b - tw, Math.min(tf, tToe))],
		plate: 'flanges'
	};
	return { y, z };
}

/** c) A − btf + (tw + 2r)tf/2 of a rolled tee, tw(h − tf/2) of a welded one; the flange by e). */
export function teeAreas(definition: TeeSection, gross: number): ShearAreas {
	const { h, b, tw, tf, fabrication } = definition;
	const r = fabrication === 'rolled' ? (definition.r ?? 0) : 0;
	const rolled = fabrication === 'rolled';
	const within = ((tw + 2 * r) * tf) / 2;
	const z: ShearArea = {
		area: rolled ? gross - b * tf + within : tw * (h - tf / 2),
		shares: { web: 1, flange: within / (b * tf) },
		letter: 'c)',
		formula: rolled ? 'A_v = A − b·tf + (tw + 2·r)·tf/2' : 'A_v = tw·(h − tf/2)',
		inputs: rolled ? [areaInput(gross), ...lengths({ b, tf, tw, r })] : lengths({ tw, h, tf }),
		panels: [outstand('web', h - tf, tw)],
		plate: 'stem'
	};
	const y: ShearArea = {
		area: b * tf,
		shares: { flange: 1 },
		letter: 'e)',
		formula: 'A_v = b·tf',
		inputs: lengths({ b, tf }),
		panels: [outstand('flange', (b - tw) / 2, tf)],
		plate: 'flange'
	};
	return { y, z };
}

/**
 * One leg alone, counted as the stem of a welded tee, t(h − t/2): the code names no area for angles
 * (common practice, no source). Toe radii are taken off: each cuts a corner of (1 − π/4)rToe².
 */
export function angleAreas({ h, b, t, rToe = 0 }: AngleSection): ShearAreas {
	const along = (leg: number, part: string, plate: string): ShearArea => ({
		area: t * (leg - t / 2) - (1 - Math.PI / 4) * rToe * rToe,
		shares: { [part]: 1 },
		letter: null,
		formula: 'A_v = t·(h − t/2) − (1 − π/4)·r2²',
		inputs: [...lengths({ t, h: leg, r2: rToe }), { symbol: 'π', value: Math.PI, unit: '' }],
		panels: [outstand(part, leg - t, t)],
		plate
	});
	return {
		y: along(b, 'horizontalLeg', 'horizontal leg'),
		z: along(h, 'verticalLeg', 'vertical leg')
	};
}
