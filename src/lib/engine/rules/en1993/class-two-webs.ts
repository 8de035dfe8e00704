import type { PreparedSection } from '../../section/prepared';
import type { AxisSense } from '../section-moments';
import type { ClassifiedCase } from './classify';
import type { PlateElement } from './elements/element';
import type { EnModel } from './model';

/** Webs of one sense of bending, all alike; heights over the gross centroid towards the compressed side, mm. */
export interface Webs {
	/** Root at the compressed and at the pulled side. */
	readonly edge: number;
	readonly far: number;
	/** Thickness and ε of one web. */
	readonly t: number;
	readonly epsilon: number;
	/** Thickness times strength of all webs in compression and tension, N/mm. */
	readonly compression: number;
	readonly tension: number;
	/** Middle of the webs' forces across the axis of bending, from the gross centroid, mm. */
	readonly offset: number;
}

/** Lengths closer than this share of the web are the same. */
const sameLength = 1e-9;

/**
 * The class 3 webs between class 1 and 2 parts: `none` where the classes are others, `uneven` where
 * webs are not all of one thickness between the same levels.
 */
export function websOf(
	{ elements, section }: EnModel,
	sense: AxisSense,
	{ overall, elements: rows }: ClassifiedCase
): Webs | 'none' | 'uneven' {
	if (elements.kind !== 'plates' || overall !== 3) return 'none';
	const webs = elements.plates.filter((plate) => isWeb(plate, sense));
	const parts = new Set(webs.map(({ part }) => part));
	const third = rows.filter((row) => row.class === 3);
	if (third.some(({ type, part }) => type !== 'internal' || !parts.has(part))) return 'none';
	const [first] = webs;
	if (first === undefined) return 'none';
	const [edge, far] = levels(first, section, sense);
	const even = webs.every((web) => {
		const [own, other] = levels(web, section, sense);
		const near = Math.max(Math.abs(own - edge), Math.abs(other - far), Math.abs(web.t - first.t));
		return near <= sameLength * first.c;
	});
	return even ? together(webs, section, sense, [edge, far]) : 'uneven';
}

const isAboutY = (sense: AxisSense) => sense === 'plusMy' || sense === 'minusMy';

/** An internal part that runs from the compressed to the pulled side. */
function isWeb({ type, from, to, c }: PlateElement, sense: AxisSense): boolean {
	const across = isAboutY(sense) ? to.y - from.y : to.z - from.z;
	return type === 'internal' && c > 0 && Math.abs(across) <= sameLength * c;
}

/** Both ends of a web, the more compressed one first. */
function levels({ from, to }: PlateElement, { gross }: PreparedSection, sense: AxisSense) {
	const { y, z } = gross.centroid;
	const up = sense === 'plusMy' || sense === 'minusMz' ? 1 : -1;
	const [a, b] = isAboutY(sense) ? [from.z - z, to.z - z] : [from.y - y, to.y - y];
	return [Math.max(up * a, up * b), Math.min(up * a, up * b)] as const;
}

function together(
	webs: readonly PlateElement[],
	{ gross, parts }: PreparedSection,
	sense: AxisSense,
	[edge, far]: readonly [number, number]
): Webs {
	let [compression, tension, moment] = [0, 0, 0];
	for (const { part, t, from } of webs) {
		const { material } = parts.find(({ name }) => name === part) ?? parts[0]!;
		compression += t * material.fyc;
		tension += t * material.fy;
		const { y, z } = gross.centroid;
		moment += t * material.fyc * (isAboutY(sense) ? from.y - y : from.z - z);
	}
	const epsilon = Math.min(...webs.map((web) => web.epsilon));
	const { t } = webs[0]!;
	return { edge, far, t, epsilon, compression, tension, offset: moment / compression };
}
