import { chromium, type Browser, type Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';

let browser: Browser;

beforeAll(async () => {
	browser = await chromium.launch({
		executablePath: inject('chromiumPath'),
		args: ['--no-sandbox']
	});
});
afterAll(() => browser.close());

/** A fresh visitor on the Bench with a kind of section chosen. */
async function openKind(kind: string): Promise<{ page: Page; faults: string[] }> {
	const context = await browser.newContext({ viewport: { width: 1440, height: 900 } });
	const page = await context.newPage();
	const faults: string[] = [];
	page.on('pageerror', (error) => faults.push(String(error)));
	await page.goto(`${inject('baseUrl')}/bench`);
	await page.getByRole('slider', { name: 'Curvature, in multiples of first' }).waitFor();
	await page.getByLabel('or build one').selectOption({ label: kind });
	return { page, faults };
}

const verdict = (page: Page) => page.getByRole('heading', { level: 1 });

describe('free plates in a browser', () => {
	it('builds an I with cover plates from the preset, gives its class and bends it', async () => {
		const { page, faults } = await openKind('Free plates');
		await page.getByText('Begin from a preset').click();
		await page.getByLabel('Cover plate width').fill('180');
		await page.getByRole('button', { name: 'Make plates' }).click();
		await expect.poll(() => page.getByLabel('Width, topCover').inputValue()).toBe('180');
		await expect.poll(() => verdict(page).textContent()).toMatch(/^\s*Class \d/);
		await page.getByRole('button', { name: 'To first yield' }).click();
		const ratio = page.getByRole('spinbutton', { name: 'κ ÷ κy' });
		await expect.poll(() => ratio.getAttribute('aria-valuenow')).toBe('1');
		expect(faults).toEqual([]);
		await page.context().close();
	});

	it('tells of a gap and mends it, by the keyboard alone', async () => {
		const { page } = await openKind('Free plates');
		await page.getByLabel('z, topCover').focus();
		await page.keyboard.type('621.2');
		await page.keyboard.press('Enter');
		const mend = page.getByRole('button', { name: 'Move “topCover” by 3.2 mm down' });
		await mend.waitFor();
		await mend.focus();
		await page.keyboard.press('Enter');
		await expect.poll(() => page.getByLabel('z, topCover').inputValue()).toBe('618');
		await page.getByLabel('Thickness, topCover').focus();
		await page.keyboard.press('Alt+ArrowDown');
		await expect
			.poll(() => page.evaluate(() => document.activeElement?.getAttribute('aria-valuenow')))
			.toBe('16');
		await page.context().close();
	});

	it('takes a pasted outline with a hole: no class, with the reason, and both moments', async () => {
		const { page, faults } = await openKind('Outline');
		await page.getByText('Paste or upload coordinates').click();
		await page
			.getByLabel('Coordinates in mm, y and z a line')
			.fill('0 0\n100 0\n100 200\n0 200\n\n30 50\n30 150\n70 150\n70 50');
		await page.getByRole('button', { name: 'Use these coordinates' }).click();
		await expect.poll(() => verdict(page).textContent()).toMatch(/No class/);
		await page
			.getByRole('region', { name: 'Verdict' })
			.getByText('An outline does not say which of its parts are plates')
			.waitFor();
		const row = page.getByRole('row', { name: /^Moment, y–y/ });
		const figures = await row.getByRole('cell').allTextContents();
		expect(figures[0]).toMatch(/\d/);
		expect(figures[1]).toMatch(/\d/);
		expect(faults).toEqual([]);
		await page.context().close();
	});
});
