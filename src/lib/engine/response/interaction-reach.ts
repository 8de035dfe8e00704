import type { ElasticSection } from './interaction-first-yield';
import { fibreUse } from './interaction-fibres';
import type { Mechanics } from './law-groups';

/** N and N·mm. */
interface Furthest {
	N: number;
	My: number;
	Mz: number;
}

/**
 * The greatest force of a sign that the section bears elastically, with the moments that help it
 * most. A body that yields early is spared by bending, so that this may lie beyond the force borne
 * without moments. Use is convex in both moments: two nested searches along one moment each.
 */
export function furthestForce(
	{ bodies, planeOf }: ElasticSection,
	{ reach }: Mechanics,
	sign: number
): Furthest {
	const alongY = planeOf(0, reach, 0);
	const useAt = (y: number, z: number) =>
		fibreUse(bodies, planeOf(sign, y * reach, z * reach), alongY).use;
	const bestY = (z: number) => leastPlace((y) => useAt(y, z));
	const z = leastPlace((at) => useAt(bestY(at), at));
	const y = bestY(z);
	const N = sign / useAt(y, z);
	return { N, My: y * reach * Math.abs(N), Mz: z * reach * Math.abs(N) };
}

const golden = (Math.sqrt(5) - 1) / 2;

/** Where a convex function is least, in [−2, 2]: eccentricities in shares of the section's reach. */
function leastPlace(value: (x: number) => number): number {
	let [low, high] = [-2, 2];
	let [x1, x2] = [high - golden * (high - low), low + golden * (high - low)];
	let [f1, f2] = [value(x1), value(x2)];
	while (high - low > 1e-10) {
		if (f1 < f2) {
			[high, x2, f2] = [x2, x1, f1];
			x1 = high - golden * (high - low);
			f1 = value(x1);
		} else {
			[low, x1, f1] = [x1, x2, f2];
			x2 = low + golden * (high - low);
			f2 = value(x2);
		}
	}
	return (low + high) / 2;
}
