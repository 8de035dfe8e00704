import type { Triangulation } from './triangulation';

/** The same side seen from the other triangle, −1 where none within the area lies beyond. */
export const twinInside = ({ twins, inside }: Triangulation, side: number): number => {
	const twin = twins[side]!;
	return twin >= 0 && inside[Math.floor(twin / 3)] ? twin : -1;
};

/** Leader of each of `count` things once `join` has been called for all that belong together. */
export function groups(count: number, joinAll: (join: (a: number, b: number) => void) => void) {
	const leader = Int32Array.from({ length: count }, (_, i) => i);
	const find = (i: number): number => {
		while (leader[i] !== i) i = leader[i] = leader[leader[i]!]!;
		return i;
	};
	joinAll((a, b) => {
		leader[find(b)] = find(a);
	});
	return find;
}

/** Number of the piece each triangle within the area belongs to; pieces hang together by sides. */
export function piecesOf(mesh: Triangulation) {
	const find = groups(mesh.inside.length, (join) => {
		for (let side = 0; side < mesh.twins.length; side++)
			if (mesh.inside[Math.floor(side / 3)] && twinInside(mesh, side) >= 0)
				join(Math.floor(side / 3), Math.floor(twinInside(mesh, side) / 3));
	});
	const numbers = new Map<number, number>();
	const pieceOf: number[] = [];
	mesh.inside.forEach((within, t) => {
		if (!within) return;
		const number = numbers.get(find(t)) ?? numbers.size;
		numbers.set(find(t), number);
		pieceOf.push(number);
	});
	return { pieceOf: Int32Array.from(pieceOf), pieces: numbers.size };
}
