import { chromium, type Browser, type Locator, type Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';

let browser: Browser;

beforeAll(async () => {
	browser = await chromium.launch({
		executablePath: inject('chromiumPath'),
		args: ['--no-sandbox']
	});
});
afterAll(() => browser.close());

/** A fresh visitor on the Bench, ready to be worked; faults of the page fail the test. */
async function openBench(path = '/bench', width = 1440): Promise<{ page: Page; faults: string[] }> {
	const context = await browser.newContext({ viewport: { width, height: 900 } });
	const page = await context.newPage();
	const faults: string[] = [];
	page.on('pageerror', (error) => faults.push(String(error)));
	page.on('console', (message) => {
		if (message.type() === 'error') faults.push(message.text());
	});
	await page.goto(inject('baseUrl') + path);
	await curve(page).waitFor();
	return { page, faults };
}

const curve = (page: Page) =>
	page.getByRole('slider', { name: 'Curvature, in multiples of first' });
const momentField = (page: Page) => page.getByRole('spinbutton', { name: 'Moment M' });
const ratioField = (page: Page) => page.getByRole('spinbutton', { name: 'κ ÷ κy' });

/** The figure in a field, as a number in its shown unit. */
const figureIn = async (field: Locator) =>
	Number((await field.getAttribute('aria-valuenow')) ?? Number.NaN);

async function pick(page: Page, typed: string, name: string) {
	const box = page.getByRole('combobox', { name: 'Pick a shape' });
	await box.click();
	await box.pressSequentially(typed);
	await page.getByRole('option', { name }).first().click();
	await expect.poll(() => box.inputValue()).toBe(name);
}

/** Moment that the API gives for a catalogue shape at a ratio of its yield curvature, kNm. */
async function momentByApi(shapeId: string, ratio: number): Promise<number> {
	const shape = await fetch(`${inject('baseUrl')}/api/v1/shapes/${shapeId}`);
	const { definition } = (await shape.json()) as { definition: Record<string, unknown> };
	const answer = await fetch(`${inject('baseUrl')}/api/v1/response`, {
		method: 'POST',
		headers: { 'content-type': 'application/json' },
		body: JSON.stringify({
			section: { ...definition, grade: 'S355' },
			at: { curvatureRatio: [ratio] }
		})
	});
	const { states } = (await answer.json()) as { states: { moment: number }[] };
	return states[0]?.moment ?? Number.NaN;
}

async function dragTo(page: Page, handle: Locator, x: number) {
	const box = await handle.boundingBox();
	if (!box) throw new Error('the handle is not on the screen');
	const [fromX, y] = [box.x + box.width / 2, box.y + box.height / 2];
	await page.mouse.move(fromX, y);
	await page.mouse.down();
	for (let step = 1; step <= 8; step += 1) await page.mouse.move(fromX + (x * step) / 8, y);
	await page.mouse.up();
}

describe('the Bench in a browser', () => {
	it('opens on the plate girder with nothing to read first and no fault', async () => {
		const { page, faults } = await openBench();
		expect(await page.getByRole('heading', { level: 1 }).textContent()).toMatch(
			/Class 3\. Count 3110\skNm, up to first yield\./
		);
		expect(faults).toEqual([]);
		await page.context().close();
	});

	it('bends an IPE 300 to 2 κy by the keys to the moment that the API gives', async () => {
		const { page } = await openBench();
		await pick(page, 'ipe 3', 'IPE 300');
		await page.getByRole('button', { name: 'To first yield' }).click();
		await curve(page).focus();
		for (let press = 0; press < 10; press += 1) await page.keyboard.press('ArrowRight');
		expect(await figureIn(ratioField(page))).toBeCloseTo(2, 9);
		const wanted = await momentByApi('en10365-ipe-300', 2);
		expect(await figureIn(momentField(page))).toBeCloseTo(wanted, 6);
		await page.context().close();
	});

	it('bends an IPE 300 by the mouse, on the curve and at the strain line, as the API does', async () => {
		const { page } = await openBench();
		await pick(page, 'ipe300', 'IPE 300');
		const scale = await page.evaluate(() => {
			const ticks = [...document.querySelectorAll('.chart text')];
			const at = (text: string) =>
				ticks.find((tick) => tick.textContent === text)?.getBoundingClientRect();
			const [one, three] = [at('1'), at('3')];
			return one && three ? (three.x - one.x) / 2 : 0;
		});
		await page.getByRole('button', { name: 'To first yield' }).click();
		await dragTo(page, curve(page), scale);
		const ratio = await figureIn(ratioField(page));
		expect(ratio).toBeCloseTo(2, 1);
		expect(await figureIn(momentField(page))).toBeCloseTo(
			await momentByApi('en10365-ipe-300', ratio),
			6
		);
		await dragTo(page, page.getByRole('slider', { name: 'Strain at the top' }), 15);
		const bent = await figureIn(ratioField(page));
		expect(bent).toBeLessThan(ratio - 0.1);
		expect(await figureIn(momentField(page))).toBeCloseTo(
			await momentByApi('en10365-ipe-300', bent),
			6
		);
		await page.context().close();
	});

	it('keeps the study in the address and gives a notice for a damaged one', async () => {
		const { page } = await openBench();
		const thick = page.getByRole('spinbutton', { name: 'Web thickness' });
		await thick.fill('16');
		await thick.press('Enter');
		await page.waitForURL(/study=1\./);
		await page.reload();
		await expect.poll(() => thick.inputValue()).toBe('16');
		await page.goto(`${inject('baseUrl')}/bench?study=1.broken`);
		await page.getByText('A plate girder is opened instead.').waitFor();
		await page.context().close();
	});

	it('fits a telephone without scrolling sideways', async () => {
		const { page } = await openBench('/bench', 390);
		const wider = await page.evaluate(
			() => document.documentElement.scrollWidth - document.documentElement.clientWidth
		);
		expect(wider).toBeLessThanOrEqual(0);
		await page.context().close();
	});

	it.each([
		['A4', 1],
		['Letter', 2]
	] as const)('prints on no more pages of %s than %i', async (format, most) => {
		const { page } = await openBench();
		const pdf = await page.pdf({ format, printBackground: true });
		const pages = pdf.toString('latin1').match(/\/Type\s*\/Page[^s]/g);
		expect(pages?.length).toBeGreaterThan(0);
		expect(pages?.length).toBeLessThanOrEqual(most);
		await page.context().close();
	});
});

describe('saving from the Bench', () => {
	it('keeps the study through signing up, and opens it again after signing out and in', async () => {
		const { page } = await openBench();
		const email = `designer-${Date.now()}@bench.example`;
		const thick = page.getByRole('spinbutton', { name: 'Web thickness' });
		await thick.fill('18');
		await thick.press('Enter');
		await page.getByRole('button', { name: 'Save', exact: true }).click();
		await page.getByRole('link', { name: 'Make a firm' }).first().click();
		await page.getByLabel('Your name').fill('Ada Rivet');
		await page.getByLabel('Firm', { exact: true }).fill('Weir Lane Fabrication');
		await page.getByLabel('E-mail').fill(email);
		await page.getByLabel('Password', { exact: true }).fill('marking-out-table');
		await page.getByRole('button', { name: 'Make the firm' }).click();

		await page.getByLabel('Name of the section').fill('Transfer girder');
		await page.getByRole('button', { name: 'Save to the Rack' }).click();
		await page.waitForURL(/\/bench\/[0-9a-f-]{20,}/);
		const address = page.url();
		expect(await thick.inputValue()).toBe('18');
		await page.getByText('saved', { exact: true }).waitFor();

		await page.locator('summary[aria-label^="Account of Ada Rivet"]').click();
		await page.getByRole('button', { name: 'Sign out' }).click();
		await page.waitForURL((url) => !url.pathname.startsWith('/bench/'));
		await page.goto(address);
		await page.waitForURL(/sign-in\?next=/);
		await page.getByLabel('E-mail').fill(email);
		await page.getByLabel('Password', { exact: true }).fill('marking-out-table');
		await page.getByRole('button', { name: 'Sign in', exact: true }).click();
		await page.waitForURL(address);
		await expect.poll(() => thick.inputValue()).toBe('18');

		await thick.fill('20');
		await thick.press('Enter');
		await page.getByText('changed since saved').waitFor();

		// Somebody else saves in between: the later one is shown both and chooses.
		const other = await page.context().newPage();
		await other.goto(address);
		const otherThick = other.getByRole('spinbutton', { name: 'Web thickness' });
		await curve(other).waitFor();
		await otherThick.fill('22');
		await otherThick.press('Enter');
		await other.getByRole('button', { name: 'Save', exact: true }).click();
		await other.getByText('saved', { exact: true }).waitFor();
		await page.getByRole('button', { name: 'Save', exact: true }).click();
		const dialog = page.getByRole('dialog', { name: /Somebody saved this section/ });
		expect(await dialog.getByRole('row', { name: /^Web thickness/ }).textContent()).toMatch(
			/22.*20/s
		);
		await dialog.getByRole('button', { name: 'Overwrite version 2' }).click();
		await page.getByText('saved', { exact: true }).waitFor();
		await other.reload();
		await expect.poll(() => otherThick.inputValue()).toBe('20');
		await page.context().close();
	});
});
