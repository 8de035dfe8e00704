import { inject } from 'vitest';

/** A browser as far as the tests need one: it keeps cookies and sends its origin. */
export interface Visitor {
	/** Posts a form as a page of this site would; redirects are not followed. */
	form: (path: string, fields: Record<string, string>) => Promise<Response>;
	/** Calls the JSON API. */
	json: (method: string, path: string, body?: unknown) => Promise<{ status: number; body: Body }>;
	/** Text of a page. */
	page: (path: string) => Promise<{ status: number; text: string }>;
	/** What it would send as cookies; a copy of it is a copied session. */
	cookies: () => string;
}

/** Loosely typed on purpose: tests look at what the wire carries. */
export interface Body {
	[key: string]: unknown;
	error?: { code: string; message: string; issues?: { path: string; message: string }[] };
	section?: Section;
	items?: Section[];
	total?: number;
	theirs?: Section;
	yours?: Record<string, unknown>;
}

export interface Section {
	id: string;
	name: string;
	version: number;
	status: string;
	inputHash: string;
	area: number;
	mass: number;
	h: number;
	b: number;
	definition: Record<string, unknown>;
	updatedBy: { name: string };
}

const keepCookies = (jar: Map<string, string>, response: Response) => {
	for (const line of response.headers.getSetCookie()) {
		const [pair = ''] = line.split(';');
		const at = pair.indexOf('=');
		const isGone = /max-age=0/i.test(line) || /expires=Thu, 01 Jan 1970/i.test(line);
		if (isGone) jar.delete(pair.slice(0, at));
		else jar.set(pair.slice(0, at), pair.slice(at + 1));
	}
};

/** A visitor with no session, or with the cookies of somebody else. */
export const visitor = (copied = '', baseUrl = inject('baseUrl')): Visitor => {
	const jar = new Map(
		copied
			.split('; ')
			.filter(Boolean)
			.map((pair): [string, string] => [
				pair.slice(0, pair.indexOf('=')),
				pair.slice(pair.indexOf('=') + 1)
			])
	);
	const cookies = () => [...jar].map(([name, value]) => `${name}=${value}`).join('; ');
	const send = async (path: string, init: RequestInit): Promise<Response> => {
		const headers = { cookie: cookies(), origin: baseUrl, ...init.headers };
		const response = await fetch(`${baseUrl}${path}`, { ...init, headers, redirect: 'manual' });
		keepCookies(jar, response);
		return response;
	};
	return {
		cookies,
		form: (path, fields) =>
			send(path, {
				method: 'POST',
				headers: { accept: 'text/html' },
				body: new URLSearchParams(fields)
			}),

		json: async (method, path, body) => {
			const response = await send(path, {
				method,
				headers: { 'content-type': 'application/json' },
				...(body === undefined ? {} : { body: JSON.stringify(body) })
			});
			return { status: response.status, body: (await response.json()) as Body };
		},
		page: async (path) => {
			const response = await send(path, { headers: { accept: 'text/html' } });
			return { status: response.status, text: await response.text() };
		}
	};
};

let made = 0;

/** Somebody new, at an address that belongs to nobody. */
export const newcomer = () => {
	made += 1;
	const unique = `${Date.now().toString(36)}-${made}`;
	return {
		name: `Person ${unique}`,
		firm: `Firm ${unique}`,
		email: `person-${unique}@firm.example`,
		password: `long enough ${unique}`
	};
};

/** Somebody new who has made a firm and is signed in. */
export const owner = async (baseUrl = inject('baseUrl')) => {
	const person = newcomer();
	const browser = visitor('', baseUrl);
	const answer = await browser.form('/sign-up', person);
	if (answer.status !== 303) throw new Error(`Sign-up answered ${answer.status}`);
	return { person, browser };
};

/** A browser signed in as somebody who exists. */
export const signedIn = async (
	email: string,
	password: string,
	baseUrl = inject('baseUrl')
): Promise<Visitor> => {
	const browser = visitor('', baseUrl);
	const answer = await browser.form('/sign-in?/password', { email, password });
	if (answer.status !== 303) throw new Error(`Sign-in answered ${answer.status}`);
	return browser;
};
