import type { Flat } from './element';

/** A level flange: thickness, height of its middle and y of its line of symmetry, mm. */
export interface Flange {
	readonly part: string;
	readonly t: number;
	readonly z: number;
	readonly middle: number;
}

/** Both outstands of a flange from its roots at middle ± root to its tips at middle ± half width. */
export function outstands({ part, t, z, middle }: Flange, root: number, tip: number): Flat[] {
	if (tip <= root) return [];
	return ([-1, 1] as const).map((side) => ({
		id: `${part}.${side < 0 ? 'left' : 'right'}`,
		part,
		type: 'outstand',
		t,
		from: { y: middle + side * root, z },
		to: { y: middle + side * tip, z }
	}));
}
