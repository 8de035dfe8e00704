import { setImmediate as nextTurn } from 'node:timers/promises';
import { engineVersion } from '../../engine/version';
import { log } from '../log';
import { proofFamilies, type ProofCheck, type ProofFamily } from './check';
import { allChecks } from './registry';

/** Longest that other requests wait for a turn, ms; solving torsion by elements is a turn of its own. */
const turn = 20;

/** How many values one family holds, and how many of them ours meets. */
export interface FamilyCount {
	readonly family: ProofFamily;
	readonly title: string;
	readonly values: number;
	readonly passed: number;
	readonly failed: number;
	readonly fromMemory: number;
}

/** Every check of this engine's version, with the counts. */
export interface Proof {
	readonly engineVersion: string;
	readonly checks: readonly ProofCheck[];
	readonly families: readonly FamilyCount[];
}

let kept: Promise<Proof> | undefined;

/** All checks, computed once a process, a turn at a time; tried again after a fault. */
export function proof(): Promise<Proof> {
	kept ??= computed().catch((error: unknown) => {
		kept = undefined;
		throw error;
	});
	return kept;
}

async function computed(): Promise<Proof> {
	const begun = performance.now();
	const checks: ProofCheck[] = [];
	let started = begun;
	for (const some of allChecks()) {
		checks.push(...some);
		if (performance.now() - started < turn) continue;
		await nextTurn();
		started = performance.now();
	}
	const order = Object.keys(proofFamilies);
	checks.sort((a, b) => order.indexOf(a.family) - order.indexOf(b.family));
	const families = countsOf(checks);
	const failed = checks.filter(({ pass }) => !pass).length;
	const ms = Math.round(performance.now() - begun);
	log.info({ values: checks.length, failed, ms }, 'published values compared');
	return { engineVersion, checks, families };
}

const countsOf = (checks: readonly ProofCheck[]): FamilyCount[] =>
	Object.entries(proofFamilies).map(([family, title]) => {
		const own = checks.filter((check) => check.family === family);
		const passed = own.filter(({ pass }) => pass).length;
		return {
			family: family as ProofFamily,
			title,
			values: own.length,
			passed,
			failed: own.length - passed,
			fromMemory: own.filter(({ fromMemory }) => fromMemory).length
		};
	});
