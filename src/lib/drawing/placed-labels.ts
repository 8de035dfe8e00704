import { roughTextWidth, type TextMeasure } from './text-width';

/** A label and the point it wants its middle on, px; `must` ones are placed first. */
export interface LabelWish {
	readonly key: string;
	readonly text: string;
	readonly x: number;
	readonly y: number;
	readonly must?: boolean;
}

/** A label in its place: middle and size, px; `moved` when it stands off its point. */
export interface PlacedLabel extends LabelWish {
	readonly width: number;
	readonly height: number;
	readonly wantedX: number;
	readonly wantedY: number;
	readonly moved: boolean;
}

export interface LabelRoom {
	readonly left: number;
	readonly right: number;
	readonly top: number;
	readonly bottom: number;
}

/** A place that something else has: middle and size, px. */
export interface TakenPlace {
	readonly x: number;
	readonly y: number;
	readonly width: number;
	readonly height: number;
}

/** Rows that a label may move up or down. */
const rows = [0, -1, 1, -2, 2, -3, 3, -5, 5, -8, 8];

/**
 * Labels moved near their points so that none overlaps another or a taken place and all lie within
 * the room; those with no place left are dropped. Earlier wishes go first.
 */
export function placedLabels(
	wishes: readonly LabelWish[],
	room: LabelRoom,
	size: number,
	measure: TextMeasure = roughTextWidth,
	taken: readonly TakenPlace[] = []
): PlacedLabel[] {
	const order = [...wishes].sort((p, q) => Number(q.must ?? false) - Number(p.must ?? false));
	const placed: PlacedLabel[] = [];
	for (const wish of order) {
		const width = measure(wish.text, size) + 4;
		const height = size * 1.25;
		const label = candidates(wish, width, height, room).find(
			(one) => ![...placed, ...taken].some((other) => overlap(one, other))
		);
		if (label) placed.push(label);
	}
	return placed;
}

function candidates(wish: LabelWish, width: number, height: number, room: LabelRoom) {
	const within = (value: number, from: number, to: number) => Math.max(from, Math.min(to, value));
	const sides = [0, 0.6, -0.6];
	return rows.flatMap((row) =>
		sides.map((side): PlacedLabel => {
			const x = within(wish.x + side * width, room.left + width / 2, room.right - width / 2);
			const y = within(wish.y + row * height, room.top + height / 2, room.bottom - height / 2);
			const moved = Math.abs(y - wish.y) > height || Math.abs(x - wish.x) > width / 2;
			return { ...wish, x, y, width, height, wantedX: wish.x, wantedY: wish.y, moved };
		})
	);
}

const overlap = (p: TakenPlace, q: TakenPlace): boolean =>
	Math.abs(p.x - q.x) < (p.width + q.width) / 2 && Math.abs(p.y - q.y) < (p.height + q.height) / 2;
