import type { z } from 'zod';
import { fail, ok, type Issue, type Result } from '../engine/result';
import {
	sectionConflict,
	sectionResponse,
	type CreateSectionRequest,
	type SectionConflict,
	type SectionRecord,
	type UpdateSectionRequest
} from './sections';

/** Why a call failed, in words that may be shown; `conflict` when somebody saved in between. */
export interface SectionFailure {
	status: number;
	code: string;
	message: string;
	issues: Issue[];
	conflict?: SectionConflict;
}

const unreachable: SectionFailure = {
	status: 0,
	code: 'unreachable',
	message: 'The server cannot be reached. Check the connection and try again.',
	issues: []
};

const property = (value: unknown, key: string): unknown =>
	typeof value === 'object' && value !== null ? Reflect.get(value, key) : undefined;

const textOr = (value: unknown, otherwise: string) =>
	typeof value === 'string' ? value : otherwise;

const failureOf = (status: number, body: unknown): SectionFailure => {
	const error = property(body, 'error');
	const issues = property(error, 'issues');
	const conflict = sectionConflict.safeParse(body);
	return {
		status,
		code: textOr(property(error, 'code'), 'unexpected'),
		message: textOr(property(error, 'message'), 'The server gave an answer that is no use here.'),
		issues: Array.isArray(issues) ? (issues as Issue[]) : [],
		...(conflict.success ? { conflict: conflict.data } : {})
	};
};

const call = async <T>(
	fetcher: typeof fetch,
	method: string,
	path: string,
	body: unknown,
	read: (json: unknown) => T
): Promise<Result<T, SectionFailure>> => {
	const response = await fetcher(`/api/v1/sections${path}`, {
		method,
		headers: { accept: 'application/json', 'content-type': 'application/json' },
		...(body === undefined ? {} : { body: JSON.stringify(body) })
	}).catch(() => null);
	if (!response) return fail(unreachable);
	const json: unknown = await response.json().catch(() => null);
	return response.ok ? ok(read(json)) : fail(failureOf(response.status, json));
};

const sectionOf = (json: unknown): z.infer<typeof sectionResponse>['section'] =>
	sectionResponse.parse(json).section;

type Answer = Promise<Result<SectionRecord, SectionFailure>>;

/** Puts a new section on the firm's Rack. */
export const createSection = (section: CreateSectionRequest, fetcher = fetch): Answer =>
	call(fetcher, 'POST', '', section, sectionOf);

export const readSection = (id: string, fetcher = fetch): Answer =>
	call(fetcher, 'GET', `/${encodeURIComponent(id)}`, undefined, sectionOf);

/** Saves changes; a failure with `conflict` tells that somebody else saved since `version`. */
export const updateSection = (id: string, changes: UpdateSectionRequest, fetcher = fetch): Answer =>
	call(fetcher, 'PATCH', `/${encodeURIComponent(id)}`, changes, sectionOf);

/** Takes a section off the Rack; `restoreSection` undoes it. */
export const deleteSection = (id: string, fetcher = fetch): Promise<Result<null, SectionFailure>> =>
	call(fetcher, 'DELETE', `/${encodeURIComponent(id)}`, undefined, () => null);

export const restoreSection = (id: string, fetcher = fetch): Answer =>
	call(fetcher, 'POST', `/${encodeURIComponent(id)}/restore`, undefined, sectionOf);
