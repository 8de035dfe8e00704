import { chromium, type Browser, type Locator, type Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { prepareSection } from '$lib/engine/section/prepare';
import { historyOf } from '$lib/engine/response/history/history';
import { bendingFrom } from '$lib/engine/response/history/history-bending';
import type { SectionDefinition } from '$lib/engine/section/definition';

let browser: Browser;

beforeAll(async () => {
	browser = await chromium.launch({
		executablePath: inject('chromiumPath'),
		args: ['--no-sandbox']
	});
});
afterAll(() => browser.close());

/** An IPE 300 as a built section, so that the test needs no catalogue. */
const ipe: SectionDefinition = {
	...{ kind: 'i', h: 300, b: 150, tf: 10.7, tw: 7.1, r: 15 },
	...{ fabrication: 'rolled', grade: 'S355' }
};

const text = (study: object) => `1.${Buffer.from(JSON.stringify(study)).toString('base64url')}`;
const opening = {
	s: ipe,
	c: { standard: 'EN1993-1-1:2005' },
	d: [{ name: 'Case 1', My: 150, N: -200 }],
	k: 1,
	q: 0
};

async function openBench(study: object = opening): Promise<Page> {
	const context = await browser.newContext({ viewport: { width: 1440, height: 900 } });
	const page = await context.newPage();
	await page.goto(`${inject('baseUrl')}/bench?study=${text(study)}`);
	await page.getByRole('slider', { name: 'Curvature, in multiples of first' }).waitFor();
	return page;
}

const field = (page: Page, name: string) => page.getByRole('spinbutton', { name, exact: true });
const figureIn = async (of: Locator) =>
	Number((await of.getAttribute('aria-valuenow')) ?? Number.NaN);
async function type(of: Locator, typed: string) {
	await of.fill(typed);
	await of.press('Enter');
}

/** Section bent to four times first yield and let go, by the engine. */
function released() {
	const built = prepareSection(ipe);
	if (!built.ok) throw new Error('cannot be built');
	const start = historyOf(built.value);
	if (!start.ok) throw new Error(start.error.message);
	const path = { axisAngle: 0, transverse: 'moment-zero', N: 0 } as const;
	const bent = bendingFrom(start.value, path);
	const after = bent.after({ curvatureRatio: 4 });
	if (!after) throw new Error('not reached');
	const state = bendingFrom(after, path).at({ moment: 0 });
	return { state, unit: bent.firstYield.curvature ?? Number.NaN };
}

describe('what a section has been through', () => {
	it('stays as locked-in stress and curvature once it is let go, and takes a reload', async () => {
		const page = await openBench();
		await type(field(page, 'κ ÷ κy'), '4');
		const bent = await figureIn(field(page, 'Moment M'));
		await page.getByRole('button', { name: 'Release' }).click();
		const { state, unit } = released();
		expect(await figureIn(field(page, 'Moment M'))).toBe(0);
		expect(await figureIn(field(page, 'κ ÷ κy'))).toBeCloseTo((state.curvature ?? 0) / unit, 4);
		const stays = page.locator('.stays');
		await stays.waitFor();
		expect(await stays.textContent()).toContain(
			`+${(state.extremes?.stressMax ?? Number.NaN).toFixed(1)}`
		);
		// the address follows the study a moment later
		await page.waitForTimeout(1500);
		await page.reload();
		await stays.waitFor();
		await type(field(page, 'κ ÷ κy'), '4');
		expect(await figureIn(field(page, 'Moment M'))).toBeCloseTo(bent, 3);
		await page.getByRole('button', { name: 'Start fresh' }).click();
		await expect.poll(() => figureIn(field(page, 'κ ÷ κy'))).toBe(0);
		await page.context().close();
	});

	it('begins with residual stress of rolling: earlier first yield, the same full plastic', async () => {
		const page = await openBench();
		const curve = page.getByRole('group', { name: /^Moment against curvature/ });
		const limits = async () => (await curve.getAttribute('aria-label')) ?? '';
		const before = await limits();
		await page.getByRole('tab', { name: 'Residual stress' }).click();
		expect(await page.getByRole('radio', { name: 'Welded' }).isDisabled()).toBe(true);
		await page.getByRole('radio', { name: 'Rolled' }).check({ force: true });
		await expect.poll(limits).not.toBe(before);
		const after = await limits();
		expect(after).not.toContain(before.match(/First yield [^,]+/)?.[0] ?? 'none');
		expect(after).toContain(before.match(/full plastic [^.]+\.\d/)?.[0] ?? 'none');
		await page.context().close();
	});
});

describe('a stress–strain law', () => {
	it('is taken from a pasted curve, its wrong line named', async () => {
		const page = await openBench();
		await page.getByRole('button', { name: 'Change law' }).click();
		const dialog = page.getByRole('dialog', { name: 'Stress–strain law' });
		await dialog.getByLabel('Law', { exact: true }).selectOption('curve');
		const curve = dialog.getByLabel('Strain and stress, one pair a line');
		await curve.fill('strain; stress\n0.00169; 355\nx; 400');
		await dialog.getByText(/Line 3/).waitFor();
		await curve.fill('strain; stress\n0.00169; 355\n0.05; 400\n0.1; 480');
		await dialog.getByRole('button', { name: 'Use this law' }).click();
		await page.getByText('Law: test curve').waitFor();
		await page.context().close();
	});
});

describe('interaction', () => {
	it('shows the demand and reads it off by the keys', async () => {
		const page = await openBench();
		await page.getByRole('heading', { name: 'Interaction', exact: true }).scrollIntoViewIfNeeded();
		const plot = page.getByRole('slider', { name: /^Read the chart/ });
		await plot.waitFor();
		await page
			.getByRole('table', { name: /^Demand cases/ })
			.getByText('Case 1')
			.waitFor();
		await page.getByText('Counted by the code').waitFor();
		await plot.focus();
		await expect.poll(() => plot.getAttribute('aria-valuetext')).toMatch(/^Case 1: N −200/);
		await page.keyboard.press('ArrowDown');
		expect(await plot.getAttribute('aria-valuetext')).toMatch(/^Full plastic: N/);
		await page.context().close();
	});
});
