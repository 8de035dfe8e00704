import type { Loop } from '../../../geometry/boundary';
import { closedLoop, reversedLoop } from '../../../geometry/loops';
import { frameAt } from '../../../geometry/frame';
import { profileOf } from '../../../geometry/profile';
import type { LawGroup, Mechanics } from '../../../response/law-groups';
import type { Part, PreparedSection } from '../../../section/prepared';
import { stripCorners, type Strip } from './strip';

/** The part that an element belongs to; the walls of a tube all to its one part. */
export function partOf({ parts }: PreparedSection, strip: Pick<Strip, 'element'>): Part {
	return parts.find(({ name }) => name === strip.element.part) ?? parts[0]!;
}

/** Loops of a part with its strips cut out: the strips run the other way round. */
export function cutLoops(
	section: PreparedSection,
	part: Part,
	strips: readonly Strip[]
): readonly Loop[] {
	const own = strips.filter((strip) => partOf(section, strip) === part);
	const holes = own.map((strip) => reversedLoop(closedLoop(stripCorners(strip))));
	return [...part.region.loops, ...holes];
}

/** The section's mechanics about its gross centroid with strips cut out. */
export function cutMechanics(
	section: PreparedSection,
	whole: Mechanics,
	strips: readonly Strip[]
): Mechanics {
	if (strips.length === 0) return whole;
	const groups = whole.groups.map((group): LawGroup => {
		const parts = section.parts.filter(({ region }) => group.loops.includes(region.loops[0]!));
		return { ...group, loops: parts.flatMap((part) => cutLoops(section, part, strips)) };
	});
	const kept = new Map<number, ReturnType<Mechanics['profiles']>>();
	const profiles = (angle: number) => {
		const known = kept.get(angle);
		if (known) return known;
		const frame = frameAt(whole.centroid, angle);
		const made = groups.map(({ loops }) => profileOf(loops, frame));
		kept.set(angle, made);
		return made;
	};
	const areas = profiles(0).map(({ total }) => total[0]!);
	return {
		...whole,
		groups,
		profiles,
		area: areas.reduce((sum, area) => sum + area, 0),
		squash: groups.reduce((sum, { fy, fyc }, i) => sum + areas[i]! * Math.min(fy, fyc), 0)
	};
}
