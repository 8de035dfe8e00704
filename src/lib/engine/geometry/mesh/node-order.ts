/** Nodes that share an element with each node, in one list. */
interface Neighbours {
	readonly start: Int32Array;
	readonly list: Int32Array;
}

/**
 * Numbers for nodes so that neighbours are close (reverse Cuthill–McKee): position of each node.
 * `elements` lists six nodes each.
 */
export function nodeOrder(elements: Int32Array, count: number): Int32Array {
	const neighbours = neighboursOf(elements, count);
	const order: number[] = [];
	const seen = new Uint8Array(count);
	for (let node = 0; node < count; node++) {
		if (seen[node]) continue;
		const end = furthest(neighbours, furthest(neighbours, node, count), count);
		for (const next of wave(neighbours, end, seen)) order.push(next);
	}
	const position = new Int32Array(count);
	order.forEach((node, i) => (position[node] = count - 1 - i));
	return position;
}

function neighboursOf(elements: Int32Array, count: number): Neighbours {
	const start = new Int32Array(count + 1);
	for (const node of elements) start[node + 1]! += 5;
	for (let i = 0; i < count; i++) start[i + 1]! += start[i]!;
	const fill = Int32Array.from(start);
	const list = new Int32Array(start[count]!);
	for (let e = 0; e < elements.length; e += 6)
		for (let a = e; a < e + 6; a++)
			for (let b = e; b < e + 6; b++) if (a !== b) list[fill[elements[a]!]!++] = elements[b]!;
	return { start, list };
}

const furthest = (neighbours: Neighbours, from: number, count: number): number =>
	wave(neighbours, from, new Uint8Array(count)).at(-1)!;

/** Nodes in the order in which a wave from one of them reaches them, those with few neighbours first. */
function wave({ start, list }: Neighbours, from: number, seen: Uint8Array): number[] {
	const reached = [from];
	seen[from] = 1;
	const degree = (node: number) => start[node + 1]! - start[node]!;
	// grows while it is walked
	for (const node of reached) {
		const next: number[] = [];
		for (let k = start[node]!; k < start[node + 1]!; k++) {
			const other = list[k]!;
			if (seen[other]) continue;
			seen[other] = 1;
			next.push(other);
		}
		next.sort((a, b) => degree(a) - degree(b));
		reached.push(...next);
	}
	return reached;
}
