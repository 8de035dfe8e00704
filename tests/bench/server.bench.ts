/**
 * Throughput of POST /api/v1/analyse against a bare route of the same server that parses the same
 * body and answers a constant of the same size; both without the rate limiter. Rounds alternate.
 * Server time is that process's own processor time for each request.
 */
import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { Agent, request } from 'node:http';
import { performance } from 'node:perf_hooks';
import { printTable, quantiles } from './table';
import { withServer } from './server';

const body = JSON.stringify({
	section: {
		kind: 'i',
		h: 940,
		b: 400,
		tw: 14,
		tf: 20,
		weldLeg: 8,
		fabrication: 'welded',
		grade: 'S355'
	},
	demands: [{ name: 'Case 1', My: 2400 }]
});

const agent = new Agent({ keepAlive: true, maxSockets: 8 });

function post(url: string): Promise<{ status: number; size: number }> {
	return new Promise((resolve, reject) => {
		const headers = {
			'content-type': 'application/json',
			'content-length': Buffer.byteLength(body)
		};
		const sent = request(url, { method: 'POST', agent, headers }, (answer) => {
			let size = 0;
			answer.on('data', (chunk: Buffer) => (size += chunk.length));
			answer.on('end', () => resolve({ status: answer.statusCode ?? 0, size }));
		});
		sent.on('error', reject);
		sent.end(body);
	});
}

async function round(url: string, requests: number): Promise<number> {
	const start = performance.now();
	let left = requests;
	const lane = async () => {
		while (left-- > 0) {
			const { status } = await post(url);
			if (status !== 200) throw new Error(`${url} answered ${status}`);
		}
	};
	await Promise.all(Array.from({ length: 8 }, lane));
	return (requests * 1000) / (performance.now() - start);
}

const ticks = Number(execFileSync('getconf', ['CLK_TCK']).toString());

/** Processor time of a process, ms. */
function processorTime(pid: number): number {
	const fields = readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ')[1]!.split(' ');
	return ((Number(fields[11]) + Number(fields[12])) * 1000) / ticks;
}

await withServer({ COMPUTE_RATE_PER_MINUTE: '0', BENCH: '1' }, async ({ url, pid }) => {
	const { size } = await post(`${url}/api/v1/analyse`);
	const routes = {
		analyse: `${url}/api/v1/analyse`,
		bare: `${url}/api/v1/bare?size=${size}`
	};
	const requests = 1500;
	for (const route of Object.values(routes)) await round(route, 4 * requests);
	const rates = { analyse: [] as number[], bare: [] as number[] };
	const spent = { analyse: [] as number[], bare: [] as number[] };
	for (let i = 0; i < 7; i++) {
		for (const name of ['analyse', 'bare'] as const) {
			const before = processorTime(pid);
			rates[name].push(await round(routes[name], requests));
			spent[name].push((processorTime(pid) - before) / requests);
		}
	}
	const rate = (name: 'analyse' | 'bare') => quantiles(rates[name]).median;
	const cost = (name: 'analyse' | 'bare') => quantiles(spent[name]).median;
	printTable(
		`Throughput, answers of ${size} bytes, 8 connections (median of 7 rounds)`,
		['route', 'requests a second', 'server time each'],
		[
			['/api/v1/analyse', rate('analyse').toFixed(0), `${cost('analyse').toFixed(3)} ms`],
			['bare', rate('bare').toFixed(0), `${cost('bare').toFixed(3)} ms`],
			[
				'analyse ÷ bare',
				(rate('analyse') / rate('bare')).toFixed(2),
				(cost('bare') / cost('analyse')).toFixed(2)
			]
		]
	);
});
agent.destroy();
