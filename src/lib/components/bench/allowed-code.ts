import { ranges } from '$lib/api/ranges';
import type { CodeChoice } from '$lib/engine/rules/result';

export interface AllowedCode {
	readonly code: Partial<CodeChoice>;
	/** What was changed, in words: "η 1.1 to 1"; empty when all may be used. */
	readonly changes: readonly string[];
}

const factors = { gammaM0: 'γM0', gammaM1: 'γM1', gammaM2: 'γM2' } as const;
const { least, most } = ranges.partialFactor;

/**
 * A code choice that was kept while other values were allowed, moved to the nearest that are now.
 * η halfway between 1 and 1.2 takes 1, which counts less shear.
 */
export function allowedCode(asked: Partial<CodeChoice>): AllowedCode {
	const code: Partial<CodeChoice> = { ...asked };
	const changes: string[] = [];
	for (const key of ['gammaM0', 'gammaM1', 'gammaM2'] as const) {
		const value = code[key];
		if (value === undefined || (value >= least && value <= most)) continue;
		code[key] = value < least ? least : most;
		changes.push(`${factors[key]} from ${value} to ${code[key]}`);
	}
	if (code.eta !== undefined && code.eta !== 1 && code.eta !== 1.2) {
		const eta = code.eta > 1.1 ? 1.2 : 1;
		changes.push(`η from ${code.eta} to ${eta}`);
		code.eta = eta;
	}
	return { code, changes };
}

/** The sentence for the person whose study was changed on opening; empty when none was. */
export const changesTold = (changes: readonly string[]): string =>
	changes.length === 0
		? ''
		: `The nearest allowed values are used: ${changes.join(', ')}. Figures may differ from before.`;
