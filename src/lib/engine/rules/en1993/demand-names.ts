import type { Demand } from '../result';

/** Names of demands in their order, each once: its name or its place, with a count when it repeats. */
export function demandNames(demands: readonly Demand[]): string[] {
	const taken = new Set<string>();
	return demands.map(({ name }, place) => {
		const wanted = name?.trim() ? name : `demand ${place + 1}`;
		let free = wanted;
		for (let count = 2; taken.has(free); count++) free = `${wanted} (${count})`;
		taken.add(free);
		return free;
	});
}
