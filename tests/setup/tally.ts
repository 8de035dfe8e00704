import type { Reporter, SerializedError, TestModule } from 'vitest/node';

const isBroken = (module: TestModule) =>
	module.state() === 'failed' && [...module.children.allTests()].length === 0;

/** Ends a run with one plain line, `N passed, N failed`; a file that does not load counts as failed. */
export default class Tally implements Reporter {
	onTestRunEnd(modules: readonly TestModule[], unhandled: readonly SerializedError[]): void {
		const tests = modules.flatMap((module) => [...module.children.allTests()]);
		const count = (state: string) => tests.filter((test) => test.result().state === state).length;
		const failed = count('failed') + modules.filter(isBroken).length + unhandled.length;
		process.stdout.write(`\n${count('passed')} passed, ${failed} failed\n`);
	}
}
