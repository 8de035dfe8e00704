import type { VerdictStatus } from '$lib/engine/rules/verdict';

/** Whether the demand is met, in one sentence; empty where nothing is demanded or counted. */
export function standingText(status: VerdictStatus, subject: string): string {
	switch (status) {
		case 'passes':
			return `${subject} is met by every check made for it.`;
		case 'fails':
			return `${subject} is more than may be counted.`;
		case 'incomplete':
			return 'A check that applies to this demand is not built: no pass is given.';
		case 'no-figure':
			return '';
	}
}
