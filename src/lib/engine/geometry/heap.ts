/** Things of which the one with the greatest key is always at hand. */
export interface Heap<T> {
	push(item: T): void;
	/** Takes the greatest away. */
	pop(): T | undefined;
}

/** A binary heap: putting in and taking out cost the logarithm of how many there are. */
export function heapBy<T>(key: (item: T) => number): Heap<T> {
	const items: T[] = [];
	const above = (i: number, j: number) => key(items[i]!) > key(items[j]!);
	const swap = (i: number, j: number) => {
		[items[i], items[j]] = [items[j]!, items[i]!];
	};
	return {
		push: (item) => {
			items.push(item);
			for (let i = items.length - 1; i > 0;) {
				const parent = (i - 1) >> 1;
				if (!above(i, parent)) break;
				swap(i, parent);
				i = parent;
			}
		},
		pop: () => {
			if (items.length <= 1) return items.pop();
			swap(0, items.length - 1);
			const top = items.pop();
			for (let i = 0; ;) {
				let child = 2 * i + 1;
				if (child + 1 < items.length && above(child + 1, child)) child++;
				if (child >= items.length || !above(child, i)) return top;
				swap(i, child);
				i = child;
			}
		}
	};
}
