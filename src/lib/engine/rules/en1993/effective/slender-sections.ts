import type { SectionDefinition } from '../../../section/definition';

/** For tests: a section of each kind with class 4 plates, by name. */
export const slender: Readonly<Record<string, SectionDefinition>> = {
	'welded I': {
		kind: 'i',
		fabrication: 'welded',
		h: 1540,
		b: 600,
		tf: 12,
		tw: 8,
		weldLeg: 6,
		grade: 'S355'
	},
	'mono-symmetric I': {
		kind: 'i',
		fabrication: 'welded',
		h: 1200,
		b: 300,
		tf: 10,
		bBottom: 500,
		tfBottom: 25,
		tw: 6,
		weldLeg: 5,
		grade: 'S460'
	},
	'rolled I': {
		kind: 'i',
		fabrication: 'rolled',
		h: 900,
		b: 300,
		tf: 6,
		tw: 5,
		r: 12,
		grade: 'S460'
	},
	channel: { kind: 'channel', h: 400, b: 150, tw: 4, tf: 5, r: 8, grade: 'S355' },
	'tapered channel': {
		kind: 'channel',
		h: 400,
		b: 150,
		tw: 4,
		tf: 5,
		r: 8,
		rToe: 2,
		flangeSlopePercent: 2,
		grade: 'S355'
	},
	tee: {
		kind: 'tee',
		fabrication: 'welded',
		h: 300,
		b: 300,
		tw: 6,
		tf: 8,
		weldLeg: 4,
		grade: 'S355'
	},
	angle: { kind: 'angle', h: 200, b: 150, t: 6, r: 10, rToe: 5, grade: 'S355' },
	tube: {
		kind: 'rectangular-hollow',
		h: 400,
		b: 200,
		t: 4,
		ro: 6,
		ri: 2,
		fabrication: 'cold-formed',
		grade: 'S355'
	},
	box: {
		kind: 'box',
		h: 1000,
		b: 900,
		tw: 6,
		tfTop: 8,
		tfBottom: 10,
		webGap: 700,
		weldLeg: 4,
		grade: 'S355'
	}
};
