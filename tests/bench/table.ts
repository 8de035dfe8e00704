/** Median and 95th percentile of a function's time in milliseconds, after warming up. */
export function timed(
	run: () => void,
	{ rounds = 60, batch = 1 } = {}
): { median: number; p95: number } {
	for (let i = 0; i < Math.max(5, rounds / 4); i++) run();
	const times: number[] = [];
	for (let i = 0; i < rounds; i++) {
		const start = performance.now();
		for (let k = 0; k < batch; k++) run();
		times.push((performance.now() - start) / batch);
	}
	return quantiles(times);
}

export function quantiles(times: readonly number[]): { median: number; p95: number } {
	const sorted = [...times].sort((a, b) => a - b);
	const at = (share: number) =>
		sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))]!;
	return { median: at(0.5), p95: at(0.95) };
}

/** Prints rows under a heading as a Markdown table. */
export function printTable(
	heading: string,
	columns: readonly string[],
	rows: readonly (readonly string[])[]
) {
	console.log(`\n### ${heading}\n`);
	console.log(`| ${columns.join(' | ')} |`);
	console.log(`|${columns.map(() => '---').join('|')}|`);
	for (const row of rows) console.log(`| ${row.join(' | ')} |`);
}

export const ms = (value: number): string =>
	value >= 1 ? `${value.toFixed(2)} ms` : `${(value * 1e3).toFixed(2)} µs`;
