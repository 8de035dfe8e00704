import type { ProofList, ProofQuery } from '../../api/proof';
import type { ProofCheck } from './check';
import { proof, type Proof } from './proof';

/** Text of each check that words are looked for in, made once for each. */
const searched = new WeakMap<ProofCheck, string>();

function searchText(check: ProofCheck): string {
	const known = searched.get(check);
	if (known !== undefined) return known;
	const { id, source, standard, clause, quantity, unit } = check;
	const text = plain([id, check.case, source, standard, clause ?? '', quantity, unit].join(' '));
	searched.set(check, text);
	return text;
}

/** Small letters, with the x of a typed size for a times sign. */
const plain = (text: string): string => text.toLowerCase().replaceAll('×', 'x');

type Asked = Omit<ProofQuery, 'page' | 'pageSize'>;

/** The checks asked for, in the order of the registry or by how much of the tolerance they use. */
export function checksAsked({ checks }: Proof, asked: Asked): readonly ProofCheck[] {
	const words = plain(asked.q).split(/\s+/).filter(Boolean);
	const found = checks.filter(
		(check) =>
			(asked.family === undefined || check.family === asked.family) &&
			(asked.standard === undefined || check.standard === asked.standard) &&
			(asked.memory === undefined || check.fromMemory === (asked.memory === 'only')) &&
			(asked.result === undefined || check.pass === (asked.result === 'passed')) &&
			words.every((word) => searchText(check).includes(word))
	);
	return asked.sort === undefined ? found : found.toSorted(heaviestFirst);
}

/** Failures first, those without a figure before all. */
const weight = ({ pass, use }: ProofCheck): number => (pass ? (use ?? 0) : (use ?? Infinity));

const heaviestFirst = (a: ProofCheck, b: ProofCheck): number =>
	weight(a) === weight(b) ? 0 : weight(b) - weight(a);

/** One page of the checks asked for. */
export async function listProof({ page, pageSize, ...asked }: ProofQuery): Promise<ProofList> {
	const all = await proof();
	const found = checksAsked(all, asked);
	return {
		engineVersion: all.engineVersion,
		families: [...all.families],
		items: found.slice((page - 1) * pageSize, page * pageSize),
		...{ total: found.length, page, pageSize }
	};
}
