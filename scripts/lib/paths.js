import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** The clone this script belongs to. */
export const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');

/** Everything that a start leaves behind: data, secret, builds. Never committed. */
export const local = path.join(root, '.local');

/** @param {...string} parts */
export const inRoot = (...parts) => path.join(root, ...parts);

/** @param {...string} parts */
export const inLocal = (...parts) => path.join(local, ...parts);
