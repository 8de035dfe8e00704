import { chromium, type Browser, type Page } from 'playwright-core';
import { afterAll, beforeAll, expect, inject, it } from 'vitest';
import { proofListSchema } from '../../src/lib/api/proof';

let browser: Browser;

beforeAll(async () => {
	browser = await chromium.launch({
		executablePath: inject('chromiumPath'),
		args: ['--no-sandbox']
	});
});
afterAll(() => browser.close());

async function open(path: string): Promise<Page> {
	const page = await browser.newPage({ viewport: { width: 1440, height: 900 } });
	await page.goto(inject('baseUrl') + path);
	return page;
}

it('shows without an account that every published value is met, and narrows the list to a search', async () => {
	const page = await open('/proof');
	const heading = await page.getByRole('heading', { level: 1 }).textContent();
	expect(heading).toMatch(/^Proof: 8\u202f408 published values, all met\.$/);
	await page.getByRole('searchbox', { name: 'Search the published values' }).fill('ipe 500');
	await page.waitForURL(/q=ipe\+500/);
	await page.getByRole('combobox', { name: 'Kind' }).selectOption('section-properties');
	await page.waitForURL(/family=section-properties/);
	const rows = page.getByRole('rowheader', { name: /IPE 500/ });
	await expect.poll(() => rows.count()).toBe(5);
	expect(await page.getByRole('heading', { name: '5 shown' }).count()).toBe(1);
	await page.close();
});

it('opens the same list from its address, on its page', async () => {
	const page = await open('/proof?family=catalogue&memory=only&sort=difference&page=2');
	expect(await page.getByRole('checkbox', { name: 'Only from memory' }).isChecked()).toBe(true);
	expect(await page.getByRole('navigation', { name: 'Pages' }).textContent()).toMatch(
		/51 to 100 of/
	);
	expect(await page.getByRole('cell', { name: 'met', exact: true }).count()).toBe(50);
	await page.close();
});

it('gives what is shown as CSV, and the same over the API', async () => {
	const file = await fetch(`${inject('baseUrl')}/proof/checks.csv?family=effective`);
	expect(file.headers.get('content-type')).toContain('text/csv');
	const lines = (await file.text()).trim().split('\r\n');
	const answer = await fetch(`${inject('baseUrl')}/api/v1/proof?family=effective&pageSize=200`);
	const list = proofListSchema.parse(await answer.json());
	expect(lines).toHaveLength(list.total + 1);
	expect(list.items.map(({ pass }) => pass)).not.toContain(false);
	expect(list.families.reduce((sum, { values }) => sum + values, 0)).toBe(8408);
	const wrong = await fetch(`${inject('baseUrl')}/api/v1/proof?famly=effective`);
	expect(wrong.status).toBe(400);
});
