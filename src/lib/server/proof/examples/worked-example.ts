import { readFileSync } from 'node:fs';
import type { MemoryConfidence, ProofFamily } from '../check';
import { publishedFile } from '../root';

type Expected = number | boolean | string | readonly string[];

/** A published worked example: where it stands, what goes in, what must come out. */
export interface WorkedExample {
	readonly id: string;
	readonly source: string;
	readonly clause: string;
	readonly from_memory: boolean;
	readonly memory_confidence: MemoryConfidence | null;
	readonly inputs: Readonly<Record<string, unknown>>;
	readonly expected: Readonly<Record<string, Expected>>;
	readonly tolerance: Readonly<Record<string, 'exact' | { abs: number } | { rel: number }>>;
}

/** A number put into the example, by name; one that is not there is a fault of the data. */
export type Input = (name: string) => number;

/** What the engine gives for the quantities that the example prints. */
export type Ours = Readonly<Record<string, number | string | boolean | null | undefined>>;

/** How an example is worked by the engine. */
export interface ExampleWork {
	readonly family: ProofFamily;
	/** The standard with its edition, or what the example rests on. */
	readonly standard: string;
	/** Which section, under what. */
	readonly case: string;
	readonly ours: (input: Input) => Ours;
	/** Printed quantities that the engine reports nowhere, and why. */
	readonly leftOut?: Readonly<Record<string, string>>;
	readonly remarks?: Readonly<Record<string, string>>;
}

export type ExampleWorks = Readonly<Record<string, ExampleWork>>;

/** All published worked examples, of every code. Throws when the file is damaged. */
export const workedExamples = (): readonly WorkedExample[] =>
	JSON.parse(readFileSync(publishedFile('worked-examples.json'), 'utf8')) as WorkedExample[];

export const inputOf =
	({ id, inputs }: WorkedExample): Input =>
	(name) => {
		const value = inputs[name];
		if (typeof value === 'number') return value;
		throw new Error(`${id} gives no number ${name}.`);
	};
