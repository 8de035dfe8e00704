import type { z } from './zod';

/** One route of the API, told once for the description and the readable page. */
export interface Operation {
	readonly id: string;
	readonly method: 'get' | 'post' | 'patch' | 'delete';
	readonly path: string;
	readonly title: string;
	readonly description: string;
	readonly query?: z.ZodObject;
	readonly body?: z.ZodType;
	readonly answer: z.ZodType | null;
	/** Status of the answer when all is well; 200 when absent. */
	readonly status?: number;
	/** Further statuses with a body in the answer's own shape. */
	readonly alike?: readonly number[];
	/** What it may refuse with, besides 500. */
	readonly refusals: readonly number[];
	/** Body of a 409 that carries more than the error. */
	readonly conflict?: z.ZodType;
	/** Needs a session; everything else is open to all. */
	readonly signedIn?: true;
}
