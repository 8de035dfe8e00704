import { json } from '@sveltejs/kit';
import { health } from '$lib/server/health';

/** 200 when this instance can serve everything, 503 when only what needs no database works. */
export const GET = async () => {
	const state = await health();
	return json(state, {
		status: state.status === 'ok' ? 200 : 503,
		headers: { 'cache-control': 'no-store' }
	});
};
