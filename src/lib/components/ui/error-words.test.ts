import { describe, expect, it } from 'vitest';
import { errorDetail, errorWords } from './error-words';

describe('an error page', () => {
	it('says what happened and what to do, whatever the status', () => {
		for (const status of [400, 401, 403, 404, 409, 418, 429, 500, 502, 503]) {
			const words = errorWords(status);
			for (const sentence of [words.title, words.what, words.act])
				expect(sentence).toMatch(/^[A-Z].*\.$/);
		}
	});

	it('offers signing in only where that would help, and loading again only where it may', () => {
		expect(errorWords(401).signIn).toBe(true);
		expect(errorWords(500).retry).toBe(true);
		expect(errorWords(404).retry).toBeUndefined();
	});

	it('repeats a route’s own sentence but nothing from inside the server', () => {
		expect(errorDetail(404, 'No section has this number.')).toBe('No section has this number.');
		expect(errorDetail(404, 'Not Found')).toBeUndefined();
		expect(errorDetail(500, 'ECONNREFUSED 10.0.0.3')).toBeUndefined();
	});
});
