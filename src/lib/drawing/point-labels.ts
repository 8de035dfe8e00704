/** A name to stand beside a point, px. */
export interface PointLabel {
	readonly x: number;
	readonly y: number;
	readonly width: number;
}

/** Where the middle-left of a name stands. */
export interface LabelPlace {
	readonly x: number;
	readonly y: number;
}

interface Box {
	readonly left: number;
	readonly right: number;
	readonly top: number;
	readonly bottom: number;
}

const height = 14;
const off = 9;

/**
 * Places of names beside their points, clear of each other and of every point and within the frame;
 * null where there is no room for one.
 */
export function pointLabelPlaces(
	labels: readonly PointLabel[],
	frame: { readonly width: number; readonly height: number },
	obstacles: readonly { readonly x: number; readonly y: number }[] = labels
): (LabelPlace | null)[] {
	const taken: Box[] = obstacles.map(({ x, y }) => boxAt(x - 5, y, 10, 10));
	return labels.map((label) => {
		const place = candidates(label).find(({ x, y }) => {
			const box = boxAt(x, y, label.width, height);
			return within(box, frame) && taken.every((other) => !meets(box, other));
		});
		if (!place) return null;
		taken.push(boxAt(place.x, place.y, label.width, height));
		return place;
	});
}

function candidates({ x, y, width }: PointLabel): LabelPlace[] {
	const middle = x - width / 2;
	return [1, 1.9, 3].flatMap((far) => [
		{ x: x + off, y: y - (far - 1) * height },
		{ x: x - off - width, y: y - (far - 1) * height },
		{ x: middle, y: y - off * 1.5 * far },
		{ x: middle, y: y + off * 1.5 * far },
		{ x: x + off, y: y + (far - 1) * height },
		{ x: x - off - width, y: y + (far - 1) * height }
	]);
}

const boxAt = (x: number, y: number, width: number, tall: number): Box => ({
	left: x,
	right: x + width,
	top: y - tall / 2,
	bottom: y + tall / 2
});

const within = (box: Box, frame: { width: number; height: number }) =>
	box.left >= 0 && box.right <= frame.width && box.top >= 0 && box.bottom <= frame.height;

const meets = (a: Box, b: Box) =>
	a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;
