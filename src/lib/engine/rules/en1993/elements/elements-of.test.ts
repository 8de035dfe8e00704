import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../../../section/definition';
import { prepareSection } from '../../../section/prepare';
import { elementsOf } from './elements-of';
import { strengthsOf } from '../strengths';

function plates(definition: SectionDefinition) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	const { elements } = elementsOf(section.value, strengthsOf(section.value));
	return elements?.kind === 'plates' ? elements.plates : [];
}

const width = (definition: SectionDefinition, part: string, type = 'internal') =>
	plates(definition).find((plate) => plate.part === part && plate.type === type)?.c;

const rolled: SectionDefinition = {
	kind: 'i',
	fabrication: 'rolled',
	h: 300,
	b: 150,
	tw: 7.1,
	tf: 10.7,
	r: 15,
	grade: 'S355'
};

describe('width c', () => {
	it('of a rolled I runs from root to root and from root to tip', () => {
		// IPE 300: c = 300 − 2·10.7 − 2·15 = 248.6; (150 − 7.1 − 30)/2 = 56.45
		expect(width(rolled, 'web')).toBeCloseTo(248.6, 10);
		expect(width(rolled, 'topFlange', 'outstand')).toBeCloseTo(56.45, 10);
	});

	it('of a welded I runs from the toe of the fillet, given by its leg or its throat', () => {
		const welded: SectionDefinition = { ...rolled, fabrication: 'welded', r: 0, weldLeg: 6 };
		expect(width(welded, 'web')).toBeCloseTo(300 - 21.4 - 12, 10);
		const { weldLeg: _leg, ...without } = welded;
		const throat: SectionDefinition = { ...without, weldThroat: 6 / Math.SQRT2 };
		expect(width(throat, 'web')).toBeCloseTo(300 - 21.4 - 12, 10);
	});

	it('of each flange of a mono-symmetric I is its own', () => {
		const uneven: SectionDefinition = {
			...rolled,
			fabrication: 'welded',
			r: 0,
			weldLeg: 0,
			bBottom: 250,
			tfBottom: 20
		};
		expect(width(uneven, 'topFlange', 'outstand')).toBeCloseTo((150 - 7.1) / 2, 10);
		expect(width(uneven, 'bottomFlange', 'outstand')).toBeCloseTo((250 - 7.1) / 2, 10);
		expect(width(uneven, 'web')).toBeCloseTo(300 - 30.7, 10);
	});

	it('of a rectangular tube is b − 3t, more where the corner is tighter than that', () => {
		const tube: SectionDefinition = {
			kind: 'rectangular-hollow',
			fabrication: 'hot-finished',
			h: 200,
			b: 100,
			t: 10,
			grade: 'S355'
		};
		expect(width(tube, 'topFlange')).toBeCloseTo(70, 10);
		expect(width({ ...tube, ro: 15, ri: 10 }, 'leftWeb')).toBeCloseTo(170, 10);
		expect(width({ ...tube, ro: 10, ri: 0 }, 'leftWeb')).toBeCloseTo(180, 10);
	});

	it('of a box is clear between webs, and beyond them less the fillet', () => {
		const box: SectionDefinition = {
			kind: 'box',
			h: 800,
			b: 600,
			tw: 10,
			tfTop: 20,
			tfBottom: 16,
			webGap: 400,
			weldLeg: 6,
			grade: 'S355'
		};
		expect(width(box, 'topFlange')).toBeCloseTo(400, 10);
		expect(width(box, 'topFlange', 'outstand')).toBeCloseTo((600 - 420) / 2 - 6, 10);
		expect(width(box, 'leftWeb')).toBeCloseTo(764, 10);
		expect(width({ ...box, b: 420 }, 'topFlange', 'outstand')).toBeUndefined();
	});
});

describe('ε', () => {
	it('of a hybrid web is that of the stronger flange, of a flange its own', () => {
		const hybrid: SectionDefinition = {
			...rolled,
			fabrication: 'welded',
			r: 0,
			partGrades: { topFlange: 460, bottomFlange: 355, web: 235 }
		};
		const epsilon = (part: string) => plates(hybrid).find((plate) => plate.part === part)?.epsilon;
		expect(epsilon('web')).toBeCloseTo(Math.sqrt(235 / 460), 12);
		expect(epsilon('topFlange')).toBeCloseTo(Math.sqrt(235 / 460), 12);
		expect(epsilon('bottomFlange')).toBeCloseTo(Math.sqrt(235 / 355), 12);
	});

	it('of a web stronger than its flanges is its own', () => {
		const strongWeb: SectionDefinition = {
			...rolled,
			partGrades: { topFlange: 235, bottomFlange: 235, web: 355 }
		};
		const web = plates(strongWeb).find(({ part }) => part === 'web');
		expect(web?.epsilon).toBeCloseTo(Math.sqrt(235 / 355), 12);
	});
});
