import type { GrossProperties } from '$lib/engine/section/prepared';
import type { Column } from './published-table';

/** A gross property divided by the size of the table's unit in mm, mm², … */
const gross =
	(read: (properties: GrossProperties) => number | null, unit: number): Column =>
	({ gross: properties }) => {
		const value = read(properties);
		return value === null ? null : value / unit;
	};

const smaller = (a: number, b: number): number => Math.min(a, b);
const tangent = (degrees: number): number => Math.abs(Math.tan((degrees * Math.PI) / 180));

/** EN tables: cm and its powers, kg/m. */
export const en = {
	mass: gross((g) => g.mass, 1),
	A: gross((g) => g.area, 1e2),
	Iy: gross((g) => g.secondMomentY, 1e4),
	Wel_y: gross((g) => smaller(g.elasticModulusYTop, g.elasticModulusYBottom), 1e3),
	Wpl_y: gross((g) => g.plasticModulusY, 1e3),
	iy: gross((g) => g.radiusOfGyrationY, 10),
	Iz: gross((g) => g.secondMomentZ, 1e4),
	Wel_z: gross((g) => smaller(g.elasticModulusZLeft, g.elasticModulusZRight), 1e3),
	Wpl_z: gross((g) => g.plasticModulusZ, 1e3),
	iz: gross((g) => g.radiusOfGyrationZ, 10),
	It: gross((g) => g.torsionConstant, 1e4),
	Iw: gross((g) => g.warpingConstant, 1e6),
	ys: gross((g) => g.centroid.y, 10),
	cy: gross((g) => g.centroid.z, 10),
	cz: gross((g) => g.centroid.y, 10),
	Iu: gross((g) => g.secondMomentU, 1e4),
	iu: gross((g) => Math.sqrt(g.secondMomentU / g.area), 10),
	Iv: gross((g) => g.secondMomentV, 1e4),
	iv: gross((g) => Math.sqrt(g.secondMomentV / g.area), 10)
} satisfies Record<string, Column>;

const inch = 25.4;

/** AISC tables: inches and their powers; x–x is our y–y, y–y our z–z. */
export const aisc = {
	A: gross((g) => g.area, inch ** 2),
	Ix: gross((g) => g.secondMomentY, inch ** 4),
	Sx: gross((g) => smaller(g.elasticModulusYTop, g.elasticModulusYBottom), inch ** 3),
	Zx: gross((g) => g.plasticModulusY, inch ** 3),
	rx: gross((g) => g.radiusOfGyrationY, inch),
	Iy: gross((g) => g.secondMomentZ, inch ** 4),
	Sy: gross((g) => smaller(g.elasticModulusZLeft, g.elasticModulusZRight), inch ** 3),
	Zy: gross((g) => g.plasticModulusZ, inch ** 3),
	ry: gross((g) => g.radiusOfGyrationZ, inch),
	J: gross((g) => g.torsionConstant, inch ** 4),
	Cw: gross((g) => g.warpingConstant, inch ** 6)
} satisfies Record<string, Column>;

/** Angle between the axes of an angle section, as a tangent, from the leg-parallel to the minor axis. */
export const angleTangent: Column = ({ gross: g }) => {
	const direct = tangent(g.principalAngle);
	return g.secondMomentY >= g.secondMomentZ ? direct : 1 / direct;
};
