import type { Plate, PlatesSection } from '$lib/engine/section/definition';
import { turnedRectangle } from '$lib/engine/section/plates/placing';

/** The section with one plate changed; a new name is carried to its joins, grades and holes. */
export function withPlate(
	section: PlatesSection,
	index: number,
	part: Partial<Plate>
): PlatesSection {
	const before = section.plates[index];
	if (!before) return section;
	const plates = section.plates.map((plate, at) => (at === index ? { ...plate, ...part } : plate));
	const changed = { ...section, plates };
	const shared = section.plates.some(({ name }, at) => at !== index && name === before.name);
	if (part.name === undefined || part.name === before.name || shared) return changed;
	return renamed(changed, before.name, part.name);
}

function renamed(section: PlatesSection, from: string, to: string): PlatesSection {
	const called = (name: string) => (name === from ? to : name);
	const { joins, partGrades, boltHoles } = section;
	return {
		...section,
		...(joins && {
			joins: joins.map((join) => ({ ...join, a: called(join.a), b: called(join.b) }))
		}),
		...(partGrades && {
			partGrades: Object.fromEntries(
				Object.entries(partGrades).map(([name, grade]) => [called(name), grade])
			)
		}),
		...(boltHoles && {
			boltHoles: boltHoles.map((holes) => ({ ...holes, part: called(holes.part) }))
		})
	};
}

/** The section without a plate and without what hung on its name. The last plate stays. */
export function withoutPlate(section: PlatesSection, index: number): PlatesSection {
	const gone = section.plates[index];
	if (!gone || section.plates.length === 1) return section;
	const { joins, partGrades, boltHoles } = section;
	return {
		...section,
		plates: section.plates.filter((_, at) => at !== index),
		...(joins && { joins: joins.filter(({ a, b }) => a !== gone.name && b !== gone.name) }),
		...(partGrades && {
			partGrades: Object.fromEntries(
				Object.entries(partGrades).filter(([name]) => name !== gone.name)
			)
		}),
		...(boltHoles && { boltHoles: boltHoles.filter(({ part }) => part !== gone.name) })
	};
}

/** Sizes of a plate that is added, mm. */
const added = { width: 100, thickness: 10 };

/** The section with one more plate, lying on its highest one. */
export function withNewPlate(section: PlatesSection): PlatesSection {
	const tops = section.plates.map(topOf);
	const host = section.plates[tops.indexOf(Math.max(...tops))];
	const plate: Plate = {
		...added,
		name: freePlateName(section, 'plate'),
		y: host?.y ?? 0,
		z: (host ? topOf(host) : 0) + added.thickness / 2,
		angle: 0
	};
	return joinedOn(section, plate, host);
}

/** The section with a copy of a plate, lying against its face. */
export function withCopy(section: PlatesSection, index: number): PlatesSection {
	const host = section.plates[index];
	if (!host) return section;
	const { along } = turnedRectangle(host);
	const plate: Plate = {
		...host,
		name: freePlateName(section, host.name),
		y: host.y - along.z * host.thickness,
		z: host.z + along.y * host.thickness
	};
	return joinedOn(section, plate, host);
}

/** Where joins are given one by one, a plate that is added gets its own. */
function joinedOn(section: PlatesSection, plate: Plate, host: Plate | undefined): PlatesSection {
	const { joins } = section;
	return {
		...section,
		plates: [...section.plates, plate],
		...(joins && host && { joins: [...joins, { a: host.name, b: plate.name }] })
	};
}

/** Height of the highest corner of a plate, mm. */
function topOf(plate: Plate): number {
	const { along, centre, halfWidth, halfThickness } = turnedRectangle(plate);
	return centre.z + Math.abs(along.z) * halfWidth + Math.abs(along.y) * halfThickness;
}

/** A name that no plate has yet: `cover2`. */
function freePlateName({ plates }: PlatesSection, name: string): string {
	const stem = name.replace(/\d+$/, '');
	let number = 2;
	while (plates.some((plate) => plate.name === `${stem}${number}`)) number += 1;
	return `${stem}${number}`;
}
