import { error } from '@sveltejs/kit';
import type { RequestEvent } from '@sveltejs/kit';
import { describe, expect, it, vi } from 'vitest';
import { handled, onlyMethods } from './handled';

vi.mock('../log', () => ({ log: { error: vi.fn() } }));

const event = (body?: string) =>
	({
		request: new Request('http://localhost/', { method: 'POST', ...(body ? { body } : {}) }),
		locals: { requestId: 'request-1' }
	}) as unknown as RequestEvent;
const read = async (response: Response) => ({
	status: response.status,
	body: (await response.json()) as unknown
});

describe('handled', () => {
	it('answers a bug with 500, an id and nothing internal', async () => {
		const { status, body } = await read(
			await handled(event(), () => {
				throw new Error('secret path /etc');
			})
		);
		expect({ status, body }).toMatchObject({
			status: 500,
			body: { error: { code: 'internal', id: 'request-1' } }
		});
		expect(JSON.stringify(body)).not.toContain('secret');
	});

	it('tells when the database is away', async () => {
		const away = Object.assign(new Error('connect'), { code: 'ECONNREFUSED' });
		const { status, body } = await read(await handled(event(), () => Promise.reject(away)));
		expect({ status, body }).toMatchObject({
			status: 503,
			body: { error: { code: 'database_away' } }
		});
	});

	it('keeps the status of an error that was meant', async () => {
		const { status } = await read(await handled(event(), () => error(403, 'Not yours.')));
		expect(status).toBe(403);
	});

	it('reads what a refused request still sends', async () => {
		const refusedEvent = event('x'.repeat(100_000));
		const response = await onlyMethods('GET')(refusedEvent);
		expect(response.headers.get('allow')).toBe('GET');
		expect(refusedEvent.request.bodyUsed).toBe(true);
	});
});
