import { limits } from '../../api/limits';
import { fail, ok, type Result } from '../../engine/result';
import type { Refusal } from './refusal';

const tooLarge: Refusal = {
	status: 413,
	code: 'body_too_large',
	message: `The request is larger than ${limits.body / 1024} KiB. Send fewer states or points at a time.`
};

const wrongType = (given: string | null): Refusal => ({
	status: 415,
	code: 'unsupported_media_type',
	message: `Send the request as content-type application/json, not ${given ?? 'without a type'}.`
});

const malformed = (error: unknown): Refusal => ({
	status: 400,
	code: 'malformed_json',
	message: `The request is not JSON: ${error instanceof Error ? error.message : 'it cannot be read'}.`
});

const isJson = (type: string | null) =>
	/^application\/(?:[\w.+-]+\+)?json\s*(?:;|$)/i.test(type ?? '');

const isTooLarge = (error: unknown) =>
	typeof error === 'object' && error !== null && 'status' in error && error.status === 413;

const bodyText = async (request: Request): Promise<Result<string, Refusal>> => {
	if (Number(request.headers.get('content-length')) > limits.body) return fail(tooLarge);
	try {
		const text = await request.text();
		return Buffer.byteLength(text) > limits.body ? fail(tooLarge) : ok(text);
	} catch (error) {
		if (isTooLarge(error)) return fail(tooLarge);
		throw error;
	}
};

/** The JSON that came with a request; 413, 415 or 400 as a value. */
export const jsonBody = async (request: Request): Promise<Result<unknown, Refusal>> => {
	const type = request.headers.get('content-type');
	if (!isJson(type)) return fail(wrongType(type));
	const text = await bodyText(request);
	if (!text.ok) return text;
	try {
		return ok(JSON.parse(text.value));
	} catch (error) {
		return fail(malformed(error));
	}
};
