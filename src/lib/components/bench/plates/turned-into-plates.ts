import type {
	BoxSection,
	FlatSection,
	ISection,
	Plate,
	PlateJoin,
	PlatesSection,
	SectionDefinition,
	TeeSection
} from '$lib/engine/section/definition';
import { level, upright } from '$lib/engine/section/plates/preset';
import { weldLegOf } from '$lib/engine/section/weld-leg';

/** Free plates for a section, or why it cannot be made of them. */
export type TurnedIntoPlates =
	| { readonly plates: PlatesSection; readonly why: null }
	| { readonly plates: null; readonly why: string };

/**
 * A section of parts as free plates in the same place: names, grades, welds and bolt holes stay.
 * Only shapes whose parts are rectangles can be turned: roots, corners and slopes would be lost.
 */
export function turnedIntoPlates(section: SectionDefinition): TurnedIntoPlates {
	switch (section.kind) {
		case 'i':
			return section.fabrication === 'rolled' ? rolled : made(section, iPlates(section));
		case 'tee':
			return section.fabrication === 'rolled' ? rolled : made(section, teePlates(section));
		case 'box':
			return made(section, boxPlates(section));
		case 'flat':
			return made(section, flatPlate(section));
		case 'channel':
		case 'angle':
		case 'rectangular-hollow':
			return rolled;
		case 'circular-hollow':
		case 'round':
			return { plates: null, why: 'It is round: no flat plates make it.' };
		case 'plates':
		case 'outline':
			return { plates: null, why: '' };
	}
}

const rolled: TurnedIntoPlates = {
	plates: null,
	why: 'It has rounded roots or corners, which free plates have not: its figures would change.'
};

interface Parts {
	readonly plates: readonly Plate[];
	/** Pairs of parts that a fillet joins. */
	readonly pairs: readonly (readonly [string, string])[];
	readonly leg: number;
}

function made(section: SectionDefinition, { plates, pairs, leg }: Parts): TurnedIntoPlates {
	const { grade, partGrades = {}, boltHoles } = section;
	const graded = plates.map((plate) => {
		const own = partGrades[plate.name];
		return own === undefined ? plate : { ...plate, grade: own };
	});
	const joins = pairs.map(([a, b]): PlateJoin => ({ a, b, weldLeg: leg }));
	return {
		plates: {
			kind: 'plates',
			grade,
			plates: graded,
			...(leg > 0 && { joins }),
			...(boltHoles && { boltHoles })
		},
		why: null
	};
}

const centred = (name: string, width: number, y: number, z: number, thickness: number) =>
	level(name, y - width / 2, y + width / 2, z, thickness);

function iPlates(i: ISection): Parts {
	const [b, t] = [i.bBottom ?? i.b, i.tfBottom ?? i.tf];
	const y = Math.max(i.b, b) / 2;
	return {
		plates: [
			centred('topFlange', i.b, y, i.h - i.tf / 2, i.tf),
			upright('web', t, i.h - i.tf, y, i.tw),
			centred('bottomFlange', b, y, t / 2, t)
		],
		pairs: [
			['topFlange', 'web'],
			['web', 'bottomFlange']
		],
		leg: weldLegOf(i)
	};
}

function teePlates(tee: TeeSection): Parts {
	return {
		plates: [
			centred('flange', tee.b, tee.b / 2, tee.h - tee.tf / 2, tee.tf),
			upright('web', 0, tee.h - tee.tf, tee.b / 2, tee.tw)
		],
		pairs: [['flange', 'web']],
		leg: weldLegOf(tee)
	};
}

function boxPlates(box: BoxSection): Parts {
	const bottom = box.bBottom ?? box.b;
	const y = Math.max(box.b, bottom) / 2;
	const side = (box.webGap + box.tw) / 2;
	const web = (name: string, at: number) =>
		upright(name, box.tfBottom, box.h - box.tfTop, at, box.tw);
	const flanges = ['topFlange', 'bottomFlange'] as const;
	return {
		plates: [
			centred('topFlange', box.b, y, box.h - box.tfTop / 2, box.tfTop),
			web('leftWeb', y - side),
			web('rightWeb', y + side),
			centred('bottomFlange', bottom, y, box.tfBottom / 2, box.tfBottom)
		],
		pairs: flanges.flatMap((flange) => [
			[flange, 'leftWeb'] as const,
			[flange, 'rightWeb'] as const
		]),
		leg: weldLegOf(box)
	};
}

const flatPlate = ({ b, h }: FlatSection): Parts => ({
	plates: [upright('bar', 0, h, b / 2, b)],
	pairs: [],
	leg: 0
});
