import type { ProofQuery } from '$lib/api/proof';

/** Address of the page, or of its CSV file, with these parameters; what is not set is left out. */
export function proofAddress(
	asked: Partial<Record<keyof ProofQuery, string | number | undefined>>,
	path: '/proof' | '/proof/checks.csv' = '/proof'
): string {
	const kept = Object.entries(asked).filter(
		([key, value]) => value !== undefined && value !== '' && !isUsual(key, value)
	);
	const text = new URLSearchParams(kept.map(([key, value]) => [key, String(value)])).toString();
	return text ? `${path}?${text}` : path;
}

const isUsual = (key: string, value: string | number): boolean =>
	(key === 'page' && Number(value) === 1) || (key === 'pageSize' && Number(value) === 50);
