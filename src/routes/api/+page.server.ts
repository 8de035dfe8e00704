import { apiExamples } from '$lib/server/http/compute/api-examples';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async () => ({ examples: await apiExamples() });
