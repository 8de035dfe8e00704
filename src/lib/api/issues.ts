import type { Issue } from '$lib/engine/result';
import type { z } from './zod';

type ZodIssue = z.core.$ZodIssue;

const dotted = (path: readonly PropertyKey[]) => path.map(String).join('.');

/** The branch of a union that the writer most likely meant: one that got past the type itself. */
const meantBranch = (branches: readonly (readonly ZodIssue[])[]) =>
	branches.find((branch) =>
		branch.some((one) => one.path.length > 0 || one.code !== 'invalid_type')
	);

const flat = (issue: ZodIssue, before: readonly PropertyKey[]): Issue[] => {
	const path = [...before, ...issue.path];
	if (issue.code === 'unrecognized_keys')
		return issue.keys.map((key) => ({ path: dotted([...path, key]), message: issue.message }));
	const meant = issue.code === 'invalid_union' ? meantBranch(issue.errors) : undefined;
	if (meant) return meant.flatMap((inner) => flat(inner, path));
	return [{ path: dotted(path), message: issue.message }];
};

/** What is wrong with an input, each with its dotted path (`section.tw`) and a sentence. */
export const issuesOf = (error: z.ZodError): Issue[] =>
	error.issues.flatMap((issue) => flat(issue, []));
