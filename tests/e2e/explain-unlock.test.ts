import { chromium, type Browser, type Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';

let browser: Browser;

beforeAll(async () => {
	browser = await chromium.launch({
		executablePath: inject('chromiumPath'),
		args: ['--no-sandbox']
	});
});
afterAll(async () => {
	const page = await openAs('idris', '/rack/stock');
	await change(page, { code: null, stock: null });
	await browser.close();
});

async function open(path = '/bench'): Promise<Page> {
	const context = await browser.newContext({ viewport: { width: 1440, height: 900 } });
	const page = await context.newPage();
	await page.goto(inject('baseUrl') + path);
	return page;
}

async function openAs(name: string, path: string): Promise<Page> {
	const page = await open(`/sign-in?next=${encodeURIComponent(path)}`);
	await page.getByLabel('E-mail').fill(`${name}@tarnbridge.example`);
	await page.getByLabel('Password', { exact: true }).fill('tarn-bridge-demo');
	await page.getByRole('button', { name: 'Sign in', exact: true }).click();
	await page.waitForURL((url) => url.pathname !== '/sign-in');
	return page;
}

/** Settings of the demo firm, changed over the API at the version they stand at; the status. */
async function change(page: Page, settings: object): Promise<number> {
	const api = `${inject('baseUrl')}/api/v1/firm`;
	const now = (await (await page.request.get(api)).json()) as { settings: { version: number } };
	const data = { version: now.settings.version, ...settings };
	const headers = { origin: inject('baseUrl') };
	return (await page.request.patch(api, { headers, data })).status();
}

const heading = (page: Page) => page.getByRole('heading', { level: 1 }).textContent();
const ready = (page: Page) =>
	page.getByRole('slider', { name: 'Curvature, in multiples of first' }).waitFor();

describe('a working', () => {
	it('opens by the keyboard, leads on to another and gives the focus back', async () => {
		const page = await open();
		await ready(page);
		const figure = page.getByRole('region', { name: 'Verdict' }).getByRole('button', {
			name: /^3110\skNm$/
		});
		await figure.focus();
		await page.keyboard.press('Enter');
		const sheet = page.getByRole('dialog');
		await sheet.getByText(/6\.2\.5/).waitFor();
		await sheet.getByRole('button', { name: /Moment resistance/ }).click();
		await page.getByRole('dialog', { name: /Moment resistance/ }).waitFor();
		await page.keyboard.press('Escape');
		await sheet.waitFor({ state: 'hidden' });
		expect(await figure.evaluate((node) => node === document.activeElement)).toBe(true);
		await page.context().close();
	});
});

describe('unlocking', () => {
	it('tries the narrower flange, which takes the full block with less steel, and undoes it', async () => {
		const page = await open();
		const panel = page.getByRole('region', { name: 'Unlock the full block' });
		await panel.getByText(/Flanges 400 → 3\d0\smm wide/).waitFor({ timeout: 20_000 });
		await panel.getByRole('button', { name: /^Try: Flanges 400 → 3\d0/ }).click();
		expect(await heading(page)).toMatch(/^Class 2\./);
		await panel.getByText(/Tried: Flanges/).waitFor();
		await panel.getByRole('button', { name: 'Undo' }).click();
		expect(await heading(page)).toMatch(/^Class 3\. Count 3110/);
		await page.context().close();
	});
});

describe('settings of the firm', () => {
	it('are kept by the librarian and taken by the designer', async () => {
		const librarian = await openAs('idris', '/bench');
		await ready(librarian);
		await librarian.getByRole('combobox', { name: 'η, shear' }).selectOption('1');
		await librarian.getByRole('button', { name: 'Keep as the firm’s preset' }).click();
		await librarian.getByText('Kept. This study follows it.').waitFor();
		const designer = await openAs('maya', '/bench');
		await designer.getByText(/Started with the preset of/).waitFor();
		const eta = designer.getByRole('combobox', { name: 'η, shear' });
		expect(await eta.inputValue()).toBe('1');
		await eta.selectOption('1.2');
		await designer.getByText(/η: 1\.2 here/).waitFor();
		await designer.getByRole('button', { name: 'Take the firm’s preset' }).click();
		await expect.poll(() => eta.inputValue()).toBe('1');
		const keep = designer.getByRole('button', { name: 'Keep as the firm’s preset' });
		expect(await keep.isDisabled()).toBe(true);
		await change(librarian, { code: null });
		await librarian.context().close();
		await designer.context().close();
	});

	it('change what is proposed once the librarian changes the stock', async () => {
		const page = await openAs('idris', '/rack/stock');
		await page.waitForLoadState('networkidle');
		const width = page.getByRole('spinbutton', { name: 'Flange widths, steps of' });
		await width.fill('50');
		await width.press('Enter');
		await page.getByRole('button', { name: 'Keep the stock' }).click();
		await page.getByText(/Kept\.\s*Changed by Idris Vale/).waitFor();
		await page.goto(`${inject('baseUrl')}/bench`);
		await page.getByText(/Flanges 400 → 350\smm wide/).waitFor({ timeout: 20_000 });
		await page.context().close();
	});

	it('are only read by a reader', async () => {
		const page = await openAs('saoirse', '/rack/stock');
		await page.getByText('Owners and librarians change the stock; you may look.').waitFor();
		expect(await page.getByRole('button', { name: 'Keep the stock' }).count()).toBe(0);
		expect(await change(page, { stock: null })).toBe(403);
		await page.context().close();
	});
});
