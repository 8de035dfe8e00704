/**
 * Scripting for one drag step on the Bench in Chromium, as a share of a 16.7 ms frame: the handle
 * on the moment–curvature curve and the end of the strain line are dragged one pointer move at a
 * time, and the browser's own counters are read between the moves.
 */
import { chromium, type CDPSession, type Page } from 'playwright-core';
import { withServer } from './server';
import { printTable, quantiles } from './table';

const frame = 1000 / 60;

const counters = [
	'ScriptDuration',
	'LayoutDuration',
	'RecalcStyleDuration',
	'TaskDuration'
] as const;
type Counters = Record<(typeof counters)[number], number>;

async function read(session: CDPSession): Promise<Counters> {
	const { metrics } = await session.send('Performance.getMetrics');
	const value = (name: string) =>
		(metrics.find((metric) => metric.name === name)?.value ?? 0) * 1e3;
	return Object.fromEntries(counters.map((name) => [name, value(name)])) as Counters;
}

const nextFrame = (page: Page) =>
	page.evaluate(
		() => new Promise((done) => requestAnimationFrame(() => requestAnimationFrame(done)))
	);

/** What a step costs when nothing is held: the price of reading the counters, to be taken off. */
async function steps(page: Page, session: CDPSession, move: (step: number) => Promise<void>) {
	const spent: Counters[] = [];
	for (let step = 0; step < 160; step++) {
		const before = await read(session);
		await move(step);
		await nextFrame(page);
		const after = await read(session);
		if (step < 20) continue;
		spent.push(
			Object.fromEntries(counters.map((name) => [name, after[name] - before[name]])) as Counters
		);
	}
	return spent;
}

async function drag(page: Page, session: CDPSession, name: string, reach: number) {
	const handle = page.getByRole('slider', { name });
	const box = await handle.boundingBox();
	if (!box) throw new Error(`No handle is called “${name}”.`);
	const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
	await page.mouse.move(x, y);
	await page.mouse.down();
	const spent = await steps(page, session, (step) =>
		page.mouse.move(x + reach * Math.sin(step / 9), y)
	);
	await page.mouse.up();
	return spent;
}

const row = (what: string, spent: readonly Counters[]) => {
	const of = (name: keyof Counters) => quantiles(spent.map((step) => step[name]));
	const script = of('ScriptDuration');
	return [
		what,
		`${script.median.toFixed(2)} ms`,
		`${script.p95.toFixed(2)} ms`,
		(script.p95 / frame).toFixed(2),
		`${(of('LayoutDuration').median + of('RecalcStyleDuration').median).toFixed(2)} ms`,
		`${of('TaskDuration').p95.toFixed(2)} ms`
	];
};

await withServer({ COMPUTE_RATE_PER_MINUTE: '0' }, async ({ url }) => {
	const browser = await chromium.launch({
		executablePath: process.env.CHROMIUM ?? '',
		args: ['--no-sandbox', '--disable-gpu', '--disable-background-networking', '--no-first-run']
	});
	const page = await browser.newPage({ viewport: { width: 1440, height: 900 } });
	await page.goto(`${url}/bench`, { waitUntil: 'networkidle' });
	const session = await page.context().newCDPSession(page);
	await session.send('Performance.enable');
	const idle = await steps(page, session, () => Promise.resolve());
	const curve = await drag(page, session, 'Curvature, in multiples of first', 60);
	const strain = await drag(page, session, 'Strain at the top', 25);
	printTable(
		'One drag step on the Bench, plate girder, 1440 × 900',
		[
			'dragged',
			'script, median',
			'script, 95th',
			'share of a frame',
			'style and layout',
			'whole task, 95th'
		],
		[
			row('nothing (cost of reading)', idle),
			row('handle on the curve', curve),
			row('end of the strain line', strain)
		]
	);
	await browser.close();
});
