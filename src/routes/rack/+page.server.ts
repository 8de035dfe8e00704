import { rackView } from '$lib/server/sections/rack-view';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = ({ locals, url }) => rackView(locals.person, url.searchParams);
