/** Address of the Rack with these parameters; empty ones are left out. */
export const rackAddress = (parameters: Record<string, string | number>): string => {
	const kept = Object.entries(parameters).filter(([, value]) => value !== '');
	const text = new URLSearchParams(kept.map(([key, value]) => [key, String(value)])).toString();
	return text ? `/rack?${text}` : '/rack';
};

/** "1 section", "7 sections", "2 300 shapes". */
export const counted = (count: number, one: string): string => {
	const figure = String(count).replace(/\B(?=(\d{3})+$)/g, '\u202f');
	return `${figure} ${one}${count === 1 ? '' : 's'}`;
};
