import { proofCheck, type ProofCheck, type ProofSource, type Tolerance } from '../check';
import { quantityOf } from './quantities';
import { inputOf, type ExampleWork, type WorkedExample } from './worked-example';

/** Every printed figure of an example that the engine gives too; what it gives not does not pass. */
export function exampleChecks(example: WorkedExample, work: ExampleWork): ProofCheck[] {
	const ours = work.ours(inputOf(example));
	const source = exampleSource(example, work);
	const held = Object.entries(example.expected).filter(([name]) => !(name in (work.leftOut ?? {})));
	return held.map(([name, expected]) => {
		const { words, unit } = quantityOf(name);
		const remark = work.remarks?.[name];
		return proofCheck(source, {
			id: `${example.id}/${name}`,
			case: work.case,
			...{ quantity: words, unit },
			published: plain(expected),
			ours: plain(ours[name] ?? null),
			tolerance: toleranceOf(example, name),
			...(remark === undefined ? {} : { remark })
		});
	});
}

const exampleSource = (example: WorkedExample, work: ExampleWork): ProofSource => ({
	family: work.family,
	source: `${example.id}. ${example.source}`,
	standard: work.standard,
	clause: example.clause,
	fromMemory: example.from_memory,
	memoryConfidence: example.memory_confidence
});

type Plain<T> = T extends boolean | readonly string[] ? string : T;

/** Yes and no in words, lists in one line. */
function plain<T extends number | string | boolean | readonly string[] | null>(value: T): Plain<T>;
function plain(value: number | string | boolean | readonly string[] | null) {
	if (typeof value === 'boolean') return value ? 'yes' : 'no';
	return typeof value === 'object' && value !== null ? value.join(', ') : value;
}

/** The tolerance that stands beside the figure in the data file; the same number where none does. */
function toleranceOf({ tolerance }: WorkedExample, name: string): Tolerance {
	const stated = tolerance[name] ?? 'exact';
	if (stated === 'exact') return { kind: 'exact' };
	const why = 'the digits that the example prints';
	return 'abs' in stated
		? { kind: 'absolute', value: stated.abs, why }
		: { kind: 'relative', value: stated.rel, why };
}
