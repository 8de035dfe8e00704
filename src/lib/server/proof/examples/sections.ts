import { bending } from '../../../engine/response/respond';
import { analyse, type Analysis, type AnalyseRequest } from '../../../engine/rules/analyse';
import type { SectionDefinition } from '../../../engine/section/definition';
import { prepareSection } from '../../../engine/section/prepare';
import type { PreparedSection } from '../../../engine/section/prepared';
import type { Input } from './worked-example';

export const inch = 25.4;
/** N/mm² in one ksi. */
export const ksi = (1000 * 4.448_221_615_260_5) / inch ** 2;
/** kNm in one kip·in. */
export const kipInch = 4.448_221_615_260_5 * inch * 1e-3;
export const kipFoot = 12 * kipInch;

/** The section of an example; one that the engine refuses is a fault of the data. */
export function built(definition: SectionDefinition): PreparedSection {
	const result = prepareSection(definition);
	if (result.ok) return result.value;
	throw new Error(result.error.map(({ message }) => message).join(' '));
}

export const analysed = (definition: SectionDefinition, request?: AnalyseRequest): Analysis =>
	analyse(built(definition), request);

/** A figure on the way to a result, by the key of its working; null where there is none. */
export const step = ({ explain }: Analysis, key: string): number | null =>
	explain?.[key]?.result.value ?? null;

/** A classified part; null where it is not classified. */
export const plate = ({ classification }: Analysis, part: string) =>
	classification?.elements.find((each) => each.part === part) ?? null;

/** Rolled I with the example's h, b, tw, tf, r; fy by name or given. */
export const rolledI = (input: Input, fy = input('fy')): SectionDefinition => ({
	...{ kind: 'i', fabrication: 'rolled', grade: fy },
	...{ h: input('h'), b: input('b'), tw: input('tw'), tf: input('tf'), r: input('r') }
});

export const hotFinished = (h: number, b: number, t: number, fy: number): SectionDefinition => ({
	...{ kind: 'rectangular-hollow', fabrication: 'hot-finished', grade: fy },
	...{ h, b, t }
});

/** Bent about y–y without N. */
export const bent = (section: PreparedSection) =>
	bending(section, { axisAngle: 0, transverse: 'moment-zero', N: 0 });
