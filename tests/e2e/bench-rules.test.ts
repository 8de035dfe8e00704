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

/** Opens the Bench on a section with one demand, as a link of an unsaved study does. */
async function openStudy(section: object, demand: object): Promise<Page> {
	const context = await browser.newContext({ viewport: { width: 1440, height: 900 } });
	const page = await context.newPage();
	const study = { s: section, c: {}, d: [{ name: 'Case 1', ...demand }] };
	const text = Buffer.from(JSON.stringify(study)).toString('base64url');
	await page.goto(`${inject('baseUrl')}/bench?study=1.${text}`);
	await page.getByRole('slider', { name: 'Curvature, in multiples of first' }).waitFor();
	return page;
}

const girder = {
	kind: 'i',
	h: 1540,
	b: 400,
	tf: 20,
	bBottom: 400,
	tfBottom: 20,
	tw: 8,
	fabrication: 'welded',
	weldLeg: 5,
	grade: 'S355'
};
/** (258 − 18)/6 = 40, ε = 1: within 42 (2005, Table 5.2), over 38 (2022, Table 7.3). */
const hollow = {
	kind: 'rectangular-hollow',
	h: 258,
	b: 100,
	t: 6,
	ro: 9,
	ri: 6,
	fabrication: 'hot-finished',
	grade: 'S235'
};

const heading = (page: Page) => page.getByRole('heading', { level: 1 });
const figureIn = async (page: Page, row: RegExp) => {
	const text = await page
		.getByRole('table', { name: 'Each effect alone' })
		.getByRole('row', { name: row })
		.getByRole('cell')
		.first()
		.textContent();
	return Number((text ?? '').replace(/\s/g, ''));
};

describe('EN 1993 on the Bench, by the keys', () => {
	it('shows what is not counted of a class 4 girder, and counts on what is left', async () => {
		const page = await openStudy(girder, { My: 2000 });
		await expect.poll(() => heading(page).textContent()).toMatch(/Class 4\. Count/);
		await page.getByText('not counted', { exact: true }).waitFor();
		const once = page.getByRole('radio', { name: 'one pass' });
		await once.focus();
		await page.keyboard.press('ArrowRight');
		await page.getByText(/not counted under \+My, converged/).waitFor();
		await page.context().close();
	});

	it('changes the class of a hollow section with the edition', async () => {
		const page = await openStudy(hollow, { N: -100 });
		await expect.poll(() => heading(page).textContent()).toMatch(/Class 3 in compression/);
		await page.getByRole('radio', { name: '2005' }).focus();
		await page.keyboard.press('ArrowRight');
		await expect.poll(() => heading(page).textContent()).toMatch(/Class 4 in compression/);
		await page.keyboard.press('Control+z');
		await expect.poll(() => heading(page).textContent()).toMatch(/Class 3 in compression/);
		await page.context().close();
	});

	it('raises the shear resistance with stiffeners, and keeps them in the address', async () => {
		const page = await openStudy(girder, { My: 1000, Vz: 400 });
		const before = await figureIn(page, /^Shear along z/);
		await page.getByText(/^Web stiffeners: none/).focus();
		await page.keyboard.press('Enter');
		await page.getByRole('radio', { name: 'none', exact: true }).focus();
		await page.keyboard.press('ArrowRight');
		await page.keyboard.press('ArrowRight');
		const spacing = page.getByRole('spinbutton', { name: 'Clear spacing' });
		await spacing.fill('750');
		await spacing.press('Enter');
		await expect.poll(() => figureIn(page, /^Shear along z/)).toBeGreaterThan(before);
		await page.waitForTimeout(600);
		await page.reload();
		await page.getByText(/^Web stiffeners: every 750/).waitFor();
		await page.context().close();
	});

	it('counts less once a length between restraints is given', async () => {
		const page = await openStudy({ ...girder, h: 940, tw: 14, weldLeg: 8 }, { My: 1000 });
		await expect.poll(() => heading(page).textContent()).toMatch(/Count 3110/);
		await page.getByText(/^Member: no length/).focus();
		await page.keyboard.press('Enter');
		const length = page.getByRole('spinbutton', { name: 'Unbraced length' });
		await length.fill('8000');
		await length.press('Enter');
		await expect
			.poll(() => heading(page).textContent())
			.toMatch(/limited by lateral–torsional buckling/);
		await page.context().close();
	});
});
