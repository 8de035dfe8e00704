import type { Issue } from '../../engine/result';

/** An expected refusal on its way to the wire. `code` is for programs, `message` for people. */
export interface Refusal {
	readonly status: 400 | 401 | 403 | 404 | 405 | 409 | 413 | 415 | 422 | 429 | 499;
	readonly code: string;
	readonly message: string;
	readonly issues?: readonly Issue[];
	readonly headers?: Readonly<Record<string, string>>;
}

const aboutSection = ({ path }: Issue) => path === 'section' || path.startsWith('section.');

/** 400 for what is wrong inside a request; the first sentence stands on top. */
export const invalid = (issues: readonly Issue[]): Refusal => ({
	status: 400,
	code: issues.every(aboutSection) ? 'invalid_section' : 'invalid_request',
	message: issues[0]?.message ?? 'The request is not valid.',
	issues
});

/** The refusal as an answer in the error shape of the contract. */
export const refused = ({ status, headers, ...error }: Refusal): Response =>
	Response.json({ error }, { status, headers });
