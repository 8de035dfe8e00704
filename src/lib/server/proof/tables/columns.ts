import type { GrossProperties, PreparedSection } from '../../../engine/section/prepared';

/** A printed property of a table and our own value of it, in the table's unit. */
export interface Column {
	readonly unit: string;
	readonly ours: (section: PreparedSection) => number | null;
	/** Value of the last printed digit where the table was printed in another unit than the file's. */
	readonly lastDigit?: number;
	/** What must be known to read the comparison. */
	readonly remark?: string;
}

export type Columns = Readonly<Record<string, Column>>;

type Read = (properties: GrossProperties) => number | null;

/** A gross property divided by the size of the table's unit in mm, mm², … */
const gross = (unit: string, size: number, read: Read): Column => ({
	unit,
	ours: ({ gross: properties }) => {
		const value = read(properties);
		return value === null ? null : value / size;
	}
});

const tangent = (degrees: number): number => Math.abs(Math.tan((degrees * Math.PI) / 180));

/** EN tables: cm and its powers, kg/m. */
export const en = {
	mass: gross('kg/m', 1, (g) => g.mass),
	A: gross('cm²', 1e2, (g) => g.area),
	Iy: gross('cm⁴', 1e4, (g) => g.secondMomentY),
	Wel_y: gross('cm³', 1e3, (g) => Math.min(g.elasticModulusYTop, g.elasticModulusYBottom)),
	Wpl_y: gross('cm³', 1e3, (g) => g.plasticModulusY),
	iy: gross('cm', 10, (g) => g.radiusOfGyrationY),
	Iz: gross('cm⁴', 1e4, (g) => g.secondMomentZ),
	Wel_z: gross('cm³', 1e3, (g) => Math.min(g.elasticModulusZLeft, g.elasticModulusZRight)),
	Wpl_z: gross('cm³', 1e3, (g) => g.plasticModulusZ),
	iz: gross('cm', 10, (g) => g.radiusOfGyrationZ),
	It: gross('cm⁴', 1e4, (g) => g.torsionConstant),
	Iw: gross('cm⁶', 1e6, (g) => g.warpingConstant),
	ys: gross('cm', 10, (g) => g.centroid.y),
	cy: gross('cm', 10, (g) => g.centroid.z),
	cz: gross('cm', 10, (g) => g.centroid.y),
	Iu: gross('cm⁴', 1e4, (g) => g.secondMomentU),
	iu: gross('cm', 10, (g) => Math.sqrt(g.secondMomentU / g.area)),
	Iv: gross('cm⁴', 1e4, (g) => g.secondMomentV),
	iv: gross('cm', 10, (g) => Math.sqrt(g.secondMomentV / g.area))
} satisfies Columns;

export const inch = 25.4;

/** AISC tables: inches and their powers; x–x is our y–y, y–y our z–z. */
export const aisc = {
	A: gross('in²', inch ** 2, (g) => g.area),
	Ix: gross('in⁴', inch ** 4, (g) => g.secondMomentY),
	Sx: gross('in³', inch ** 3, (g) => Math.min(g.elasticModulusYTop, g.elasticModulusYBottom)),
	Zx: gross('in³', inch ** 3, (g) => g.plasticModulusY),
	rx: gross('in', inch, (g) => g.radiusOfGyrationY),
	Iy: gross('in⁴', inch ** 4, (g) => g.secondMomentZ),
	Sy: gross('in³', inch ** 3, (g) => Math.min(g.elasticModulusZLeft, g.elasticModulusZRight)),
	Zy: gross('in³', inch ** 3, (g) => g.plasticModulusZ),
	ry: gross('in', inch, (g) => g.radiusOfGyrationZ),
	J: gross('in⁴', inch ** 4, (g) => g.torsionConstant),
	Cw: gross('in⁶', inch ** 6, (g) => g.warpingConstant)
} satisfies Columns;

/** Where the centroid of a channel or angle lies, and figures about the minor principal axis. */
export const fromLeft = gross('in', inch, (g) => g.centroid.y);
export const fromBottom = gross('in', inch, (g) => g.centroid.z);
export const minorSecondMoment = gross('in⁴', inch ** 4, (g) => g.secondMomentV);
export const minorRadius = gross('in', inch, (g) => Math.sqrt(g.secondMomentV / g.area));

/** Angle between the axes of an angle section, as a tangent, from the leg-parallel to the minor axis. */
export const angleTangent: Column = {
	unit: '',
	ours: ({ gross: g }) => {
		const direct = tangent(g.principalAngle);
		return g.secondMomentY >= g.secondMomentZ ? direct : 1 / direct;
	}
};
