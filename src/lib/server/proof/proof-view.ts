import { proofQuerySchema } from '../../api/proof';
import { examplesNotCovered, rulesFromMemory, rulesLeftOut } from './gaps';
import { proof } from './proof';
import { listProof } from './proof-list';

/** What the address asks for; nonsense in it shows everything. */
export function proofAsked(parameters: URLSearchParams) {
	const filled = [...parameters].filter(([, value]) => value !== '');
	return proofQuerySchema.catch(proofQuerySchema.parse({})).parse(Object.fromEntries(filled));
}

/** Everything that the page shows. */
export async function proofView(parameters: URLSearchParams) {
	const asked = proofAsked(parameters);
	const list = await listProof(asked);
	const { checks } = await proof();
	return {
		list,
		asked,
		standards: [...new Set(checks.map(({ standard }) => standard))],
		examplesNotCovered: examplesNotCovered(),
		rulesLeftOut,
		rulesFromMemory
	};
}
export type ProofView = Awaited<ReturnType<typeof proofView>>;
