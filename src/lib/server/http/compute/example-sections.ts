import type { SectionDefinition, SectionKind } from '../../../engine/section/definition';

const grade = 'S355';

/** One plain section of each kind, for the page that explains the API and for its tests; invented. */
export const exampleSections: Readonly<Record<SectionKind, SectionDefinition>> = {
	i: { kind: 'i', h: 900, b: 300, tw: 12, tf: 25, fabrication: 'welded', weldLeg: 6, grade },
	channel: { kind: 'channel', h: 200, b: 75, tw: 8.5, tf: 11.5, r: 11.5, grade },
	tee: { kind: 'tee', h: 150, b: 150, tw: 7, tf: 10.5, r: 15, fabrication: 'rolled', grade },
	angle: { kind: 'angle', h: 120, b: 80, t: 10, r: 11, rToe: 5.5, grade },
	'rectangular-hollow': {
		...{ kind: 'rectangular-hollow', h: 200, b: 100, t: 8, ro: 12, ri: 8 },
		...{ fabrication: 'hot-finished', grade }
	},
	'circular-hollow': { kind: 'circular-hollow', d: 168.3, t: 8, grade },
	box: { kind: 'box', h: 800, b: 500, tw: 10, tfTop: 20, tfBottom: 20, webGap: 440, grade },
	flat: { kind: 'flat', b: 20, h: 100, grade },
	round: { kind: 'round', d: 60, grade },
	plates: {
		kind: 'plates',
		plates: [
			{ name: 'web', width: 400, thickness: 10, y: 0, z: 0, angle: 90 },
			{ name: 'top', width: 200, thickness: 16, y: 0, z: 208, angle: 0 },
			{ name: 'bottom', width: 200, thickness: 16, y: 0, z: -208, angle: 0 }
		],
		grade
	},
	outline: {
		kind: 'outline',
		outer: [
			[0, 0],
			[100, 0],
			[100, 20],
			[20, 20],
			[20, 100],
			[0, 100]
		],
		grade
	}
};
