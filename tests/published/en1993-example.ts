import { readFileSync } from 'node:fs';
import { analyse, type Analysis, type AnalyseRequest } from '../../src/lib/engine/rules/analyse';
import type { SectionDefinition } from '../../src/lib/engine/section/definition';
import { prepareSection } from '../../src/lib/engine/section/prepare';

/** A published worked example: where it stands, what goes in, what must come out. */
export interface WorkedExample {
	readonly id: string;
	readonly source: string;
	readonly clause: string;
	readonly inputs: Readonly<Record<string, number>>;
	readonly expected: Readonly<Record<string, number>>;
}

const file = new URL('../../data/published/worked-examples.json', import.meta.url);
const examples = JSON.parse(readFileSync(file, 'utf8')) as readonly WorkedExample[];

export function workedExample(id: string): WorkedExample {
	const example = examples.find((each) => each.id === id);
	if (!example) throw new Error(`There is no worked example ${id}.`);
	return example;
}

/** One number of an example; a name that is not there is a mistake in the test. */
export function figure(from: Readonly<Record<string, number>>, name: string): number {
	const value = from[name];
	if (typeof value !== 'number') throw new Error(`The example gives no number ${name}.`);
	return value;
}

/** Rolled I with the example's h, b, tw, tf, r and fy. */
export function rolledI({ inputs }: WorkedExample): SectionDefinition {
	const of = (name: string) => figure(inputs, name);
	const sizes = { h: of('h'), b: of('b'), tw: of('tw'), tf: of('tf'), r: of('r') };
	return { kind: 'i', fabrication: 'rolled', ...sizes, grade: of('fy') };
}

export function analysed(definition: SectionDefinition, request?: AnalyseRequest): Analysis {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	return analyse(section.value, request);
}

/** The classified part of that name. */
export function element({ classification }: Analysis, part: string) {
	const found = classification?.elements.find((each) => each.part === part);
	if (!found) throw new Error(`${part} is not classified.`);
	return found;
}
