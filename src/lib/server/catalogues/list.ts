import * as row from './definitions';
import * as source from './sources';

/** One shipped file and how to read it. */
export interface CatalogueSource {
	readonly id: string;
	readonly title: string;
	/** Product standard of the dimensions, part of a shape's identity. */
	readonly standard: string;
	/** Edition of the dimensions and how they were confirmed, as the README beside the file has it. */
	readonly source: string;
	/** File below `data/`. */
	readonly file: string;
	readonly definition: row.RowDefinition;
}

/** All shipped catalogues; sources and columns are described in the README beside each file. */
export const catalogueSources: readonly CatalogueSource[] = [
	{
		id: 'en10365-i',
		title: 'European I and H sections',
		standard: 'EN 10365',
		source: source.en10365,
		file: 'en10365/i.csv',
		definition: row.enI
	},
	{
		id: 'en10365-ub-uc',
		title: 'UK beams and columns',
		standard: 'EN 10365',
		source: source.en10365,
		file: 'en10365/ub-uc.csv',
		definition: row.enI
	},
	{
		id: 'en10365-channels',
		title: 'European and UK channels',
		standard: 'EN 10365',
		source: source.en10365,
		file: 'en10365/channels.csv',
		definition: row.enChannel
	},
	{
		id: 'en10056-angles',
		title: 'European angles',
		standard: 'EN 10056-1',
		source: source.en10056,
		file: 'en10056/angles.csv',
		definition: row.enAngle
	},
	{
		id: 'en10210-hollow',
		title: 'European hot-finished hollow sections',
		standard: 'EN 10210-2',
		source: source.en10210,
		file: 'en10210/hollow.csv',
		definition: row.enHollow
	},
	{
		id: 'astm-a6-w',
		title: 'American wide-flange shapes',
		standard: 'ASTM A6',
		source: source.astmA6,
		file: 'astm-a6/w.csv',
		definition: row.astmW
	},
	{
		id: 'astm-a6-wt',
		title: 'American tees cut from wide-flange shapes',
		standard: 'ASTM A6',
		source: source.astmA6,
		file: 'astm-a6/wt.csv',
		definition: row.astmWT
	},
	{
		id: 'astm-a6-c',
		title: 'American standard channels',
		standard: 'ASTM A6',
		source: source.astmA6,
		file: 'astm-a6/c.csv',
		definition: row.astmC
	},
	{
		id: 'astm-a6-l',
		title: 'American angles',
		standard: 'ASTM A6',
		source: source.astmA6,
		file: 'astm-a6/l.csv',
		definition: row.astmL
	},
	{
		id: 'astm-a500-rectangular',
		title: 'American rectangular hollow sections',
		standard: 'ASTM A500',
		source: source.astmA500,
		file: 'astm-a500/hss-rectangular.csv',
		definition: row.astmRectangularHss
	},
	{
		id: 'astm-a500-round',
		title: 'American round hollow sections',
		standard: 'ASTM A500',
		source: source.astmA500,
		file: 'astm-a500/hss-round.csv',
		definition: row.astmRoundHss
	}
];
