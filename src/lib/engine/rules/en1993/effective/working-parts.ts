import type { WorkingInput } from '../../../explain/working';

export const clause = 'EN 1993-1-5 4.4';
export const edition = 'EN 1993-1-5:2006';

export const input = (symbol: string, value: number, unit: string, from?: string): WorkingInput =>
	from === undefined ? { symbol, value, unit } : { symbol, value, unit, from };
