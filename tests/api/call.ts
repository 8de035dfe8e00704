import { inject } from 'vitest';

export interface Answer {
	status: number;
	headers: Headers;
	body: unknown;
}

/** Calls the app under test; a body is sent as JSON. */
export const call = async (path: string, init: RequestInit = {}): Promise<Answer> => {
	const response = await fetch(`${inject('baseUrl')}${path}`, init);
	const text = await response.text();
	const { status, headers } = response;
	return { status, headers, body: text === '' ? null : JSON.parse(text) };
};

export const post = (path: string, body: unknown): Promise<Answer> =>
	call(path, {
		method: 'POST',
		headers: { 'content-type': 'application/json' },
		body: JSON.stringify(body)
	});
