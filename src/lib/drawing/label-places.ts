/** A label along a line: where it wants its middle, and its size, px. */
export interface WantedLabel {
	readonly at: number;
	readonly size: number;
}

interface Cluster {
	members: number[];
	size: number;
	middle: number;
	wanted: number;
}

/**
 * Middles of labels moved as little as possible so that none overlaps and all stay within [from, to]
 * while they fit. Order is kept; answers are in the order asked.
 */
export function spreadLabels(
	labels: readonly WantedLabel[],
	from: number,
	to: number,
	gap = 2
): number[] {
	const order = labels.map((_, index) => index).sort((a, b) => at(labels, a) - at(labels, b));
	const clusters: Cluster[] = [];
	for (const index of order) {
		const size = (labels[index]?.size ?? 0) + gap;
		const wanted = at(labels, index);
		clusters.push(kept({ members: [index], size, middle: wanted, wanted }, from, to));
		mergeBack(clusters, from, to);
	}
	return placed(labels, clusters, gap);
}

const at = (labels: readonly WantedLabel[], index: number) => labels[index]?.at ?? 0;

function kept(cluster: Cluster, from: number, to: number): Cluster {
	const half = cluster.size / 2;
	const middle = Math.max(from + half, Math.min(to - half, cluster.wanted));
	return { ...cluster, middle };
}

function mergeBack(clusters: Cluster[], from: number, to: number): void {
	for (;;) {
		const [upper, lower] = [clusters.at(-2), clusters.at(-1)];
		if (!upper || !lower) return;
		if (upper.middle + upper.size / 2 <= lower.middle - lower.size / 2 + 1e-9) return;
		clusters.splice(-2, 2, kept(merged(upper, lower), from, to));
	}
}

function merged(upper: Cluster, lower: Cluster): Cluster {
	const members = [...upper.members, ...lower.members];
	const size = upper.size + lower.size;
	const shiftUp = upper.wanted + lower.size / 2;
	const shiftDown = lower.wanted - upper.size / 2;
	const wanted =
		(shiftUp * upper.members.length + shiftDown * lower.members.length) / members.length;
	return { members, size, middle: wanted, wanted };
}

function placed(
	labels: readonly WantedLabel[],
	clusters: readonly Cluster[],
	gap: number
): number[] {
	const out = labels.map(({ at }) => at);
	for (const { members, size, middle } of clusters) {
		let edge = middle - size / 2;
		for (const index of members) {
			const own = (labels[index]?.size ?? 0) + gap;
			out[index] = edge + own / 2;
			edge += own;
		}
	}
	return out;
}
