import { resolve } from 'node:path';

/** A file of the published data, below the project's root (the working directory). */
export const publishedFile = (name: string): string =>
	resolve(process.cwd(), 'data/published', name);
