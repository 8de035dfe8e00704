/** Groups 0 … count−1 into pieces that hang together by links; each piece lists its members in order. */
export function connectedPieces(
	count: number,
	links: Iterable<readonly [number, number]>
): number[][] {
	const leader = Array.from({ length: count }, (_, i) => i);
	const find = (i: number): number => {
		while (leader[i] !== i) i = leader[i] = leader[leader[i]!]!;
		return i;
	};
	for (const [a, b] of links) leader[find(b)] = find(a);
	const pieces = new Map<number, number[]>();
	for (let i = 0; i < count; i++) pieces.set(find(i), [...(pieces.get(find(i)) ?? []), i]);
	return [...pieces.values()];
}
