import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { plateStockSchema } from '../../api/firm-settings';
import type { PlateStock } from '../../engine/unlock/plate-stock';

let read: PlateStock | undefined;

/** The stock shipped in `data/`, for firms that keep none. Throws when the release is damaged. */
export const defaultStock = (root = process.cwd()): PlateStock => {
	const path = resolve(root, 'data/plate-stock/plates.json');
	read ??= plateStockSchema.parse(JSON.parse(readFileSync(path, 'utf8')));
	return read;
};
