import { fail, ok, type Result } from '../engine/result';
import type { AnalyseAnswer, analyseRequestSchema } from './analyse';
import { errorSchema, type ApiError } from './error';
import type { InteractionAnswer, interactionRequestSchema } from './interaction';
import type { ResponseAnswer, responseRequestSchema } from './response';
import type { z } from './zod';

interface CallOptions {
	/** SvelteKit's own fetch inside `load`; the browser's otherwise. */
	fetch?: typeof fetch;
	signal?: AbortSignal;
}

const unreachable: ApiError = {
	status: 0,
	code: 'unreachable',
	message: 'The server cannot be reached. Check the connection and try again.'
};

const stopped: ApiError = { status: 0, code: 'aborted', message: 'The call was stopped.' };

const errorOf = async (response: Response): Promise<ApiError> => {
	const body = errorSchema.safeParse(await response.json().catch(() => null));
	return body.success
		? { status: response.status, ...body.data.error }
		: {
				status: response.status,
				code: 'unexpected',
				message: `The server answered ${response.status} without saying why. Try again.`
			};
};

const call = async <Out>(
	path: string,
	init: RequestInit,
	options: CallOptions
): Promise<Result<Out, ApiError>> => {
	try {
		const response = await (options.fetch ?? fetch)(path, {
			...init,
			...(options.signal ? { signal: options.signal } : {})
		});
		return response.ok ? ok((await response.json()) as Out) : fail(await errorOf(response));
	} catch {
		return fail(options.signal?.aborted ? stopped : unreachable);
	}
};

/** POST of JSON; the answer is trusted to be what the contract says. Never rejects. */
export const post = <Out>(
	path: string,
	body: unknown,
	options: CallOptions = {}
): Promise<Result<Out, ApiError>> => {
	const headers = { 'content-type': 'application/json', accept: 'application/json' };
	return call(path, { method: 'POST', headers, body: JSON.stringify(body) }, options);
};

/** GET of JSON. Never rejects. */
export const get = <Out>(path: string, options: CallOptions = {}): Promise<Result<Out, ApiError>> =>
	call(path, { headers: { accept: 'application/json' } }, options);

export const postAnalyse = (request: z.input<typeof analyseRequestSchema>, options?: CallOptions) =>
	post<AnalyseAnswer>('/api/v1/analyse', request, options);

export const postResponse = (
	request: z.input<typeof responseRequestSchema>,
	options?: CallOptions
) => post<ResponseAnswer>('/api/v1/response', request, options);

export const postInteraction = (
	request: z.input<typeof interactionRequestSchema>,
	options?: CallOptions
) => post<InteractionAnswer>('/api/v1/interaction', request, options);
