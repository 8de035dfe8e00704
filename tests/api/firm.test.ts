import { describe, expect, it } from 'vitest';
import demo from '../../src/lib/server/seed/demo-accounts.json';
import { owner, signedIn, visitor, type Visitor } from './visitor';

const path = '/api/v1/firm';
const changers = new Set(['owner', 'librarian']);
const stock = {
	thicknesses: [8, 10, 12, 16, 20],
	widthStep: 25,
	depthStep: 100,
	stiffenerStep: 500
};
const code = { standard: 'EN1993-1-1:2005', gammaM0: 1.05, strengthBasis: 'code-table' };

interface Answer {
	settings: { version: number; code: unknown; stock: unknown; updatedBy: string | null };
	defaultStock: { thicknesses: number[] };
	error?: { code: string; message: string };
	theirs?: { version: number };
}

const ask = async (browser: Visitor, method: string, body?: unknown) => {
	const answer = await browser.json(method, path, body);
	return { status: answer.status, body: answer.body as unknown as Answer };
};

describe('settings of a firm', () => {
	it('are the defaults until something is settled', async () => {
		const { browser } = await owner();
		const { status, body } = await ask(browser, 'GET');
		expect(status).toBe(200);
		expect(body.settings).toMatchObject({ version: 0, code: null, stock: null });
		expect(body.defaultStock.thicknesses).toContain(20);
	});

	it('are kept with who changed them, and go back to the default by null', async () => {
		const { browser } = await owner();
		const first = await ask(browser, 'PATCH', { version: 0, code, stock });
		expect(first.body.settings).toMatchObject({ version: 1, code, stock });
		const second = await ask(browser, 'PATCH', { version: 1, stock: null });
		expect(second.body.settings).toMatchObject({ version: 2, code, stock: null });
		expect((await ask(browser, 'GET')).body.settings).toMatchObject({ version: 2, stock: null });
	});

	it('that moved on are not overwritten unseen', async () => {
		const { browser } = await owner();
		await ask(browser, 'PATCH', { version: 0, stock });
		const late = await ask(browser, 'PATCH', { version: 0, code });
		expect(late.status).toBe(409);
		expect(late.body.theirs?.version).toBe(1);
	});

	it('take the first of two first versions that come at once', async () => {
		const { browser } = await owner();
		const both = await Promise.all([
			ask(browser, 'PATCH', { version: 0, stock }),
			ask(browser, 'PATCH', { version: 0, code })
		]);
		expect(both.map(({ status }) => status).sort()).toEqual([200, 409]);
	});

	it.each([
		[{ ...stock, thicknesses: [] }, /one thickness at least/],
		[{ ...stock, thicknesses: [12, 10] }, /must rise/],
		[{ ...stock, widthStep: 0 }, /Step of widths must be from 1 to 5000 mm, not 0/]
	])('refuse the stock %j', async (wrong, message) => {
		const { browser } = await owner();
		const { status, body } = await ask(browser, 'PATCH', { version: 0, stock: wrong });
		expect(status).toBe(400);
		expect(body.error?.message).toMatch(message);
	});

	it('are for members only, and changed by owner and librarian only', async () => {
		expect((await ask(visitor(), 'GET')).status).toBe(401);
		for (const { email, role } of demo.people) {
			const browser = await signedIn(email, demo.password);
			expect((await ask(browser, 'GET')).status).toBe(200);
			const changed = await ask(browser, 'PATCH', { version: 1000, stock });
			expect([role, changed.status]).toEqual([role, changers.has(role) ? 409 : 403]);
		}
	});
});
