import { flanksOf } from '../../geometry/flank';
import { momentCount, type Moments } from '../../geometry/flank-moments';
import { addMomentsBelow } from '../../geometry/flank-sums';
import type { Frame } from '../../geometry/frame';
import type { Layer } from '../../material/layers';
import type { PlaneForces } from '../plane-forces';
import { fallOf, type Cell } from './cell';
import type { LinearField } from './linear-field';

/**
 * Sums over the section about its centroid: ∫σ, ∫σz, ∫σy (N, N·mm), then the tangent moments
 * ∫Et·(1, z, y, z², yz, y²).
 */
export type ForceSums = Float64Array;

export const noForces = (): ForceSums => new Float64Array(9);

/** Adds the forces of a cell under a strain plane: exact, each layer cut where it yields. */
export function addCellForces(
	sums: ForceSums,
	cell: Cell,
	layers: readonly Layer[],
	strain: LinearField
): void {
	const { moments, box, plastic } = cell;
	for (let k = 0; k < layers.length; k++) {
		const { modulus, tension, compression } = layers[k]!;
		const own = plastic[k]!;
		const [c, y, z] = [strain.c - own.c, strain.y - own.y, strain.z - own.z];
		const [y1, y2, z1, z2] = [y * box.left, y * box.right, z * box.bottom, z * box.top];
		const most = c + (y1 > y2 ? y1 : y2) + (z1 > z2 ? z1 : z2);
		const least = c + (y1 < y2 ? y1 : y2) + (z1 < z2 ? z1 : z2);
		if (most <= tension && least >= -compression) addElastic(sums, moments, modulus, c, y, z);
		else if (least >= tension) addEven(sums, moments, modulus * tension);
		else if (most <= -compression) addEven(sums, moments, -modulus * compression);
		else addCut(sums, cell, layers[k]!, { c, y, z });
	}
}

/** Adds steel that all bears stress = E (c + y·Y + z·Z). */
function addElastic(sums: ForceSums, m: Moments, E: number, c: number, y: number, z: number) {
	const [area, mz, my, mzz, myz, myy] = m as unknown as SixNumbers;
	sums[0]! += E * (c * area + z * mz + y * my);
	sums[1]! += E * (c * mz + z * mzz + y * myz);
	sums[2]! += E * (c * my + z * myz + y * myy);
	for (let i = 0; i < momentCount; i++) sums[i + 3]! += E * m[i]!;
}

type SixNumbers = [number, number, number, number, number, number];

/** Adds steel that all bears one stress. */
function addEven(sums: ForceSums, m: Moments, stress: number): void {
	for (let i = 0; i < 3; i++) sums[i]! += stress * m[i]!;
}

/** Adds a layer that may yield in part of its cell: tension below the one level, compression above the other. */
function addCut(
	sums: ForceSums,
	{ edges }: Cell,
	{ modulus, tension, compression }: Layer,
	elastic: LinearField
): void {
	const { frame, size } = fallOf(elastic);
	const flanks = flanksOf([edges], frame);
	const below = (level: number) => {
		const out = new Float64Array(momentCount);
		addMomentsBelow(out, flanks, level);
		return upright(out, frame);
	};
	const stretched = below((elastic.c - tension) / size);
	const middle = below((elastic.c + compression) / size);
	const crushed = below(Infinity);
	for (let i = 0; i < momentCount; i++) {
		crushed[i]! -= middle[i]!;
		middle[i]! -= stretched[i]!;
	}
	if (tension < Infinity) addEven(sums, stretched, modulus * tension);
	if (compression < Infinity) addEven(sums, crushed, -modulus * compression);
	addElastic(sums, middle, modulus, elastic.c, elastic.y, elastic.z);
}

/** Moments of a turned frame, about the section's own axes; written over the given ones. */
export function upright(m: Moments, { cos: c, sin: s }: Frame): Moments {
	const [, across, along, across2, product, along2] = m as unknown as SixNumbers;
	m[1] = s * along + c * across;
	m[2] = c * along - s * across;
	m[3] = s * s * along2 + 2 * s * c * product + c * c * across2;
	m[4] = s * c * (along2 - across2) + (c * c - s * s) * product;
	m[5] = c * c * along2 - 2 * s * c * product + s * s * across2;
	return m;
}

/** The sums as forces and tangent in the frame of an axis. */
export function forcesInFrame(
	sums: ForceSums,
	{ cos: c, sin: s }: { cos: number; sin: number }
): PlaneForces {
	const [N, Fz, Fy, A, z, y, zz, yz, yy] = sums as unknown as NineNumbers;
	return {
		N,
		M: s * Fy - c * Fz,
		T: c * Fy + s * Fz,
		NN: A,
		NM: s * y - c * z,
		NT: c * y + s * z,
		MM: s * s * yy - 2 * s * c * yz + c * c * zz,
		MT: s * c * (yy - zz) + (s * s - c * c) * yz,
		TT: c * c * yy + 2 * s * c * yz + s * s * zz
	};
}

type NineNumbers = [number, number, number, number, number, number, number, number, number];
