import type { Plate } from '../definition';
import {
	clearance,
	count,
	length,
	level,
	preset,
	upright,
	type PlatePreset,
	type PresetPlates
} from './preset';

const coveredI = preset(
	'i-with-cover-plates',
	'I with cover plates',
	[
		length('h', 'Depth without cover plates', 600),
		length('b', 'Flange width', 250),
		length('tf', 'Flange thickness', 16),
		length('tw', 'Web thickness', 10),
		length('coverWidth', 'Cover plate width', 200),
		length('coverThickness', 'Cover plate thickness', 12)
	],
	({ h, b, tf, tw, coverWidth, coverThickness: t }) => ({
		plates: [
			level('topCover', -coverWidth / 2, coverWidth / 2, t + h + t / 2, t),
			level('topFlange', -b / 2, b / 2, t + h - tf / 2, tf),
			upright('web', t + tf, t + h - tf, 0, tw),
			level('bottomFlange', -b / 2, b / 2, t + tf / 2, tf),
			level('bottomCover', -coverWidth / 2, coverWidth / 2, t / 2, t)
		]
	})
);

const stiffenedBox = preset(
	'stiffened-box',
	'Stiffened box',
	[
		length('h', 'Depth', 1000),
		length('b', 'Width over the webs', 800),
		length('tf', 'Flange thickness', 16),
		length('tw', 'Web thickness', 12),
		count('stiffeners', 'Stiffeners on each flange', 2, 12),
		length('stiffenerHeight', 'Stiffener height', 120),
		length('stiffenerThickness', 'Stiffener thickness', 12)
	],
	({ h, b, tf, tw, stiffeners, stiffenerHeight, stiffenerThickness }) => {
		const web = (b - tw) / 2;
		const rib = (i: number): Plate[] => {
			const y = -web + tw / 2 + ((i + 1) * (b - 2 * tw)) / (stiffeners + 1);
			const top = h - tf;
			return [
				upright(`topStiffener${i + 1}`, top - stiffenerHeight, top, y, stiffenerThickness),
				upright(`bottomStiffener${i + 1}`, tf, tf + stiffenerHeight, y, stiffenerThickness)
			];
		};
		return {
			plates: [
				level('topFlange', -b / 2, b / 2, h - tf / 2, tf),
				upright('leftWeb', tf, h - tf, -web, tw),
				upright('rightWeb', tf, h - tf, web, tw),
				level('bottomFlange', -b / 2, b / 2, tf / 2, tf),
				...Array.from({ length: stiffeners }, (_, i) => rib(i)).flat()
			]
		};
	}
);

const cruciform = preset(
	'cruciform',
	'Cruciform',
	[
		length('h', 'Depth', 300),
		length('b', 'Width', 300),
		length('tUpright', 'Upright thickness', 15),
		length('tLevel', 'Level thickness', 15)
	],
	({ h, b, tUpright, tLevel }) => ({
		plates: [
			upright('upright', 0, h, 0, tUpright),
			level('left', -b / 2, -tUpright / 2, h / 2, tLevel),
			level('right', tUpright / 2, b / 2, h / 2, tLevel)
		]
	})
);

/** Two mirrored halves, the backs a gap apart: tied when there is one. */
function pair(gap: number, half: (side: 1 | -1, word: string) => Plate[]): PresetPlates {
	return {
		plates: [...half(-1, 'left'), ...half(1, 'right')],
		...(gap > 0 ? { tied: true } : {})
	};
}

/** A level plate from one distance from the middle to another, on the left or the right. */
const outward = (name: string, side: 1 | -1, from: number, to: number, z: number, t: number) =>
	side > 0 ? level(name, from, to, z, t) : level(name, -to, -from, z, t);

const channels = preset(
	'back-to-back-channels',
	'Channels back to back',
	[
		length('h', 'Depth', 200),
		length('b', 'Flange width of one', 75),
		length('tf', 'Flange thickness', 11),
		length('tw', 'Web thickness', 8),
		clearance('gap', 'Gap between the webs', 12)
	],
	({ h, b, tf, tw, gap }) =>
		pair(gap, (side, word) => [
			upright(`${word}Web`, 0, h, (side * (gap + tw)) / 2, tw),
			outward(`${word}TopFlange`, side, gap / 2 + tw, gap / 2 + b, h - tf / 2, tf),
			outward(`${word}BottomFlange`, side, gap / 2 + tw, gap / 2 + b, tf / 2, tf)
		])
);

const angles = preset(
	'back-to-back-angles',
	'Angles back to back',
	[
		length('h', 'Upright leg', 100),
		length('b', 'Level leg', 75),
		length('t', 'Thickness', 10),
		clearance('gap', 'Gap between the backs', 10)
	],
	({ h, b, t, gap }) =>
		pair(gap, (side, word) => [
			upright(`${word}Upright`, 0, h, (side * (gap + t)) / 2, t),
			outward(`${word}Level`, side, gap / 2 + t, gap / 2 + b, t / 2, t)
		])
);

const tee = preset(
	'built-tee',
	'Built tee',
	[
		length('h', 'Depth', 250),
		length('b', 'Flange width', 200),
		length('tf', 'Flange thickness', 16),
		length('tw', 'Web thickness', 12)
	],
	({ h, b, tf, tw }) => ({
		plates: [level('flange', -b / 2, b / 2, h - tf / 2, tf), upright('web', 0, h - tf, 0, tw)]
	})
);

const thickenedGirder = preset(
	'girder-with-thickened-web',
	'Girder with a thickened web part',
	[
		length('h', 'Depth', 1200),
		length('bTop', 'Top flange width', 300),
		length('tfTop', 'Top flange thickness', 20),
		length('bBottom', 'Bottom flange width', 400),
		length('tfBottom', 'Bottom flange thickness', 30),
		length('tw', 'Web thickness', 10),
		length('thickDepth', 'Depth of the thickened part at the top', 300),
		length('thickThickness', 'Thickness of the thickened part', 14)
	],
	({ h, bTop, tfTop, bBottom, tfBottom, tw, thickDepth, thickThickness }) => {
		const [top, joint] = [h - tfTop, h - tfTop - thickDepth];
		return {
			plates: [
				level('topFlange', -bTop / 2, bTop / 2, h - tfTop / 2, tfTop),
				upright('upperWeb', joint, top, 0, thickThickness),
				upright('web', tfBottom, joint, 0, tw),
				level('bottomFlange', -bBottom / 2, bBottom / 2, tfBottom / 2, tfBottom)
			]
		};
	}
);

const zed = preset(
	'zed',
	'Z',
	[
		length('h', 'Depth', 200),
		length('b', 'Flange width', 80),
		length('tf', 'Flange thickness', 10),
		length('tw', 'Web thickness', 8)
	],
	({ h, b, tf, tw }) => ({
		plates: [
			outward('topFlange', 1, tw / 2, b - tw / 2, h - tf / 2, tf),
			upright('web', 0, h, 0, tw),
			outward('bottomFlange', -1, tw / 2, b - tw / 2, tf / 2, tf)
		]
	})
);

/** Shapes that free plates are begun from, in the order that they are offered. */
export const platePresets: readonly PlatePreset[] = [
	coveredI,
	stiffenedBox,
	cruciform,
	channels,
	angles,
	tee,
	thickenedGirder,
	zed
];
