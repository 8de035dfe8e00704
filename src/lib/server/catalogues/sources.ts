/** Where the dimensions of each folder of `data/` come from, as its README tells at more length. */
const confirmed =
	'Dimensions only. Each row names in the data file where its values came from: written down from memory, or agreed by several freely published lists. Confirmed by recomputing published properties from the dimensions for about a third of the rows; compare with the standard before fabrication.';

const from = (edition: string) => `${edition}. ${confirmed}`;

export const en10365 = from(
	'EN 10365:2017, hot rolled steel channels, I and H sections, dimensions and masses'
);
export const en10056 = from('EN 10056-1:2017, structural steel equal and unequal leg angles');
export const en10210 = from('EN 10210-2:2006, hot finished structural hollow sections');
export const astmA6 = from('ASTM A6/A6M, dimensions as in the AISC Shapes Database v15.0');
export const astmA500 = from('ASTM A500/A500M, dimensions as in the AISC Shapes Database v15.0');
