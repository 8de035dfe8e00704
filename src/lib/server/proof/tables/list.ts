import type { RowDefinition } from '../../catalogues/definitions';
import * as row from '../../catalogues/definitions';
import type { Columns } from './columns';
import * as column from './columns';
import * as special from './special-columns';

/** One published table: what it is of, and how its printed columns are found from our sections. */
export interface PublishedTable {
	/** File below `data/published/tables`; its `prop_sources` column names the source of every row. */
	readonly file: string;
	readonly title: string;
	/** Standard of the shapes, with its edition. */
	readonly standard: string;
	readonly definition: RowDefinition;
	readonly columns: Columns;
	/** Share of the printed value; half the last printed digit is always allowed. */
	readonly tolerance: number;
	readonly why: string;
}

const printed = 'rounded to 3 or 4 figures: 0.5 % or half the last digit';
const loose = (reason: string) => `${reason}: 2 % or half the last digit`;
const en10365 = 'EN 10365:2017';
const a6 = 'ASTM A6 (AISC Shapes Database v15.0)';
const a500 = 'ASTM A500 (AISC Shapes Database v15.0)';

const close = { tolerance: 0.005, why: printed } as const;
const dimensions = {
	tolerance: 0.02,
	why: loose('the dimensions have three figures too')
} as const;
const toes = { tolerance: 0.02, why: loose('toe radii are not published') } as const;

/** All tables that the engine is held against, about a third of the shipped shapes. */
export const publishedTables: readonly PublishedTable[] = [
	{
		...{ file: 'check_en10365_i.csv', title: 'IPE and HE', standard: en10365, definition: row.enI },
		columns: {
			...column.en,
			It: special.continentalTorsion,
			Iw: { ...column.en.Iw, lastDigit: 10, remark: 'Printed in thousands of cm⁶ to two decimals.' }
		},
		...close
	},
	{
		...{
			file: 'check_en10365_ub_uc.csv',
			title: 'UB and UC',
			standard: en10365,
			definition: row.enI
		},
		columns: {
			...column.en,
			Iw: { ...column.en.Iw, lastDigit: 1000, remark: 'Printed in dm⁶ to three decimals.' }
		},
		...close
	},
	{
		...{ file: 'check_en10365_channels.csv', title: 'UPE, UPN and PFC', standard: en10365 },
		definition: row.enChannel,
		columns: column.en,
		...close
	},
	{
		...{ file: 'check_en10056_angles.csv', title: 'Angles', standard: 'EN 10056-1:2017' },
		definition: row.enAngle,
		columns: { ...column.en, tan_alpha: column.angleTangent },
		...close
	},
	{
		...{ file: 'check_en10210_hollow.csv', title: 'RHS, SHS and CHS', standard: 'EN 10210-2:2006' },
		definition: row.enHollow,
		columns: column.en,
		...close
	},
	{
		...{ file: 'check_astm_a6_w.csv', title: 'W shapes', standard: a6, definition: row.astmW },
		columns: column.aisc,
		...dimensions
	},
	{
		...{ file: 'check_astm_a6_wt.csv', title: 'WT shapes', standard: a6, definition: row.astmWT },
		columns: { ...column.aisc, y: special.fromTop, yp: special.plasticFromTop },
		...dimensions
	},
	{
		...{ file: 'check_astm_a6_c.csv', title: 'C shapes', standard: a6, definition: row.astmC },
		columns: { ...column.aisc, x: column.fromLeft },
		...toes
	},
	{
		...{ file: 'check_astm_a6_l.csv', title: 'L shapes', standard: a6, definition: row.astmL },
		columns: {
			...column.aisc,
			x: column.fromLeft,
			y: column.fromBottom,
			Iz: column.minorSecondMoment,
			rz: column.minorRadius,
			'tan(a)': column.angleTangent
		},
		...toes
	},
	{
		...{ file: 'check_astm_a500_hss_rect.csv', title: 'Rectangular HSS', standard: a500 },
		definition: row.astmRectangularHss,
		columns: { ...column.aisc, J: special.bredtTorsion },
		...close
	},
	{
		...{ file: 'check_astm_a500_hss_round.csv', title: 'Round HSS', standard: a500 },
		definition: row.astmRoundHss,
		columns: column.aisc,
		...close
	}
];
