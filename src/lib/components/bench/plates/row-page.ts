/** A page of a long list: which rows it shows, counted from 0, and how many pages there are. */
export interface RowPage {
	readonly page: number;
	readonly pages: number;
	readonly from: number;
	readonly to: number;
}

/** The page asked for, or the last there is. */
export function rowPage(asked: number, rows: number, size: number): RowPage {
	const pages = Math.max(1, Math.ceil(rows / size));
	const page = Math.max(0, Math.min(asked, pages - 1));
	return { page, pages, from: page * size, to: Math.min(rows, (page + 1) * size) };
}
