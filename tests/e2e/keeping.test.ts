import { chromium, type Browser, type Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { openingBend, openingStudy, type Study } from '../../src/lib/components/bench/study';
import { addressText } from '../../src/lib/components/bench/study-address';

let browser: Browser;

beforeAll(async () => {
	browser = await chromium.launch({
		executablePath: inject('chromiumPath'),
		args: ['--no-sandbox']
	});
});
afterAll(() => browser.close());

const demoPassword = 'tarn-bridge-demo';

async function open(path = '/bench', width = 1440): Promise<Page> {
	const context = await browser.newContext({ viewport: { width, height: 900 } });
	const page = await context.newPage();
	await page.goto(inject('baseUrl') + path);
	return page;
}

async function openAs(name: string, path: string, width = 1440): Promise<Page> {
	const page = await open(`/sign-in?next=${encodeURIComponent(path)}`, width);
	await page.getByLabel('E-mail').fill(`${name}@tarnbridge.example`);
	await page.getByLabel('Password', { exact: true }).fill(demoPassword);
	await page.getByRole('button', { name: 'Sign in', exact: true }).click();
	await page.waitForURL((url) => url.pathname !== '/sign-in');
	return page;
}

const thick = (page: Page) => page.getByRole('spinbutton', { name: 'Web thickness' });
const handle = (page: Page) =>
	page.getByRole('slider', { name: 'Curvature, in multiples of first' });

async function thicken(page: Page, to: string) {
	await handle(page).waitFor();
	await thick(page).fill(to);
	await thick(page).press('Enter');
}

const withStudy = (change: Partial<Study>) =>
	`/bench?study=${addressText({ study: { ...openingStudy, ...change }, bend: openingBend })}`;

/** A section of the demo firm, saved by somebody who may. */
async function saved(page: Page, name: string, status?: 'approved'): Promise<string> {
	const api = `${inject('baseUrl')}/api/v1/sections`;
	const headers = { origin: inject('baseUrl') };
	const made = await page.request.post(api, {
		headers,
		data: { name, definition: openingStudy.section }
	});
	const { section } = (await made.json()) as { section: { id: string } };
	if (status)
		await page.request.patch(`${api}/${section.id}`, { headers, data: { version: 1, status } });
	return section.id;
}

describe('an unsaved study', () => {
	it('is there again after Back, and after the Bench is opened anew from the bar', async () => {
		const page = await open();
		await thicken(page, '17');
		await page.getByRole('link', { name: 'Sheets' }).click();
		await page.waitForURL(/sheets/);
		await page.goBack();
		await expect.poll(() => thick(page).inputValue()).toBe('17');
		await page.getByRole('link', { name: 'Sheets' }).click();
		await page.waitForURL(/sheets/);
		await page.getByRole('link', { name: 'Bench', exact: true }).click();
		await expect.poll(() => thick(page).inputValue()).toBe('17');
		await page.getByRole('button', { name: 'Start afresh' }).click();
		await expect.poll(() => thick(page).inputValue()).toBe('14');
		await page.context().close();
	});

	it('stays in the address when Bench is pressed on the Bench', async () => {
		const page = await open();
		await thicken(page, '17');
		await page.waitForURL(/study=1\./);
		await page.getByRole('link', { name: 'Bench', exact: true }).click();
		await page.waitForURL(/study=1\./);
		await page.reload();
		await expect.poll(() => thick(page).inputValue()).toBe('17');
		await page.context().close();
	});

	it('with code values of former days opens with the nearest and a notice', async () => {
		const page = await open(withStudy({ code: { ...openingStudy.code, gammaM0: 0.5, eta: 1.1 } }));
		await page.getByText('γM0 from 0.5 to 0.9, η from 1.1 to 1').waitFor();
		expect(await page.getByRole('combobox', { name: 'η, shear' }).inputValue()).toBe('1');
		await page.context().close();
	});
});

describe('a changed section of the Rack', () => {
	it('is not left without a question', async () => {
		const page = await openAs('maya', '/rack');
		const id = await saved(page, `Leaving ${Date.now()}`);
		await page.goto(`${inject('baseUrl')}/bench/${id}`);
		await thicken(page, '17');
		const rack = page.getByRole('link', { name: 'Rack', exact: true });
		const dialog = page.getByRole('dialog', { name: 'Changes are not saved' });
		await rack.click();
		await dialog.getByRole('button', { name: 'Stay' }).click();
		expect(await thick(page).inputValue()).toBe('17');
		await rack.click();
		await dialog.getByRole('button', { name: 'Save and leave' }).click();
		await page.waitForURL(/\/rack/);
		await page.goto(`${inject('baseUrl')}/bench/${id}`);
		await expect.poll(() => thick(page).inputValue()).toBe('17');
		await thicken(page, '19');
		await rack.click();
		await dialog.getByRole('button', { name: 'Leave without saving' }).click();
		await page.waitForURL(/\/rack/);
		await page.context().close();
	});

	it('that is approved offers a designer to save as new, and says why', async () => {
		const keeper = await openAs('rhona', '/rack');
		const id = await saved(keeper, `Approved ${Date.now()}`, 'approved');
		await keeper.context().close();
		const page = await openAs('maya', `/bench/${id}`);
		await page.getByText('approved, saved as new only').waitFor();
		expect(await page.getByRole('button', { name: 'Save', exact: true }).count()).toBe(0);
		await page.getByRole('button', { name: 'Save as new' }).click();
		await page.getByRole('dialog', { name: 'Save to the Rack' }).waitFor();
		await page.context().close();
	});

	it('offers a reader no saving', async () => {
		const page = await openAs('saoirse', '/bench');
		await handle(page).waitFor();
		await page.getByText('As reader you may look and try').waitFor({ state: 'attached' });
		// files of the chart are for everyone
		expect(await page.getByRole('button', { name: /^Save(?! (SVG|CSV)$)/ }).count()).toBe(0);
		await page.context().close();
	});
});

describe('the form at its limits', () => {
	const demands = Array.from({ length: 9 }, (_, at) => ({
		name: `Hoist ${at + 1} at mid-span with the whole of the travelling load upon one rail of it`,
		My: 100
	}));

	it.each([1440, 1024, 390])('keeps nine long case names inside it at %i px', async (width) => {
		const page = await open(withStudy({ demands }), width);
		await handle(page).waitFor();
		const over = await page.evaluate(() => {
			const left = document.querySelector('.left');
			const root = document.documentElement;
			return Math.max(
				left ? left.scrollWidth - left.clientWidth : Infinity,
				root.scrollWidth - root.clientWidth
			);
		});
		expect(over).toBeLessThanOrEqual(0);
		await page.screenshot({ path: `tests/output/cases-${width}.png`, fullPage: width < 800 });
		await page.context().close();
	});

	it.each(['si', 'us'])('shows every size whole in %s units', async (system) => {
		const section = { ...openingStudy.section, b: 103.124 } as Study['section'];
		const page = await open(withStudy({ section }));
		if (system === 'us') {
			await page.locator('summary[aria-label^="Account"]').click();
			await page.getByRole('radio', { name: 'US customary' }).check();
			await page.keyboard.press('Escape');
		}
		await handle(page).waitFor();
		const cut = await page
			.locator('.parts input')
			.evaluateAll(
				(inputs) => inputs.filter((input) => input.scrollWidth > input.clientWidth).length
			);
		expect(cut).toBe(0);
		await page.screenshot({ path: `tests/output/sizes-${system}.png` });
		await page.context().close();
	});

	it.each([1440, 1024, 390])('does not move while N is typed at %i px', async (width) => {
		const page = await open('/bench', width);
		await handle(page).waitFor();
		const top = async () =>
			page.evaluate(() => {
				const drawing = document.querySelector('.middle');
				return drawing ? drawing.getBoundingClientRect().top + scrollY : Number.NaN;
			});
		const before = await top();
		const force = page.getByRole('spinbutton', { name: 'N', exact: true });
		await force.fill('-500');
		await force.press('Enter');
		await page.evaluate(() => scrollTo(0, 0));
		await page.screenshot({ path: `tests/output/axial-${width}.png` });
		expect(Math.abs((await top()) - before)).toBeLessThanOrEqual(1);
		await page.context().close();
	});
});

describe('the order of the keys', () => {
	it('reaches Print and Save before the account', async () => {
		const page = await open();
		await handle(page).waitFor();
		const order = await page.evaluate(() => {
			const of = (find: string) => document.querySelector(find);
			const save = [...document.querySelectorAll('button')].find(
				(button) => button.textContent?.trim() === 'Save'
			);
			const account = of('summary[aria-label^="Account"]');
			return save && account ? save.compareDocumentPosition(account) : 0;
		});
		expect(order & 4).toBe(4);
		await page.context().close();
	});
});

describe('the Rack on a telephone', () => {
	it('shows state, Rename and Delete of every section', async () => {
		const page = await openAs('maya', '/rack', 390);
		const name = `Narrow ${Date.now()}`;
		await saved(page, name);
		await page.reload();
		for (const deed of ['Rename', 'Delete']) {
			const box = await page.getByRole('button', { name: `${deed} ${name}` }).boundingBox();
			expect((box?.x ?? 999) + (box?.width ?? 0)).toBeLessThanOrEqual(390);
		}
		const state = await page
			.getByRole('row', { name: new RegExp(name) })
			.getByText('draft')
			.boundingBox();
		expect((state?.x ?? 999) + (state?.width ?? 0)).toBeLessThanOrEqual(390);
		await page.screenshot({ path: 'tests/output/rack-390.png' });
		await page.context().close();
	});
});
