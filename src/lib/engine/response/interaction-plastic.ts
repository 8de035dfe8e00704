import type { InteractionPlane } from './interaction';
import { plasticBlocks, type BlockForces, type Blocks } from './interaction-block';
import type { ConvexCurve, PlanePoint } from './interaction-spread';
import type { Mechanics } from './law-groups';

/** Less bulge than this share of the section's strength is rounding: the curve is straight there. */
const straight = 1e-14;

/**
 * The full plastic curve of a plane. Its point with the outward normal (a, b) belongs to the block
 * whose strains are in the ratio of a and b (normality of the plastic flow), so that each point comes
 * from a neutral axis and not from a search along the curve; only the strain that holds the third
 * force is sought, and nothing where symmetry makes that force zero. `N` in newton, for My–Mz; null
 * when it exceeds the section.
 */
export function plasticCurve(
	mechanics: Mechanics,
	plane: InteractionPlane,
	N: number
): ConvexCurve | null {
	const blocks = plasticBlocks(mechanics);
	if (plane === 'My-Mz' && !(N > blocks.crushed && N < blocks.stretched)) return null;
	const support = supportOf(mechanics, blocks, plane, N);
	const { squash, reach } = mechanics;
	const across = plane === 'My-Mz' ? 1 : reach;
	return {
		start: [support(across, 0), support(0, 1), support(-across, 0), support(0, -1)],
		between: (from, to) => {
			const [a, b] = [to.b - from.b, from.a - to.a];
			const found = support(a, b);
			const bulge = a * (found.a - from.a) + b * (found.b - from.b);
			const size = squash * reach * (Math.abs(a) / across + Math.abs(b));
			if (bulge > straight * size) return found;
			return { a: (from.a + to.a) / 2, b: (from.b + to.b) / 2 };
		}
	};
}

/** Furthest point of the curve along a normal. */
function supportOf(
	mechanics: Mechanics,
	blocks: Blocks,
	plane: InteractionPlane,
	N: number
): (a: number, b: number) => PlanePoint {
	switch (plane) {
		case 'N-My':
			return (e0, ky) => {
				const held = (kz: number) => blocks.ofStrains(e0, ky, kz);
				const at = balanced(mechanics, e0, ky, held, ({ Mz }) => Mz);
				return { a: at.N, b: at.My };
			};
		case 'N-Mz':
			return (e0, kz) => {
				const held = (ky: number) => blocks.ofStrains(e0, ky, kz);
				const at = balanced(mechanics, e0, kz, held, ({ My }) => My);
				return { a: at.N, b: at.Mz };
			};
		case 'My-Mz':
			return (ky, kz) => {
				const at = blocks.under(N, ky, kz);
				return { a: at.My, b: at.Mz };
			};
	}
}

/** The block whose moment across is zero: that moment never falls as the strain across grows. */
function balanced(
	{ squash, reach }: Mechanics,
	e0: number,
	curvature: number,
	held: (across: number) => BlockForces,
	moment: (forces: BlockForces) => number
): BlockForces {
	const enough = 1e-14 * squash * reach;
	const unit = Math.max(Math.abs(curvature), Math.abs(e0) / reach);
	const at = (turned: number) => held(turned === 0 ? 0 : unit * Math.tan(turned));
	const first = at(0);
	const value = moment(first);
	if (Math.abs(value) <= enough) return first;
	const end = value < 0 ? Math.PI / 2 : -Math.PI / 2;
	return fallingBetween(at, moment, [0, value], [end, -value], enough);
}

/** Regula falsi (Illinois) between two places with moments of opposite sign. */
function fallingBetween(
	at: (turned: number) => BlockForces,
	moment: (forces: BlockForces) => number,
	near: [number, number],
	far: [number, number],
	enough: number
): BlockForces {
	let [[x0, f0], [x1, f1]] = [near, far];
	let best = at(x0);
	for (let i = 0; i < 100 && Math.abs(x1 - x0) > 1e-16; i++) {
		const secant = (x0 * f1 - x1 * f0) / (f1 - f0);
		const x = i === 0 || i % 8 === 7 ? (x0 + x1) / 2 : secant;
		const forces = at(x);
		const value = moment(forces);
		if (Math.abs(value) < Math.abs(moment(best))) best = forces;
		if (Math.abs(value) <= enough) return forces;
		if (value * f1 < 0) [x0, f0] = [x1, f1];
		else f0 /= 2;
		[x1, f1] = [x, value];
	}
	return best;
}
