import { proofView } from '$lib/server/proof/proof-view';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = ({ url }) => proofView(url.searchParams);
