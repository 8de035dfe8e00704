import type { Point } from './boundary';

/** A ring without points that repeat the one before; closing point dropped. */
export function withoutRepeats(points: readonly Point[]): Point[] {
	return points.filter((point, i) => {
		const before = points.at(i - 1);
		return points.length === 1 || before!.y !== point.y || before!.z !== point.z;
	});
}

/** Area of a ring, mm², positive anticlockwise; measured from its first point, so that distance costs no digits. */
export function ringArea(points: readonly Point[]): number {
	const { y: oy, z: oz } = points[0] ?? { y: 0, z: 0 };
	return points.reduce((sum, a, i) => {
		const b = points[(i + 1) % points.length]!;
		return sum + ((a.y - oy) * (b.z - oz) - (b.y - oy) * (a.z - oz)) / 2;
	}, 0);
}

/** The ring run anticlockwise (`true`) or clockwise. */
export function wound(points: readonly Point[], anticlockwise: boolean): Point[] {
	const right = ringArea(points) > 0 === anticlockwise;
	return right ? [...points] : [...points].reverse();
}
